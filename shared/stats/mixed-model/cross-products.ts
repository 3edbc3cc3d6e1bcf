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
  const size = data.columns
  const residual = variances.residual
  const main = new Accumulator(size)
  const parts = [new Accumulator(size), new Accumulator(size), new Accumulator(size)] as const
  let logDeterminant = (data.observations - data.cells) * Math.log(residual)
  main.addWithin(data, 1 / residual)
  parts[2].addWithin(data, 1 / residual ** 2)
  parts[2].trace += (data.observations - data.cells) / residual
  for (const block of data.blocks) {
    const { w, total, kappa } = blockInverse(block, variances)
    const k = w.length
    let logs = Math.log1p(variances.panelist * total)
    for (let i = 0; i < k; i++) logs += Math.log(block.servings[i]! / w[i]!)
    logDeterminant += block.size * logs
    const square = w.map((value) => value * value)
    const shared = w.map((value, i) => (value * value) / block.servings[i]!)
    const shrink = 1 / (1 + variances.panelist * total)
    main.addBlock(block, (i, j) => (i === j ? w[i]! : 0) - kappa * w[i]! * w[j]!)
    parts[0].addBlock(block, (i, j) => shrink * shrink * w[i]! * w[j]!)
    parts[1].addBlock(block, sandwich(w, square, kappa))
    parts[2].addBlock(block, sandwich(w, shared, kappa))
    let diagonal = 0
    let diagonalShared = 0
    for (let i = 0; i < k; i++) {
      const own = w[i]! - kappa * w[i]! * w[i]!
      diagonal += own
      diagonalShared += own / block.servings[i]!
    }
    parts[0].trace += block.size * shrink * total
    parts[1].trace += block.size * diagonal
    parts[2].trace += block.size * diagonalShared
  }
  return { xx: main.xx, xy: main.xy, yy: main.yy, logDeterminant, derivatives: parts }
}

/** (diag(w) − κww') D (diag(w) − κww') where `a` = w²d. */
function sandwich(w: Float64Array, a: Float64Array, kappa: number): (i: number, j: number) => number {
  let sum = 0
  for (const value of a) sum += value
  return (i, j) =>
    (i === j ? a[i]! : 0) - kappa * (w[i]! * a[j]! + a[i]! * w[j]!) + kappa * kappa * sum * w[i]! * w[j]!
}

class Accumulator implements Derivative {
  trace = 0
  yy = 0
  readonly xx: Float64Array
  readonly xy: Float64Array
  readonly #size: number

  constructor(size: number) {
    this.#size = size
    this.xx = new Float64Array(size * size)
    this.xy = new Float64Array(size)
  }

  addWithin(data: ReducedData, weight: number): void {
    this.yy += data.withinYY * weight
    if (data.columns === data.units) return
    data.withinXY.forEach((value, i) => (this.xy[i]! += value * weight))
    data.withinXX.forEach((value, i) => (this.xx[i]! += value * weight))
  }

  addBlock(block: Block, weight: (i: number, j: number) => number): void {
    const k = block.unit.length
    const size = this.#size
    for (let i = 0; i < k; i++) {
      const row = block.unit[i]!
      for (let j = 0; j < k; j++) {
        const h = weight(i, j)
        this.xx[row * size + block.unit[j]!]! += block.size * h
        this.xy[row]! += h * block.sum[j]!
        this.yy += h * block.products[i * k + j]!
        if (block.position) this.#addPosition(block, block.position, h, i, j)
      }
    }
  }

  #addPosition(block: Block, position: Float64Array, h: number, i: number, j: number): void {
    const size = this.#size
    const extra = position.length / block.unit.length
    const first = size - extra
    for (let a = 0; a < extra; a++) {
      const left = position[i * extra + a]! * h
      if (left === 0) continue
      const row = first + a
      this.xy[row]! += left * block.sum[j]!
      this.xx[row * size + block.unit[j]!]! += block.size * left
      this.xx[block.unit[j]! * size + row]! += block.size * left
      for (let b = 0; b < extra; b++)
        this.xx[row * size + first + b]! += block.size * left * position[j * extra + b]!
    }
  }
}
