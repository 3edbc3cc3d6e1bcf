import { cannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { midRanks } from './mid-ranks.ts'

export type AlphaMetric = 'nominal' | 'ordinal' | 'interval' | 'ratio'

/**
 * Krippendorff's alpha: one minus observed over expected disagreement, 1 for perfect agreement, 0 for chance, below 0
 * for less than chance. Sees level shifts between listeners; takes any number of them and any missing values (a unit
 * with a single value is left out).
 *
 * Use beside the one-serving ICC, on cell means. Not a pass mark: it depends on how far the units lie apart.
 * Assumes nothing about the distribution. Cost: linear for interval and nominal, n log n for ordinal (whose difference
 * function is the squared difference of mid-ranks), distinct values² for ratio.
 *
 * Source: Krippendorff 2011, "Computing Krippendorff's Alpha-Reliability".
 *
 * @param units for each unit the values it was given, missing ones left out
 * @returns alpha, no unit; or why it cannot be said: no unit with two values, no variation, or (ratio) values below 0
 * @example
 * krippendorffAlpha([[1, 1], [2, 2], [3, 4]], 'interval') // => 0.914894
 */
export function krippendorffAlpha(
  units: readonly (readonly number[])[],
  metric: AlphaMetric,
): number | Cannot {
  const paired = units.filter((values) => values.length > 1)
  if (paired.length === 0) return cannot('no-pair-of-scores')
  if (metric === 'interval') return fromSquares(paired)
  if (metric === 'ordinal') return fromSquares(ranked(paired))
  if (metric === 'ratio' && paired.some((values) => values.some((value) => value < 0))) {
    return cannot('not-a-ratio-scale')
  }
  return fromDifferences(paired, metric === 'nominal' ? differs : relative)
}

/** Alpha for squared differences: Do = Σ 2m·SS/(m−1)/n, De = 2·SS/(n−1). */
function fromSquares(units: readonly (readonly number[])[]): number | Cannot {
  let n = 0
  let centre = 0
  for (const values of units) for (const value of values) centre += (value - centre) / ++n
  let observed = 0
  let total = 0
  for (const values of units) {
    let sum = 0
    let squares = 0
    for (const value of values) {
      sum += value - centre
      squares += (value - centre) ** 2
    }
    const m = values.length
    observed += (m * (squares - (sum * sum) / m)) / (m - 1)
    total += squares
  }
  if (!(total > 1e-20 * n * Math.max(1e-280, centre * centre))) return cannot('no-variation')
  return observed <= 1e-12 * total ? 1 : 1 - (observed / n) * ((n - 1) / total)
}

function ranked(units: readonly (readonly number[])[]): number[][] {
  const { ranks } = midRanks(units.flat())
  let at = 0
  return units.map((values) => values.map(() => ranks[at++] ?? 0))
}

type Difference = (a: number, b: number) => number
const differs: Difference = (a, b) => (a === b ? 0 : 1)
const relative: Difference = (a, b) => (a + b === 0 ? 0 : ((a - b) / (a + b)) ** 2)

/** Alpha for any difference function, over distinct values. */
function fromDifferences(units: readonly (readonly number[])[], difference: Difference): number | Cannot {
  const totals = new Map<number, number>()
  let n = 0
  let observed = 0
  for (const values of units) {
    const counts = tally(values)
    observed += disagreement(counts, difference) / (values.length - 1)
    n += values.length
    for (const [value, count] of counts) totals.set(value, (totals.get(value) ?? 0) + count)
  }
  const expected = disagreement(totals, difference) / (n - 1)
  return expected > 0 ? 1 - observed / expected : cannot('no-variation')
}

function tally(values: readonly number[]): Map<number, number> {
  const counts = new Map<number, number>()
  for (const value of values) counts.set(value, (counts.get(value) ?? 0) + 1)
  return counts
}

function disagreement(counts: ReadonlyMap<number, number>, difference: Difference): number {
  const entries = [...counts]
  let total = 0
  entries.forEach(([a, na], i) => {
    for (const [b, nb] of entries.slice(i + 1)) total += 2 * na * nb * difference(a, b)
  })
  return total
}
