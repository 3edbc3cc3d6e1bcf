import type { BlockRanks } from './analysis-types.ts'
import { cannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { chiSquareUpperTail } from './chi-square.ts'
import { midRanks, rounded } from './mid-ranks.ts'
import { invertPositive, times, dot } from './mixed-model/cholesky.ts'

/**
 * Rank test that no unit is placed above another, for any pattern of who rated what: rank sums about their middle
 * against their covariance Σ s²(I − J/k) over listeners, s² the variance of the ranks given.
 *
 * Equals Friedman's test on a complete table and Durbin's chi-square in a balanced one (ties apart). Listeners with one
 * unit, or all units tied, carry nothing. Assumes listeners rank independently and units are missing by design; p is a
 * chi-square tail, rough under ten listeners. Cost: units² a listener.
 *
 * Source: Skillings & Mack 1981, with variances of the mid-ranks for ties.
 *
 * @param table listeners × units, null where a unit was not rated
 * @example
 * blockRanks([[1, 2, 3], [1, 2, 3], [2, 1, 3]]).chiSquare // => 4.666667
 */
export function blockRanks(table: readonly (readonly (number | null)[])[]): BlockRanks | Cannot {
  const t = table[0]?.length ?? 0
  if (t < 2) return cannot('fewer-than-two-units')
  const sums = new Float64Array(t)
  const covariance = new Float64Array(t * t)
  for (const row of table) {
    const units = row.flatMap((value, unit) => (value === null ? [] : [unit]))
    const k = units.length
    if (k < 2) continue
    const { ranks } = midRanks(units.map((unit) => rounded(row[unit]!)))
    const deviations = ranks.map((rank) => rank - (k + 1) / 2)
    const variance = deviations.reduce((total, value) => total + value * value, 0) / (k - 1)
    if (variance === 0) continue
    units.forEach((unit, i) => {
      sums[unit]! += deviations[i]!
      for (const other of units)
        covariance[unit * t + other]! += variance * ((unit === other ? 1 : 0) - 1 / k)
    })
  }
  const keep = oneLeftOut(covariance, t)
  if (keep.length === 0) return cannot('all-constant')
  const size = keep.length
  const part = Float64Array.from(keep.flatMap((i) => keep.map((j) => covariance[i * t + j]!)))
  const inverse = invertPositive(part, size)?.inverse
  if (!inverse) return cannot('not-estimable')
  const kept = Float64Array.from(keep, (unit) => sums[unit]!)
  const chiSquare = dot(kept, times(inverse, kept, size))
  return { chiSquare, df: size, p: chiSquareUpperTail(chiSquare, size) }
}

/** Units but one of each connected group: what is left has a covariance of full rank. */
function oneLeftOut(covariance: Float64Array, t: number): number[] {
  const seen = new Set<number>()
  const keep: number[] = []
  for (let first = 0; first < t; first++) {
    if (seen.has(first)) continue
    seen.add(first)
    const queue = [first]
    for (let unit = queue.pop(); unit !== undefined; unit = queue.pop()) {
      for (let other = 0; other < t; other++) {
        if (seen.has(other) || covariance[unit * t + other] === 0) continue
        seen.add(other)
        keep.push(other)
        queue.push(other)
      }
    }
  }
  return keep.sort((a, b) => a - b)
}
