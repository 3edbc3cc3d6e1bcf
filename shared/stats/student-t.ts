import { ibeta, ibetainv, gammaln } from './special-functions.ts'

/**
 * Two-sided p of Student's t: the chance of a value at least as far from zero as `t`.
 *
 * The tail is the incomplete beta function itself, never one minus a distribution function, so that small p keep
 * their digits. Seven digits (jstat; against R 4.2 `pt`).
 *
 * @param t statistic, any finite number
 * @param df degrees of freedom, > 0, need not be whole
 * @throws RangeError when df is not positive
 * @example
 * tTwoSided(2.228139, 10) // => 0.05
 */
export function tTwoSided(t: number, df: number): number {
  if (!(df > 0)) throw new RangeError(`t: df must be positive, got ${df}`)
  if (t === 0) return 1
  return ibeta(df / (df + t * t), df / 2, 0.5)
}

/**
 * Positive quantile of Student's t that leaves `tail` in the two ends together; `tQuantile(0.05, df)` is the factor
 * of a 95 % interval.
 *
 * @param tail two-sided tail, 0 < tail < 1
 * @param df degrees of freedom, > 0
 * @throws RangeError when tail or df is out of range
 * @example
 * tQuantile(0.05, 10) // => 2.228139
 */
export function tQuantile(tail: number, df: number): number {
  if (!(df > 0) || !(tail > 0 && tail < 1)) throw new RangeError(`t quantile: tail ${tail}, df ${df}`)
  const beta = ibetainv(tail, df / 2, 0.5)
  if (df > 50) return polish(Math.sqrt((df * (1 - beta)) / beta), tail, df)
  return Math.sqrt((df * (1 - beta)) / beta)
}

/** Near beta = 1 the inverse loses digits; one Newton step on the tail brings them back. */
function polish(start: number, tail: number, df: number): number {
  const logDensity =
    gammaln((df + 1) / 2) -
    gammaln(df / 2) -
    0.5 * Math.log(df * Math.PI) -
    ((df + 1) / 2) * Math.log1p((start * start) / df)
  return start + (tTwoSided(start, df) - tail) / (2 * Math.exp(logDensity))
}
