import { cancelRound } from '#server/features/rounds/service.ts'
import { reportIncident } from '#server/features/table/service.ts'
import { markTagged, showTags } from '#server/features/tags/service.ts'
import { acting, Refused } from './acting.ts'
import * as evenings from './evenings.ts'
import { close, draft, goOn, open, play, rate, start, turnTime, type, type Evening } from './playing.ts'
import { publishVerdict } from './publishing.ts'
import { eveningBefore, fromNow, later, type World } from './world.ts'

/** Plays an evening whole and publishes what it found. */
export async function published(
  world: World,
  input: Parameters<typeof open>[1],
  days: { played: number; published: number },
  words: { headline: string; summary: string },
): Promise<void> {
  const began = eveningBefore(world, days.played)
  const evening = await open(world, input, began)
  await close(evening, await play(evening, began))
  await publishVerdict(world, evening.at.round, words, eveningBefore(world, days.published))
}

/** Cancelled in its second turn: the reason is public, no rating ever is. */
export async function cancelled(world: World): Promise<void> {
  const began = eveningBefore(world, 33)
  const evening = await open(world, evenings.windInTheCables, began)
  for (const held of await goOn(evening, 0, turnTime(began, 1)))
    await rate(evening, held, later(turnTime(began, 1), 1))
  await goOn(evening, 1, turnTime(began, 2))
  const { panel, round } = evening.at
  await cancelRound(
    acting(world.deps, world.organiser, later(turnTime(began, 2), 4)),
    { panel, round },
    'A cable broke in the second turn, and no other fits under the sleeves.',
  )
}

/** Over, its key open, its verdict not written: one unit’s provenance is still asked. */
export async function waitingForItsVerdict(world: World): Promise<void> {
  const began = eveningBefore(world, 2)
  const evening = await open(world, evenings.fourAtTheWindow, began)
  await close(evening, await play(evening, began))
}

/** In the middle of its third turn: some have sent, one rates, one typed a wrong code, one is not there yet. */
export async function onTheTable(world: World): Promise<void> {
  const began = fromNow(world, -32)
  const evening = await open(world, evenings.fiveTonight, began, ['Lorcan Weir'])
  const { deps } = world
  await tag(evening, 3, began)
  for (const turn of [1, 2]) {
    const time = turnTime(began, turn)
    for (const held of await goOn(evening, turn - 1, time))
      if (held.seat.name !== 'Lorcan Weir') await rate(evening, held, later(time, 1))
  }
  const time = turnTime(began, 3)
  const held = await goOn(evening, 2, time)
  const present = held.filter(({ seat }) => seat.name !== 'Lorcan Weir')
  const [wrong, rating, ...others] = present.reverse()
  for (const one of others) await rate(evening, one, time)
  if (rating) await start(evening, rating, later(time, 1))
  if (wrong) {
    const misread = wrong.code === '417' ? '471' : '417'
    await type(evening, wrong, misread, later(time, 1)).catch((error: unknown) => {
      if (!(error instanceof Refused)) throw error
    })
  }
  await tagSome(evening, 4, 2, later(time, 3))
  const late = evening.seats.find(({ name }) => name === 'Lorcan Weir')
  await reportIncident(acting(deps, evening.dutyOf('steward'), later(time, 2)), evening.at, {
    kind: 'other',
    seat: late?.id,
    text: 'On the late ferry, comes at turn 4',
  })
}

/** The keeper tags every pouch of the first turns. */
async function tag(evening: Evening, turns: number, at: Date): Promise<void> {
  for (let turn = 1; turn <= turns; turn++) await tagSome(evening, turn, Infinity, at)
}

async function tagSome(evening: Evening, turn: number, most: number, at: Date): Promise<void> {
  const { deps } = evening.world
  const keeper = evening.dutyOf('keeper')
  const seen = await showTags(acting(deps, keeper, at), evening.at)
  if (seen.part !== 'keeper') return
  const pouches = seen.pouches.filter((one) => one.turn === turn && one.state === 'to-tag')
  for (const { serving } of pouches.slice(0, most))
    await markTagged(acting(deps, keeper, at), evening.at, { serving })
}

/** Nothing but a plan yet. */
export async function drafted(world: World): Promise<void> {
  await draft(world, evenings.nextSpring, fromNow(world, -180))
}
