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
  // The quantile lies below Bonferroni's over all pairs and above that of one pair.
  let low = Math.SQRT2 * tQuantile(upper, df)
  let high = Math.SQRT2 * tQuantile((2 * upper) / (means * (means - 1)), df)
  let atLow = Math.log(averaged(low, tail, df) / upper)
  let atHigh = Math.log(averaged(high, tail, df) / upper)
  for (let round = 0; round < 100 && high - low > 1e-12 * high && atLow > 0 && atHigh < 0; round++) {
    const middle = round % 3 === 2 ? (low + high) / 2 : low + ((high - low) * atLow) / (atLow - atHigh)
    const at = Math.log(averaged(middle, tail, df) / upper)
    if (Math.abs(at) < 1e-12) return middle
    if (at > 0) [low, atLow] = [middle, at]
    else [high, atHigh] = [middle, at]
  }
  return atLow > 0 ? (low + high) / 2 : low
}

/** Mean of tail(q·s) over s = χ/√df. */
function averaged(q: number, tail: (w: number) => number, df: number): number {
  const step = Math.min(0.06, 0.3 / Math.sqrt(df))
  let total = 0
  let weights = 0
  for (const direction of [1, -1]) {
    for (let i = direction === 1 ? 0 : 1; i < 20_000; i++) {
      const u = direction * i * step
      const weight = Math.exp(df * (u - Math.expm1(2 * u) / 2))
      if (weight < 1e-17) break
      weights += weight
      total += weight * tail(q * Math.exp(u))
    }
  }
  return total / weights
}

function check(means: number, df: number): void {
  if (!(means >= 2) || !(df > 0)) throw new RangeError(`studentized range: ${means} means, df ${df}`)
}
