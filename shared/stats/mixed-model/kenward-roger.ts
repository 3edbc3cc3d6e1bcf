import type { Block, ReducedData } from './blocks.ts'
import { invertPositive, multiply, times, traceOfProduct } from './cholesky.ts'
import { blockInverse, crossProducts } from './cross-products.ts'
import type { Variances } from './cross-products.ts'

export interface KenwardRoger {
  readonly size: number
  /** Fixed effects b, and (X'V⁻¹X)⁻¹ = Φ, in scaled units. */
  readonly effects: Float64Array
  readonly covariance: Float64Array
  /** Φ with the correction for estimated variances. */
  readonly adjusted: Float64Array
  /** ΦPΦ for each component that the model holds. */
  readonly spreads: readonly Float64Array[]
  /** Covariance of the variance estimates: inverse of the expected information. */
  readonly weights: readonly (readonly number[])[]
}

/**
 * Kenward and Roger's (1997, Biometrics 53:983) correction: standard errors that know that the variances were
 * estimated, and degrees of freedom for each contrast. Expected information; derivatives with respect to the
 * variances, whose second derivatives are zero. A component estimated at zero keeps its row.
 *
 * @param components which of panelist (0), interaction (1), residual (2) the model holds
 * @returns null where variances or effects cannot be told apart
 */
export function kenwardRoger(
  data: ReducedData,
  variances: Variances,
  components: readonly number[],
): KenwardRoger | null {
  const size = data.columns
  const products = crossProducts(data, variances)
  const phi = invertPositive(products.xx, size)?.inverse
  if (!phi) return null
  const q = secondProducts(data, variances)
  const spread = components.map((c) => multiply(phi, products.derivatives[c]!.xx, size))
  const information = components.map((i, a) =>
    components.map((j, b) => {
      const { xx, trace } = q(i, j)
      return (trace - 2 * traceOfProduct(phi, xx, size) + traceOfProduct(spread[a]!, spread[b]!, size)) / 2
    }),
  )
  const weights = invertSmall(information)
  if (!weights) return null
  const middle = new Float64Array(size * size)
  components.forEach((i, a) =>
    components.forEach((j, b) => {
      const crossed = multiply(products.derivatives[i]!.xx, spread[b]!, size)
      const { xx } = q(i, j)
      const weight = weights[a]![b]!
      for (let e = 0; e < middle.length; e++) middle[e]! += weight * (xx[e]! - crossed[e]!)
    }),
  )
  const correction = multiply(multiply(phi, middle, size), phi, size)
  const adjusted = new Float64Array(size * size)
  for (let i = 0; i < size; i++) {
    for (let j = 0; j < size; j++) {
      const both = correction[i * size + j]! + correction[j * size + i]!
      adjusted[i * size + j] = phi[i * size + j]! + both
    }
  }
  return {
    size,
    effects: times(phi, products.xy, size),
    covariance: phi,
    adjusted,
    spreads: spread.map((left) => multiply(left, phi, size)),
    weights,
  }
}

/** Share of a variance's information that the others leave it, below which the data cannot tell it from them. */
const CONFOUNDED = 1e-6

type Second = (i: number, j: number) => { xx: Float64Array; trace: number }

/** X'V⁻¹G_iV⁻¹G_jV⁻¹X and tr(V⁻¹G_iV⁻¹G_j) for every pair of components, found once each. */
function secondProducts(data: ReducedData, variances: Variances): Second {
  const size = data.columns
  const found = new Map<number, { xx: Float64Array; trace: number }>()
  for (let i = 0; i < 3; i++) {
    for (let j = 0; j < 3; j++) found.set(3 * i + j, { xx: new Float64Array(size * size), trace: 0 })
  }
  const residual = found.get(8)!
  residual.trace = (data.observations - data.cells) / variances.residual ** 2
  data.withinXX.forEach((value, e) => (residual.xx[e]! += value / variances.residual ** 3))
  for (const block of data.blocks) {
    const inverse = blockInverse(block, variances)
    const k = block.unit.length
    const omega = new Float64Array(k * k)
    for (let i = 0; i < k; i++) {
      for (let j = 0; j < k; j++) {
        omega[i * k + j] = (i === j ? inverse.w[i]! : 0) - inverse.kappa * inverse.w[i]! * inverse.w[j]!
      }
    }
    const left = [0, 1, 2].map((c) => timesComponent(omega, block, c))
    const once = left.map((product) => timesOmega(product, inverse, k))
    for (let i = 0; i < 3; i++) {
      for (let j = 0; j < 3; j++) {
        const target = found.get(3 * i + j)!
        const twice = timesOmega(timesComponent(once[i]!, block, j), inverse, k)
        target.trace += block.size * traceOfProduct(left[i]!, left[j]!, k)
        scatter(target.xx, size, block, twice)
      }
    }
  }
  return (i, j) => found.get(3 * i + j)!
}

/** A G for a k × k matrix A and the derivative G of a component in cell means: J, I or diag(1/n). */
function timesComponent(a: Float64Array, block: Block, component: number): Float64Array {
  const k = block.unit.length
  const out = new Float64Array(k * k)
  for (let i = 0; i < k; i++) {
    let row = 0
    for (let j = 0; j < k; j++) row += a[i * k + j]!
    for (let j = 0; j < k; j++) {
      const own = a[i * k + j]!
      out[i * k + j] = component === 0 ? row : component === 1 ? own : own / block.servings[j]!
    }
  }
  return out
}

/** A Ω with Ω = diag(w) − κww', in k² steps. */
function timesOmega(
  a: Float64Array,
  { w, kappa }: { w: Float64Array; kappa: number },
  k: number,
): Float64Array {
  const out = new Float64Array(k * k)
  for (let i = 0; i < k; i++) {
    let along = 0
    for (let j = 0; j < k; j++) along += a[i * k + j]! * w[j]!
    for (let j = 0; j < k; j++) out[i * k + j] = a[i * k + j]! * w[j]! - kappa * along * w[j]!
  }
  return out
}

/** Adds size × X̄' H X̄ of one block. */
function scatter(target: Float64Array, size: number, block: Block, h: Float64Array): void {
  const k = block.unit.length
  const extra = block.position ? block.position.length / k : 0
  const columns = (cell: number): (readonly [number, number])[] => {
    const out: [number, number][] = [[block.unit[cell]!, 1]]
    for (let e = 0; e < extra; e++) {
      const share = block.position![cell * extra + e]!
      if (share !== 0) out.push([size - extra + e, share])
    }
    return out
  }
  const cells = Array.from({ length: k }, (_, cell) => columns(cell))
  for (let i = 0; i < k; i++) {
    for (let j = 0; j < k; j++) {
      const value = block.size * h[i * k + j]!
      for (const [row, left] of cells[i]!) {
        for (const [column, right] of cells[j]!) target[row * size + column]! += left * right * value
      }
    }
  }
}

/** Inverse of the information, scaled to a unit diagonal first so that only true confounding is refused. */
function invertSmall(matrix: readonly (readonly number[])[]): number[][] | null {
  const size = matrix.length
  const root = matrix.map((row, i) => Math.sqrt(row[i]!))
  if (root.some((value) => !(value > 0))) return null
  const scaled = Float64Array.from(
    matrix.flatMap((row, i) => row.map((value, j) => value / (root[i]! * root[j]!))),
  )
  const inverse = invertPositive(scaled, size, CONFOUNDED)?.inverse
  if (!inverse) return null
  return matrix.map((row, i) => row.map((_, j) => inverse[i * size + j]! / (root[i]! * root[j]!)))
}
