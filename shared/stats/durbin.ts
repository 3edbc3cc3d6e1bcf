import type { Durbin } from './analysis-types.ts'
import { cannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { chiSquareUpperTail } from './chi-square.ts'
import { fUpperTail } from './fisher-f.ts'
import { midRanks, rounded } from './mid-ranks.ts'

/**
 * Durbin's test for ranks in a balanced incomplete block design: every listener rated k units, every unit was rated r
 * times, every two units met λ times. A complete table is the case k = t (Friedman's test).
 *
 * Both published forms are given, and differ: say which one is quoted. Not for any other pattern: use `blockRanks`.
 * Assumes listeners rank independently. Ties: mid-ranks, pooled A − C. Cost: linear in cells.
 *
 * Source: Durbin 1951; Conover 1999, p. 388.
 *
 * @param table listeners × units, null where a unit was not rated
 * @returns chi-square (T1) and F (T2) with their p
 * @example
 * durbin([[1, 2, null], [1, null, 2], [null, 2, 1]]).chiSquare // => 2
 */
export function durbin(table: readonly (readonly (number | null)[])[]): Durbin | Cannot {
  const t = table[0]?.length ?? 0
  const b = table.length
  if (b < 2) return cannot('fewer-than-two-listeners')
  if (t < 2) return cannot('fewer-than-two-units')
  const k = balancedSize(table, t)
  if (k === null) return cannot('not-a-balanced-design')
  const sums = new Array<number>(t).fill(0)
  let a = 0
  for (const row of table) {
    const rated = row.flatMap((value, unit) => (value === null ? [] : [{ value: rounded(value), unit }]))
    const { ranks } = midRanks(rated.map(({ value }) => value))
    rated.forEach(({ unit }, i) => {
      sums[unit]! += ranks[i]!
      a += ranks[i]! ** 2
    })
  }
  const c = (b * k * (k + 1) ** 2) / 4
  if (!(a - c > 1e-9)) return cannot('all-constant')
  const r = (b * k) / t
  const spread = sums.reduce((total, value) => total + (value - (r * (k + 1)) / 2) ** 2, 0)
  const chiSquare = ((t - 1) * spread) / (a - c)
  const df2 = b * k - b - t + 1
  const left = b * (k - 1) - chiSquare
  const base = { chiSquare, df: t - 1, p: chiSquareUpperTail(chiSquare, t - 1), df1: t - 1, df2 }
  if (df2 < 1 || left < 1e-9)
    return { ...base, f: cannot('no-variation-left'), pF: cannot('no-variation-left') }
  const f = chiSquare / (t - 1) / (left / df2)
  return { ...base, f, pF: fUpperTail(f, t - 1, df2) }
}

/** Units a listener, or null where listeners, units or pairs of units are not all alike. */
function balancedSize(table: readonly (readonly (number | null)[])[], t: number): number | null {
  const sizes = new Set(table.map((row) => row.filter((value) => value !== null).length))
  const [k] = sizes
  if (sizes.size !== 1 || k === undefined || k < 2) return null
  const times = new Set<number>()
  const meetings = new Set<number>()
  for (let i = 0; i < t; i++) {
    times.add(table.filter((row) => row[i] !== null).length)
    for (let j = 0; j < i; j++) meetings.add(table.filter((row) => row[i] !== null && row[j] !== null).length)
  }
  return times.size === 1 && meetings.size === 1 && !meetings.has(0) ? k : null
}
