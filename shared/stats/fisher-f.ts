import { ibeta, ibetainv } from './special-functions.ts'

/**
 * Upper tail of Fisher's F: the chance of a value at least `f`. The tail itself, not one minus a distribution
 * function. Six to seven digits (jstat; against R 4.2 `pf(lower.tail = FALSE)`).
 *
 * @param f statistic; zero and less give 1
 * @throws RangeError when a df is not positive
 * @example
 * fUpperTail(11.027248, 5, 15) // => 0.000134567
 */
export function fUpperTail(f: number, df1: number, df2: number): number {
  if (!(df1 > 0) || !(df2 > 0)) throw new RangeError(`F: df ${df1}, ${df2}`)
  if (f <= 0) return 1
  return ibeta(df2 / (df2 + df1 * f), df2 / 2, df1 / 2)
}

/**
 * Quantile of Fisher's F with `upper` above it: `fQuantile(0.025, 5, 15)` is F(.975; 5, 15).
 *
 * @param upper upper tail, 0 < upper < 1
 * @throws RangeError when an argument is out of range
 * @example
 * fQuantile(0.025, 5, 15) // => 3.576415
 */
export function fQuantile(upper: number, df1: number, df2: number): number {
  if (!(df1 > 0) || !(df2 > 0) || !(upper > 0 && upper < 1)) {
    throw new RangeError(`F quantile: tail ${upper}, df ${df1}, ${df2}`)
  }
  const beta = ibetainv(upper, df2 / 2, df1 / 2)
  return (df2 * (1 - beta)) / (df1 * beta)
}
