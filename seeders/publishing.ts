import { publish, saveFacts, saveWords, showDesk } from '#server/features/verdicts/service.ts'
import { acting } from './acting.ts'
import { factsOf } from './unit-facts.ts'
import { later, type World } from './world.ts'

/** Writes what readers must know of each unit, the organiser’s own words, and publishes. */
export async function publishVerdict(
  world: World,
  round: string,
  words: { headline: string; summary: string },
  at: Date,
): Promise<void> {
  const { deps, organiser, slug: panel } = world
  const place = { panel, round }
  const desk = await showDesk(acting(deps, organiser, later(at, -30)), place)
  for (const unit of desk.units.filter(({ provenance }) => provenance === null)) {
    const now = acting(deps, organiser, later(at, -20), { version: unit.version })
    await saveFacts(now, { ...place, unit: unit.id }, factsOf(world, unit.name))
  }
  await saveWords(acting(deps, organiser, later(at, -10), { version: desk.version }), place, words)
  await publish(acting(deps, organiser, at, { key: `seeded-verdict-${round}` }), place, '')
}
