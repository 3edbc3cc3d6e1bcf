import jStat from 'jstat'
import { tQuantile, tTwoSided } from './student-t.ts'

/**
 * Upper tail of the studentized range of `means` means: the chance that the widest of them lie at least `q`
 * standard errors apart by chance.
 *
 * Two means: Student's t exactly (q = √2 t). Otherwise one minus jstat's `ptukey` (the algorithm of R; 1e-10), which
 * knows no tail of its own: below 1e-9 the figure is noise and is given as 0. Under two degrees of freedom no
 * algorithm is at hand: the Bonferroni bound over all pairs, which is never too small, stands in.
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
  if (df < 2) return Math.min(1, pairs(means) * tTwoSided(q / Math.SQRT2, df))
  const tail = 1 - jStat.tukey.cdf(q, means, df)
  return tail < 1e-9 ? 0 : tail
}

/**
 * Quantile of the studentized range with `upper` above it. Two means and fewer than two degrees of freedom as in
 * `rangeUpperTail`; otherwise jstat's `qtukey` (against R: 7e-9).
 *
 * @param upper upper tail, 0 < upper < 1
 * @throws RangeError when an argument is out of range
 * @example
 * rangeQuantile(0.05, 3, 12) // => 3.772929
 */
export function rangeQuantile(upper: number, means: number, df: number): number {
  check(means, df)
  if (means === 2) return Math.SQRT2 * tQuantile(upper, df)
  if (df < 2) return Math.SQRT2 * tQuantile(upper / pairs(means), df)
  return jStat.tukey.inv(1 - upper, means, df)
}

const pairs = (means: number): number => (means * (means - 1)) / 2

function check(means: number, df: number): void {
  if (!(means >= 2) || !(df > 0)) throw new RangeError(`studentized range: ${means} means, df ${df}`)
}
