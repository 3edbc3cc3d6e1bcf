import type { CellTable } from './cell-table.ts'
import { invertPositive, times } from './mixed-model/cholesky.ts'
import { crossProducts } from './mixed-model/cross-products.ts'
import type { Derivative, ProductsAndDerivatives } from './mixed-model/cross-products.ts'
import type { MixedFit } from './mixed-model/fit.ts'
import { onlyListener } from './mixed-model/one-listener.ts'
import { curvature, downhill, inRoots } from './mixed-model/ratio-search.ts'
import { criterionFrom, fixedUnitCriterion } from './mixed-model/reml-criterion.ts'

const SPREAD = [0.72, 0.85, 1, 1.18, 1.4]

/**
 * Refits of the model without each listener in turn, for large panels: the sums of all listeners are taken once at five
 * values of each variance ratio around the fit with everybody and interpolated between them; a listener's own are exact
 * and taken off. Same estimates as a refit from the start to some 1e-4 points; cost units² a listener instead of one
 * pass over all of them.
 *
 * @param fit the model with everybody, without position
 * @returns adjusted means in points without a listener, or null where a refit from the start is needed
 */
export function sharedRefits(table: CellTable, fit: MixedFit): (listener: number) => number[] | null {
  const { data, ratios } = fit
  if (ratios.some((ratio) => ratio === 0)) return () => null
  const nodes = ratios.map((ratio) => SPREAD.map((factor) => factor * ratio))
  const grid = combinations(nodes).map((at) => crossProducts(data, variances(at)))
  const theta = ratios.map(Math.sqrt)
  const hessian = curvature(
    inRoots((at) => fixedUnitCriterion(data, at)),
    theta,
  )
  return (listener) => {
    const own = onlyListener(data, table, listener)
    const observations = data.observations - own.observations
    let at = theta
    for (let round = 0; round < 20; round++) {
      const here = at.map((value) => value * value)
      if (here.some((ratio, c) => ratio < nodes[c]![0]! || ratio > nodes[c]![SPREAD.length - 1]!)) return null
      const weights = combinations(nodes.map((node, c) => lagrange(node, here[c]!))).map((factors) =>
        factors.reduce((product, factor) => product * factor, 1),
      )
      const rest = combined([...grid, crossProducts(own, variances(here))], [...weights, -1])
      const criterion = criterionFrom(rest, observations, here)
      if (!criterion) return null
      const step = downhill(
        hessian,
        criterion.slope.map((slope, c) => 2 * at[c]! * slope),
      )
      if (Math.max(...step.map(Math.abs)) < 1e-6) return means(fit, rest)
      at = at.map((value, c) => value - step[c]!)
    }
    return null
  }
}

function means({ data }: MixedFit, rest: ProductsAndDerivatives): number[] | null {
  const inverse = invertPositive(rest.xx, data.columns)?.inverse
  if (!inverse) return null
  const effects = times(inverse, rest.xy, data.columns)
  return [...data.centre].map((centre, unit) => centre + data.scale * effects[unit]!)
}

const variances = ([panelist = 0, interaction = 0]: readonly number[]) => ({
  panelist,
  interaction,
  residual: 1,
})

/** Every choice of one number from each list. */
const combinations = (lists: readonly (readonly number[])[]): number[][] =>
  lists.reduce<number[][]>(
    (found, list) => found.flatMap((head) => list.map((last) => [...head, last])),
    [[]],
  )

/** Weights of the nodes in the polynomial through them, at x. */
const lagrange = (nodes: readonly number[], x: number): number[] =>
  nodes.map((node, i) =>
    nodes.reduce((product, other, j) => (i === j ? product : (product * (x - other)) / (node - other)), 1),
  )

function combined(
  all: readonly ProductsAndDerivatives[],
  weights: readonly number[],
): ProductsAndDerivatives {
  const number = (pick: (from: ProductsAndDerivatives) => number): number =>
    all.reduce((total, from, i) => total + weights[i]! * pick(from), 0)
  const array = (pick: (from: ProductsAndDerivatives) => Float64Array): Float64Array => {
    const out = new Float64Array(pick(all[0]!).length)
    all.forEach((from, i) => {
      const values = pick(from)
      const weight = weights[i]!
      for (let e = 0; e < out.length; e++) out[e]! += weight * values[e]!
    })
    return out
  }
  const derivative = (c: 0 | 1 | 2): Derivative => ({
    trace: number((from) => from.derivatives[c].trace),
    xx: array((from) => from.derivatives[c].xx),
    xy: array((from) => from.derivatives[c].xy),
    yy: number((from) => from.derivatives[c].yy),
  })
  return {
    xx: array((from) => from.xx),
    xy: array((from) => from.xy),
    yy: number((from) => from.yy),
    logDeterminant: number((from) => from.logDeterminant),
    derivatives: [derivative(0), derivative(1), derivative(2)],
  }
}
