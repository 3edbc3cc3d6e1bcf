import { range } from './balance.ts'
import type { Stream } from './stream.ts'
import type { CodeSet, DrawRow } from './types.ts'

/** The codes that whoever sits in the row may meet: those served (or taken over) and those for voids. */
export function codesMet(row: DrawRow, as: Exclude<CodeSet, 'reserve'>): number[] {
  return row.places.flatMap((place) => [place.codes[as], place.codes.reserve])
}

/** Whether somebody who remembers these codes would meet one of them in the row. */
export function meetsAny(
  row: DrawRow,
  as: Exclude<CodeSet, 'reserve'>,
  remembered: Iterable<number>,
): boolean {
  const known = new Set(remembered)
  return codesMet(row, as).some((code) => known.has(code))
}

const SHUFFLES = 50

/** Any seating in which `fits` holds, by augmenting paths; null when there is none. */
function match(fits: readonly (readonly boolean[])[], order: readonly number[]): number[] | null {
  const seatOf = new Map<number, number>()
  const place = (seat: number, seen: Set<number>): boolean =>
    order.some((row) => {
      if (!fits[seat]![row] || seen.has(row)) return false
      seen.add(row)
      const before = seatOf.get(row)
      if (before !== undefined && !place(before, seen)) return false
      seatOf.set(row, seat)
      return true
    })
  for (let seat = 0; seat < fits.length; seat += 1) if (!place(seat, new Set())) return null
  const rowOf = new Array<number>(fits.length).fill(0)
  for (const [row, seat] of seatOf) rowOf[seat] = row
  return rowOf
}

/**
 * Draws which seat gets which of as many rows so that no seat meets a code it remembers: uniformly while shuffles
 * find such a seating, by matching when they do not, null when none exists.
 */
export function drawSeating(
  rows: readonly DrawRow[],
  remembered: readonly ReadonlySet<number>[],
  stream: Stream,
): number[] | null {
  const fits = remembered.map((codes) => rows.map((row) => !meetsAny(row, 'served', codes)))
  if (fits.some((seat) => !seat.includes(true))) return null
  for (let i = 0; i < SHUFFLES; i += 1) {
    const rowOf = stream.shuffle(range(rows.length))
    if (rowOf.every((row, seat) => fits[seat]![row])) return rowOf
  }
  return match(fits, stream.shuffle(range(rows.length)))
}
