import { deal, dealRows } from './deal.ts'
import { drawSeating } from './seating.ts'
import { createStream } from './stream.ts'
import type { DrawInput, DrawResult, History, KeyDocument } from './types.ts'

/** How often codes are drawn again for the sake of what members remember. */
const MOST_ATTEMPTS = { 'per-seat': 200, split: 2000 }

const byCodeUnits = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0)

function sortedDistinct(values: readonly string[], what: string): string[] {
  const sorted = [...values].sort(byCodeUnits)
  if (new Set(sorted).size !== sorted.length) throw new RangeError(`two ${what} have the same name`)
  return sorted
}

/** The exclusions as the key publishes them: for this round's units only, sorted, each once. */
export function publishedExclusions(
  history: Pick<History, 'pairs' | 'codes'>,
  unitIds: readonly string[],
): Pick<KeyDocument['draw'], 'excludedPairs' | 'excludedCodes'> {
  const known = new Map(
    history.pairs
      .filter((pair) => unitIds.includes(pair.unit))
      .map(({ code, unit }) => [`${code} ${unit}`, { code, unit }] as const),
  )
  return {
    excludedPairs: [...known.values()].sort((a, b) => a.code - b.code || byCodeUnits(a.unit, b.unit)),
    excludedCodes: [...new Set(history.codes)].sort((a, b) => a - b),
  }
}

/**
 * The whole draw of a round from one 256-bit seed: the same input gives the same draw to the last digit, whatever
 * the order of units and seats in it. What members remember never touches rows or codes, only who sits where (and,
 * when no seating suits all, that the codes are drawn again: `attempt`), so that the published key repeats the draw
 * without a word about people.
 */
export function drawRound(input: DrawInput): DrawResult {
  const unitIds = sortedDistinct(
    input.units.map((unit) => unit.id),
    'units',
  )
  const seatRefs = sortedDistinct(
    input.seats.map((seat) => seat.seatRef),
    'seats',
  )
  const remembered = new Map(input.history.seats.map((seat) => [seat.seatRef, new Set(seat.codes)]))
  for (const seatRef of remembered.keys()) {
    if (!seatRefs.includes(seatRef)) throw new RangeError('the history names a seat that the round has not')
  }
  const { seed, spares, codePolicy } = input
  const common = { seed, unitIds, listeners: seatRefs.length, spares, codePolicy }
  const exclusions = publishedExclusions(input.history, unitIds)
  const rowsDealt = dealRows(common)
  for (let attempt = 0; attempt < MOST_ATTEMPTS[codePolicy]; attempt += 1) {
    const dealt = deal({ ...common, ...exclusions, attempt }, rowsDealt)
    if (!dealt.ok) return dealt
    const rows = dealt.rows.filter((row) => !row.spare)
    const seating = drawSeating(
      rows,
      seatRefs.map((seatRef) => remembered.get(seatRef) ?? new Set()),
      createStream(seed, `seats ${attempt}`),
    )
    if (seating === null) continue
    const seats = seatRefs.map((seatRef, i) => ({ seatRef, listener: rows[seating[i]!]!.listener }))
    const { turns, letters, balance } = dealt
    const order = {
      scheme: input.scheme,
      mode: input.mode,
      listeners: seatRefs.length,
      spares,
      codePolicy,
      attempt,
    }
    return { ok: true, draw: { ...order, turns, rows: dealt.rows, seats, letters, balance } }
  }
  const detail = 'no drawing of codes kept every listener from a code of their last three rounds'
  return { ok: false, reason: 'history-leaves-too-few-codes', detail }
}
