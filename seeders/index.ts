import { inTransaction } from '#server/db/transaction.ts'
import type { Deps } from '#server/deps.ts'
import { Job } from '#server/models/job.ts'
import { Op } from 'sequelize'
import { afterTheRegatta, sixSmallOnes, threeForTheTrain } from './evenings.ts'
import { bringOldSheets } from './old-sheets.ts'
import { demoSlug, seedPanel } from './panel.ts'
import { cancelled, drafted, onTheTable, published, waitingForItsVerdict } from './rounds.ts'
import { seededRandom } from './seeded-random.ts'
import { fromNow } from './world.ts'

/**
 * The demo's invented world, made once: the same ids, codes and ratings at every seeding, dates relative to the day of
 * it. Runs under the lock of the migrations, as the application's own role and through its own services, so that every
 * published number is the product's; in one transaction, so that a seeding that was cut off leaves nothing behind.
 */
export async function seedDemo(deps: Deps): Promise<void> {
  const seeded: Deps = { ...deps, random: seededRandom('The Quayside Bench') }
  const now = deps.clock.now()
  await inTransaction(deps.sequelize, {}, async () => {
    const organiser = await seedPanel(seeded, now)
    if (!organiser) return
    const world = { deps: seeded, slug: demoSlug, organiser, now }
    await bringOldSheets(world)
    await published(world, threeForTheTrain, { played: 76, published: 71 }, words.threeForTheTrain)
    await published(world, afterTheRegatta, { played: 48, published: 47 }, words.afterTheRegatta)
    await cancelled(world)
    await published(world, sixSmallOnes, { played: 16, published: 11 }, words.sixSmallOnes)
    await waitingForItsVerdict(world)
    // Nobody is written to about evenings that are over.
    await Job.destroy({ where: { createdAt: { [Op.lt]: fromNow(world, -24 * 60) } } })
    await onTheTable(world)
    await drafted(world)
  })
}

/** What the organiser wrote over and under the sentences that Scrim writes. */
const words = {
  threeForTheTrain: {
    headline: 'Knot has the most bass of three; which sounds most real stays open',
    summary:
      'Six of us, three small ones and two tracks, an hour before the last train. Levels were matched by ear, so a small difference in level may hide in these numbers.',
  },
  afterTheRegatta: {
    headline: 'Four of us, three to pass round',
    summary: 'Too few listeners for public figures. This page keeps what we did and what was lent.',
  },
  sixSmallOnes: {
    headline: 'Dunlin is the widest of six and Whimbrel the warmest. On depth the panel does not agree.',
    summary:
      'Fourteen listeners heard six earphones under 250, blind and matched in level. Width and warmth are heard the same way by nearly everyone. Overall liking is not: some of us like wide and bright, others warm and full, and an average would hide that. One listener’s ratings wander far from everybody’s; they are in the numbers, since no rule that was frozen before the evening leaves them out.',
  },
}
