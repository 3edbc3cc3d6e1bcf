import { cannot } from '../cannot.ts'
import type { Cannot } from '../cannot.ts'
import { hasRepeats } from '../cell-table.ts'
import type { CellTable } from '../cell-table.ts'
import { reduceCells } from './blocks.ts'
import type { ReducedData } from './blocks.ts'
import { dot, invertPositive, multiply, times, traceOfProduct } from './cholesky.ts'
import { crossProducts } from './cross-products.ts'
import { searchRatios } from './ratio-search.ts'
import type { Criterion } from './ratio-search.ts'

/** Variances in points². */
export interface RandomComponents {
  readonly unit: number
  readonly panelist: number
  /** Absent where nobody scored a unit twice: it is then part of the residual. */
  readonly interaction?: number
  readonly residual: number
  /** Overall mean, in points, and −2 log restricted likelihood. */
  readonly mean: number
  readonly remlCriterion: number
}

/**
 * Variance components with units random as well: score ~ 1 + (1 | unit) + (1 | panelist) [+ (1 | panelist:unit)], by
 * REML. What agreement between listeners is read from, in complete and incomplete tables alike.
 *
 * Not for judging single units. Assumes normal effects; few units give a loose unit variance however many listeners
 * came. Never below zero. Cost: linear in listeners, units³ a step.
 *
 * Source: Patterson & Thompson 1971; the unit's column joins by Woodbury's identity.
 *
 * @param start ratios over the residual to start from: unit, panelist and, with repeats, listener × unit
 */
export function fitAllRandom(table: CellTable, start?: readonly number[]): RandomComponents | Cannot {
  if (table.listeners < 2) return cannot(table.listeners === 0 ? 'no-ratings' : 'fewer-than-two-listeners')
  if (table.units < 2) return cannot('fewer-than-two-units')
  const { centre, scale } = overallCentre(table)
  if (scale === 0) return cannot('no-variation')
  const data = reduceCells(table, new Float64Array(table.units).fill(centre), scale)
  const withInteraction = hasRepeats(table)
  if (data.observations < (withInteraction ? 5 : 4)) return cannot('not-estimable')
  if (withInteraction && data.withinYY < 1e-18) return cannot('no-variation-left')
  const ratios = searchRatios((at) => allRandomCriterion(data, at), withInteraction ? 3 : 2, start)
  const found = ratios && allRandomCriterion(data, ratios)
  if (!found) return cannot('not-estimable')
  const variance = (ratio: number): number => ratio * found.residual * scale * scale
  return {
    unit: variance(ratios[0] ?? 0),
    panelist: variance(ratios[1] ?? 0),
    ...(withInteraction ? { interaction: variance(ratios[2] ?? 0) } : {}),
    residual: variance(1),
    mean: centre + scale * found.mean,
    remlCriterion: found.value + (data.observations - 1) * Math.log(scale * scale),
  }
}

interface AllRandomCriterion extends Criterion {
  readonly residual: number
  readonly mean: number
}

/** Criterion and slope at γ = [unit, panelist, interaction] over the residual, which is profiled out. */
function allRandomCriterion(data: ReducedData, ratios: readonly number[]): AllRandomCriterion | null {
  const [unit = 0, panelist = 0, interaction = 0] = ratios
  const size = data.units
  const base = crossProducts(data, { panelist, interaction, residual: 1 })
  const widened = base.xx.map((value, e) => unit * value + (e % (size + 1) === 0 ? 1 : 0))
  const inverse = invertPositive(widened, size)
  if (!inverse) return null
  const b = inverse.inverse
  const k = multiply(base.xx, b, size)
  const rho = times(b, base.xy, size)
  const ones = new Float64Array(size).fill(1)
  const kOnes = times(k, ones, size)
  const information = dot(ones, kOnes)
  const score = dot(ones, rho)
  const squares = base.yy - unit * dot(base.xy, rho)
  const left = squares - (score * score) / information
  const free = data.observations - 1
  if (!(information > 0) || !(left > 1e-12)) return null
  const value =
    free * (Math.log(left / free) + 1 + Math.log(2 * Math.PI)) +
    base.logDeterminant +
    inverse.logDeterminant +
    Math.log(information)
  const slopeOf = (logDet: number, dSquares: number, dScore: number, dInformation: number): number => {
    const ratio = score / information
    const dLeft = dSquares - 2 * ratio * dScore + ratio * ratio * dInformation
    return logDet + dInformation / information + (free * dLeft) / left
  }
  const slope = [
    slopeOf(trace(k, size), -dot(rho, rho), -dot(kOnes, rho), -dot(kOnes, kOnes)),
    ...ratios.slice(1).map((_, c) => {
      const part = base.derivatives[c]!
      const q = rho.map((entry) => unit * entry)
      const bOnes = times(b, ones, size)
      const inner = times(part.xx, q, size)
      const change = part.xy.map((entry, i) => entry - inner[i]!)
      return slopeOf(
        part.trace - unit * traceOfProduct(b, part.xx, size),
        -(part.yy - 2 * dot(q, part.xy) + dot(q, inner)),
        -dot(bOnes, change),
        -dot(bOnes, times(part.xx, bOnes, size)),
      )
    }),
  ]
  return { value, slope, residual: left / free, mean: score / information }
}

function trace(matrix: Float64Array, size: number): number {
  let total = 0
  for (let i = 0; i < size; i++) total += matrix[i * size + i]!
  return total
}

function overallCentre(table: CellTable): { centre: number; scale: number } {
  let centre = 0
  let cells = 0
  table.mean.forEach((mean, cell) => {
    if (!table.count[cell]) return
    cells++
    centre += (mean - centre) / cells
  })
  let squares = 0
  table.mean.forEach((mean, cell) => {
    if (table.count[cell]) squares += (mean - centre) ** 2
  })
  for (const within of table.within) squares += within
  const scale = Math.sqrt(squares / cells)
  return { centre, scale: scale > 1e-10 * Math.abs(centre) ? scale : 0 }
}
