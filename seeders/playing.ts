import { eveningDraft, type EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import { consentVersion } from '#shared/contracts/seats.ts'
import type { StewardTable } from '#shared/contracts/table.ts'
import { liking } from '#shared/domain/lexicon.ts'
import { closeRound } from '#server/features/rounds/close-service.ts'
import { linkToken } from '#server/features/rounds/link-service.ts'
import { createEvening, openRound } from '#server/features/rounds/service.ts'
import { openLink } from '#server/features/seats/join-service.ts'
import { answerEnd, confirm, consent, noteSeal } from '#server/features/seats/service.ts'
import { submit } from '#server/features/seats/submit-service.ts'
import { nextTurn } from '#server/features/table/turn-service.ts'
import { showTags } from '#server/features/tags/service.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { Seat } from '#server/models/seat.ts'
import { acting } from './acting.ts'
import { answersOf, remarkOf } from './hearing.ts'
import { keepRatings, markSent, type Sent } from './sending.ts'
import { later, type World } from './world.ts'

/** An open evening as its people hold it. */
export interface Evening {
  world: World
  at: { panel: string; round: string; sitting: string }
  /** For the invented answers. */
  title: string
  scorecard: readonly string[]
  turns: number
  seats: readonly { id: string; name: string }[]
  dutyOf(role: string): { dutyIds: string[] }
  /** What a code hides, by the eyes of whoever tags. */
  unitOf(code: string): string
}

const minutesPerTurn = 8

export function draft(
  world: World,
  input: EveningDraftInput,
  at: Date,
): Promise<{ id: string; version: number }> {
  return createEvening(acting(world.deps, world.organiser, at), world.slug, eveningDraft.parse(input))
}

/** Drafts an evening, opens it and lets everybody in `absent` of whom has not come. */
export async function open(
  world: World,
  input: EveningDraftInput,
  at: Date,
  absent: readonly string[] = [],
): Promise<Evening> {
  const { deps, organiser, slug } = world
  const made = await draft(world, input, later(at, -45))
  const opened = await openRound(acting(deps, organiser, at, { version: made.version }), {
    panel: slug,
    round: made.id,
  })
  const place = { panel: slug, round: made.id, sitting: opened.sittingId ?? '' }
  const roles = await RoundRole.findAll({ where: { roundId: made.id } })
  const dutyOf = (role: string) => ({ dutyIds: roles.filter((one) => one.role === role).map(({ id }) => id) })
  const seats = await Seat.findAll({ where: { roundId: made.id }, order: [['number', 'asc']] })
  for (const seat of seats.filter(({ label }) => !absent.includes(label))) {
    await openLink(acting(deps, {}, later(at, 4)), linkToken(deps, 'seat', seat.id, seat.linkVersion))
    await consent(acting(deps, { seatIds: [seat.id] }, later(at, 6)), seat.id, consentVersion)
  }
  return {
    world,
    at: place,
    title: input.title,
    scorecard: [liking.key, ...input.scorecard],
    turns: opened.plan.turns,
    seats: seats.map(({ id, label }) => ({ id, name: label })),
    dutyOf,
    unitOf: await unitsBehind(world, place, dutyOf, at),
  }
}

async function unitsBehind(
  { deps }: World,
  place: Evening['at'],
  dutyOf: Evening['dutyOf'],
  at: Date,
): Promise<(code: string) => string> {
  const units = new Map<string, string>()
  const letters = new Map<string, string>()
  for (const part of ['keeper', 'letters', 'codes']) {
    if (dutyOf(part).dutyIds.length === 0) continue
    const seen = await showTags(acting(deps, dutyOf(part), later(at, 1)), place)
    if (seen.part === 'keeper') seen.pouches.forEach(({ code, unit }) => units.set(code, unit))
    if (seen.part === 'letters') seen.pouches.forEach(({ letter, unit }) => letters.set(letter, unit))
    if (seen.part === 'codes')
      seen.pouches.forEach(({ letter, code }) => units.set(code, letters.get(letter) ?? ''))
  }
  return (code) => units.get(code) ?? ''
}

export interface Held {
  seat: { id: string; name: string }
  serving: string
  code: string
}

/** "Next turn"; who holds what then. */
export async function goOn(evening: Evening, from: number, at: Date): Promise<Held[]> {
  const { world, at: place, seats } = evening
  const table: StewardTable = await nextTurn(acting(world.deps, evening.dutyOf('steward'), at), place, from)
  return table.seats.flatMap(({ id, serving }) => {
    const seat = seats.find((one) => one.id === id)
    return seat && serving?.state === 'handed' ? [{ seat, serving: serving.id, code: serving.code }] : []
  })
}

const phone = (evening: Evening, { seat }: Held, at: Date, key?: string) =>
  acting(evening.world.deps, { seatIds: [seat.id] }, at, key === undefined ? {} : { key })

export const type = (evening: Evening, held: Held, code: string, at: Date): Promise<unknown> =>
  confirm(phone(evening, held, at), held.seat.id, held.serving, code)

/** Types the digits and finds the seal; the listener is rating then. */
export async function start(evening: Evening, held: Held, at: Date): Promise<void> {
  await type(evening, held, held.code, at)
  await noteSeal(phone(evening, held, later(at, 1)), held.seat.id, held.serving, 'yes')
}

/** One serving from the digits to "sent". */
export async function rate(evening: Evening, held: Held, at: Date): Promise<void> {
  await start(evening, held, at)
  const { name } = held.seat
  const unit = evening.unitOf(held.code)
  await submit(
    phone(evening, held, later(at, 5), `seeded-${held.serving}`),
    { seat: held.seat.id, serving: held.serving },
    {
      answers: answersOf(evening.title, name, unit, evening.scorecard),
      remark: remarkOf(evening.title, name, unit),
    },
  )
}

/** When turn m of an evening that began at `start` begins. */
export const turnTime = (start: Date, turn: number): Date =>
  later(start, 10 + (turn - 1) * minutesPerTurn + Math.floor((turn - 1) / 4) * 10)

/**
 * All turns of an evening with everybody rating, and its end questions. What the phones sent is written in one go: as
 * the seat's services would have left it, which a test compares with what they do leave.
 */
export async function play(evening: Evening, began: Date): Promise<Date> {
  const sent: Sent[] = []
  for (let turn = 1; turn <= evening.turns; turn++) {
    const time = turnTime(began, turn)
    const held = await goOn(evening, turn - 1, time)
    await markSent(held, time)
    sent.push(...held.map((one) => ({ ...one, at: later(time, 6) })))
  }
  await keepRatings(evening, sent)
  const over = turnTime(began, evening.turns + 1)
  await goOn(evening, evening.turns, over)
  for (const { id } of evening.seats)
    await answerEnd(acting(evening.world.deps, { seatIds: [id] }, later(over, 2)), id, {
      recognised: 'none',
      recognitions: [],
    })
  return later(over, 5)
}

export async function close(evening: Evening, at: Date): Promise<void> {
  const { deps, organiser } = evening.world
  const { panel, round } = evening.at
  await closeRound(acting(deps, organiser, at), { panel, round }, { evenIfOut: false })
}
