import type { ReducedData } from './blocks.ts'
import { dot, invertPositive, times, traceOfProduct } from './cholesky.ts'
import { crossProducts } from './cross-products.ts'
import type { ProductsAndDerivatives } from './cross-products.ts'
import type { Criterion } from './ratio-search.ts'

export interface FixedUnitCriterion extends Criterion {
  /** Residual variance that goes with these ratios, in scaled units. */
  readonly residual: number
}

/**
 * −2 log restricted likelihood with units (and positions) fixed, the residual variance profiled out, at the ratios
 * γ = [σ²p/σ²e] or [σ²p/σ²e, σ²pu/σ²e], in scaled units and with every constant.
 *
 * @returns null where the fixed effects cannot be told apart or nothing is left over
 */
export function fixedUnitCriterion(data: ReducedData, ratios: readonly number[]): FixedUnitCriterion | null {
  const [panelist = 0, interaction = 0] = ratios
  const products = crossProducts(data, { panelist, interaction, residual: 1 })
  return criterionFrom(products, data.observations, ratios)
}

/** The same from products already summed at these ratios. */
export function criterionFrom(
  products: ProductsAndDerivatives,
  observations: number,
  ratios: readonly number[],
): FixedUnitCriterion | null {
  const size = products.xy.length
  const inverse = invertPositive(products.xx, size)
  const free = observations - size
  if (!inverse || free < 1) return null
  const effects = times(inverse.inverse, products.xy, size)
  const left = products.yy - dot(effects, products.xy)
  if (!(left > 1e-12)) return null
  const slope = ratios.map((_, c) => {
    const derivative = products.derivatives[c]!
    const fitted = times(derivative.xx, effects, size)
    const squares = derivative.yy - 2 * dot(effects, derivative.xy) + dot(effects, fitted)
    return derivative.trace - traceOfProduct(inverse.inverse, derivative.xx, size) - (free * squares) / left
  })
  const residual = left / free
  const value =
    free * (Math.log(residual) + 1 + Math.log(2 * Math.PI)) + products.logDeterminant + inverse.logDeterminant
  return { value, slope, residual }
}
