import { invertPositive, multiply, times, dot } from './cholesky.ts'
import type { KenwardRoger } from './kenward-roger.ts'

export interface Contrast {
  readonly estimate: number
  readonly standardError: number
  readonly df: number
}

/**
 * l'b with the corrected standard error and df = 2(l'Φl)² / (g'Wg), g = l'ΦPΦl for each component (Kenward & Roger
 * 1997 for a single contrast: no scaling).
 *
 * @param terms non-zero coefficients of l as [column, coefficient]
 */
export function contrast(fit: KenwardRoger, terms: readonly (readonly [number, number])[]): Contrast {
  const form = (matrix: Float64Array): number => {
    let total = 0
    for (const [i, a] of terms) for (const [j, b] of terms) total += a * b * matrix[i * fit.size + j]!
    return total
  }
  const g = fit.spreads.map(form)
  let spread = 0
  g.forEach((a, i) => g.forEach((b, j) => (spread += a * b * fit.weights[i]![j]!)))
  const variance = form(fit.covariance)
  return {
    estimate: terms.reduce((total, [i, a]) => total + a * fit.effects[i]!, 0),
    standardError: Math.sqrt(form(fit.adjusted)),
    df: (2 * variance * variance) / spread,
  }
}

/**
 * Test that all units are equal: Kenward and Roger's scaled F.
 *
 * Where the scaling is not defined (exactly two denominator degrees of freedom) F is unscaled and the smallest df of
 * the contrasts with the first unit stand in.
 *
 * @param means one for each unit, in the fit's scaled unit
 * @returns F with its scale applied, and its df
 */
export function unitF(
  fit: KenwardRoger,
  means: Float64Array,
): { f: number; df1: number; df2: number } | null {
  const q = means.length - 1
  const terms = Array.from({ length: q }, (_, i) => [[0, 1] as const, [i + 1, -1] as const])
  const reduce = (matrix: Float64Array): Float64Array => {
    const at = (i: number, j: number): number => matrix[i * fit.size + j]!
    const out = new Float64Array(q * q)
    for (let a = 0; a < q; a++) {
      for (let b = 0; b < q; b++) out[a * q + b] = at(0, 0) - at(0, b + 1) - at(a + 1, 0) + at(a + 1, b + 1)
    }
    return out
  }
  const differences = Float64Array.from(terms, (_, i) => means[0]! - means[i + 1]!)
  const plain = invertPositive(reduce(fit.covariance), q)?.inverse
  const corrected = invertPositive(reduce(fit.adjusted), q)?.inverse
  if (!plain || !corrected) return null
  const wald = dot(differences, times(corrected, differences, q)) / q
  const scaled = scaling(
    fit,
    fit.spreads.map((spread) => multiply(plain, reduce(spread), q)),
    q,
  )
  if (scaled) return { f: scaled.lambda * wald, df1: q, df2: scaled.df }
  return { f: wald, df1: q, df2: Math.min(...terms.map((pair) => contrast(fit, pair).df)) }
}

function scaling(
  fit: KenwardRoger,
  spread: readonly Float64Array[],
  q: number,
): { lambda: number; df: number } | null {
  const trace = (m: Float64Array): number => {
    let total = 0
    for (let i = 0; i < q; i++) total += m[i * q + i]!
    return total
  }
  let a1 = 0
  let a2 = 0
  spread.forEach((left, i) =>
    spread.forEach((right, j) => {
      const weight = fit.weights[i]![j]!
      a1 += weight * trace(left) * trace(right)
      a2 += weight * trace(multiply(left, right, q))
    }),
  )
  const b = (a1 + 6 * a2) / (2 * q)
  const g = ((q + 1) * a1 - (q + 4) * a2) / ((q + 2) * a2)
  const below = 3 * q + 2 * (1 - g)
  const c1 = g / below
  const c2 = (q - g) / below
  const c3 = (q + 2 - g) / below
  const inverseMean = 1 - a2 / q
  if (Math.abs(inverseMean) < 1e-6) return null
  const expected = 1 / inverseMean
  const variance = (2 / q) * ((1 + c1 * b) / ((1 - c2 * b) ** 2 * (1 - c3 * b)))
  const rho = variance / (2 * expected * expected)
  const df = 4 + (q + 2) / (q * rho - 1)
  const lambda = df / (expected * (df - 2))
  return Number.isFinite(df) && df > 0 && Number.isFinite(lambda) && lambda > 0 ? { lambda, df } : null
}
