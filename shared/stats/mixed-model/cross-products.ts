import type { Block, ReducedData } from './blocks.ts'

/** Variances of listener, listener × unit and residual, in the data's scaled unit. */
export interface Variances {
  readonly panelist: number
  readonly interaction: number
  readonly residual: number
}

/** A'V⁻¹A for A = [X y], and log |V|. */
export interface Products {
  readonly xx: Float64Array
  readonly xy: Float64Array
  readonly yy: number
  readonly logDeterminant: number
}

/** For one component with derivative matrix G: tr(V⁻¹G) and A'V⁻¹GV⁻¹A. */
export interface Derivative {
  readonly trace: number
  readonly xx: Float64Array
  readonly xy: Float64Array
  readonly yy: number
}

export interface ProductsAndDerivatives extends Products {
  /** In the order panelist, interaction, residual. */
  readonly derivatives: readonly [Derivative, Derivative, Derivative]
}

/** The inverse of a block's covariance in cell means: diag(w) − κ w w', with w = 1/(σ²pu + σ²e/n). */
export interface BlockInverse {
  readonly w: Float64Array
  readonly total: number
  readonly kappa: number
}

export function blockInverse(block: Block, variances: Variances): BlockInverse {
  const w = block.servings.map((n) => 1 / (variances.interaction + variances.residual / n))
  let total = 0
  for (const value of w) total += value
  return { w, total, kappa: variances.panelist / (1 + variances.panelist * total) }
}

/**
 * V is block-diagonal by listener: σ²e I + σ²pu (same cell) + σ²p (same listener). Everything the likelihood, its
 * slope and the corrections need is summed over blocks here, in time linear in blocks.
 */
export function crossProducts(data: ReducedData, variances: Variances): ProductsAndDerivatives {
  const residual = variances.residual
  const main = empty(data.columns)
  const parts = [empty(data.columns), empty(data.columns), empty(data.columns)] as const
  let logDeterminant = (data.observations - data.cells) * Math.log(residual)
  addWithin(main, data, 1 / residual)
  addWithin(parts[2], data, 1 / residual ** 2)
  parts[2].trace += (data.observations - data.cells) / residual
  for (const block of data.blocks) logDeterminant += block.size * addBlock(block, variances, main, parts)
  return { xx: main.xx, xy: main.xy, yy: main.yy, logDeterminant, derivatives: parts }
}

type Sums = { trace: number; yy: number; readonly xx: Float64Array; readonly xy: Float64Array }

const empty = (size: number): Sums => ({
  trace: 0,
  yy: 0,
  xx: new Float64Array(size * size),
  xy: new Float64Array(size),
})

function addWithin(into: Sums, data: ReducedData, weight: number): void {
  into.yy += data.withinYY * weight
  if (data.columns === data.units) return
  data.withinXY.forEach((value, i) => (into.xy[i]! += value * weight))
  data.withinXX.forEach((value, i) => (into.xx[i]! += value * weight))
}

/** Adds one block to the products and their slopes; returns log |V| of one of its listeners. One pass: this is the hot loop. */
function addBlock(
  block: Block,
  variances: Variances,
  main: Sums,
  [listener, interaction, residual]: readonly [Sums, Sums, Sums],
): number {
  const { w, total, kappa } = blockInverse(block, variances)
  const { unit, servings, sum, products, size: m } = block
  const k = w.length
  const size = main.xy.length
  const shrink = 1 / (1 + variances.panelist * total)
  let logs = Math.log1p(variances.panelist * total)
  let squares = 0
  let shared = 0
  for (let i = 0; i < k; i++) {
    const wi = w[i]!
    const n = servings[i]!
    logs += Math.log(n / wi)
    squares += wi * wi
    shared += (wi * wi) / n
    const own = wi - kappa * wi * wi
    interaction.trace += m * own
    residual.trace += (m * own) / n
  }
  listener.trace += m * shrink * total
  for (let i = 0; i < k; i++) {
    const wi = w[i]!
    const perScore = 1 / servings[i]!
    const row = unit[i]!
    for (let j = 0; j < k; j++) {
      const wj = w[j]!
      const both = wi * wj
      const diagonal = i === j
      // Entries of Ω = diag(w) − κww', of Ω11'Ω, of ΩΩ and of Ω diag(1/n) Ω.
      const h0 = (diagonal ? wi : 0) - kappa * both
      const h1 = shrink * shrink * both
      const h2 = (diagonal ? both : 0) - kappa * both * (wi + wj - kappa * squares)
      const h3 =
        (diagonal ? both * perScore : 0) - kappa * both * (wi * perScore + wj / servings[j]! - kappa * shared)
      const at = row * size + unit[j]!
      main.xx[at]! += m * h0
      listener.xx[at]! += m * h1
      interaction.xx[at]! += m * h2
      residual.xx[at]! += m * h3
      const y = sum[j]!
      main.xy[row]! += h0 * y
      listener.xy[row]! += h1 * y
      interaction.xy[row]! += h2 * y
      residual.xy[row]! += h3 * y
      const yy = products[i * k + j]!
      main.yy += h0 * yy
      listener.yy += h1 * yy
      interaction.yy += h2 * yy
      residual.yy += h3 * yy
      if (block.position) {
        addPosition(main, block, block.position, h0, i, j)
        addPosition(listener, block, block.position, h1, i, j)
        addPosition(interaction, block, block.position, h2, i, j)
        addPosition(residual, block, block.position, h3, i, j)
      }
    }
  }
  return logs
}

/** The position columns' share of one entry h of a block's weight matrix. */
function addPosition(
  into: Sums,
  block: Block,
  position: Float64Array,
  h: number,
  i: number,
  j: number,
): void {
  const size = into.xy.length
  const extra = position.length / block.unit.length
  const first = size - extra
  for (let a = 0; a < extra; a++) {
    const left = position[i * extra + a]! * h
    if (left === 0) continue
    const row = first + a
    into.xy[row]! += left * block.sum[j]!
    into.xx[row * size + block.unit[j]!]! += block.size * left
    into.xx[block.unit[j]! * size + row]! += block.size * left
    for (let b = 0; b < extra; b++) {
      into.xx[row * size + first + b]! += block.size * left * position[j * extra + b]!
    }
  }
}
