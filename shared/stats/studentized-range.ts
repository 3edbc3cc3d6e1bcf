import { normalRangeTail } from './normal-range.ts'
import { tQuantile, tTwoSided } from './student-t.ts'

/**
 * Upper tail of the studentized range of `means` means: the chance that the widest of them lie at least `q`
 * standard errors apart by chance.
 *
 * Two means: Student's t (q = √2 t). Otherwise the normal range's tail averaged over the error's own distribution, a
 * chi over its root df, by the trapezoid rule in its logarithm, which converges geometrically. Any df above 0. Against
 * R by nested adaptive integration: 2e-7 in
 * absolute size (R's own `ptukey`, and jstat's, are off by up to 7e-6 at two df and 4e-7 at 24,000).
 *
 * @param q range in standard errors of one mean
 * @param means how many means are compared, ≥ 2
 * @param df degrees of freedom, > 0
 * @throws RangeError when an argument is out of range
 * @example
 * rangeUpperTail(3.772929, 3, 12) // => 0.05
 */
export function rangeUpperTail(q: number, means: number, df: number): number {
  check(means, df)
  if (q <= 0) return 1
  if (means === 2) return tTwoSided(q / Math.SQRT2, df)
  return averaged(q, normalRangeTail(means), df)
}

/**
 * Quantile of the studentized range with `upper` above it; two means as in `rangeUpperTail`. Good to 1e-7
 * relative; R's own `qtukey` stops short at two and three df.
 *
 * @param upper upper tail, 0 < upper < 1
 * @throws RangeError when an argument is out of range
 * @example
 * rangeQuantile(0.05, 3, 12) // => 3.772929
 */
export function rangeQuantile(upper: number, means: number, df: number): number {
  check(means, df)
  if (!(upper > 0 && upper < 1)) throw new RangeError(`studentized range: tail ${upper}`)
  if (means === 2) return Math.SQRT2 * tQuantile(upper, df)
  const tail = normalRangeTail(means)
  // The quantile lies below Bonferroni's over all pairs and above that of one pair. In logarithms the tail is nearly a
  // line, on which the Illinois form of false position settles in a few steps.
  let low = Math.log(Math.SQRT2 * tQuantile(upper, df))
  let high = Math.log(Math.SQRT2 * tQuantile((2 * upper) / (means * (means - 1)), df))
  const excess = (x: number): number => Math.log(averaged(Math.exp(x), tail, df) / upper)
  let atLow = excess(low)
  let atHigh = excess(high)
  let before = 0
  for (let round = 0; round < 100 && atLow > 0 && atHigh < 0; round++) {
    const middle = low + ((high - low) * atLow) / (atLow - atHigh)
    const at = excess(middle)
    if (Math.abs(at) < 1e-11 || high - low < 1e-13) return Math.exp(middle)
    if (at > 0) {
      low = middle
      atLow = at
      if (before > 0) atHigh /= 2
    } else {
      high = middle
      atHigh = at
      if (before < 0) atLow /= 2
    }
    before = at
  }
  return Math.exp(atLow > 0 ? high : low)
}

/** Mean of tail(q·s) over s = χ/√df. */
function averaged(q: number, tail: (w: number) => number, df: number): number {
  const step = Math.min(0.1, 0.45 / Math.sqrt(df))
  let total = 0
  let weights = 0
  for (const direction of [1, -1]) {
    for (let i = direction === 1 ? 0 : 1; i < 20_000; i++) {
      const u = direction * i * step
      const weight = Math.exp(df * (u - Math.expm1(2 * u) / 2))
      if (weight < 1e-15) break
      weights += weight
      total += weight * tail(q * Math.exp(u))
    }
  }
  return total / weights
}

function check(means: number, df: number): void {
  if (!(means >= 2) || !(df > 0)) throw new RangeError(`studentized range: ${means} means, df ${df}`)
}
