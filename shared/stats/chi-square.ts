import { lowRegGamma, gammaln } from './special-functions.ts'

/**
 * Upper tail of chi-square: the chance of a value at least `x`.
 *
 * Below the middle it is one minus jstat's lower incomplete gamma; above it the continued fraction of the upper
 * function (Lentz; Press et al., Numerical Recipes 6.2), so that small p keep their digits: jstat has no upper tail.
 *
 * @param x statistic; zero and less give 1
 * @param df degrees of freedom, > 0
 * @throws RangeError when df is not positive
 * @example
 * chiSquareUpperTail(11.142857, 2) // => 0.003805
 */
export function chiSquareUpperTail(x: number, df: number): number {
  if (!(df > 0)) throw new RangeError(`chi-square: df must be positive, got ${df}`)
  if (x <= 0) return 1
  const a = df / 2
  const half = x / 2
  if (half < a + 1) return 1 - lowRegGamma(a, half)
  return Math.exp(a * Math.log(half) - half - gammaln(a)) * upperFraction(a, half)
}

function upperFraction(a: number, x: number): number {
  const tiny = 1e-300
  let b = x + 1 - a
  let c = 1 / tiny
  let d = 1 / b
  let h = d
  for (let i = 1; i < 10_000; i++) {
    const an = -i * (i - a)
    b += 2
    d = an * d + b || tiny
    c = b + an / c || tiny
    d = 1 / d
    const step = d * c
    h *= step
    if (Math.abs(step - 1) < 1e-15) break
  }
  return h
}
