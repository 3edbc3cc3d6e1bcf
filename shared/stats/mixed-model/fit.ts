import { cannot } from '../cannot.ts'
import type { Cannot } from '../cannot.ts'
import { hasRepeats } from '../cell-table.ts'
import type { CellTable, Scores } from '../cell-table.ts'
import { reduceCells, reduceWithPosition } from './blocks.ts'
import type { ReducedData } from './blocks.ts'
import { contrast } from './contrasts.ts'
import { kenwardRoger } from './kenward-roger.ts'
import type { KenwardRoger } from './kenward-roger.ts'
import { searchRatios } from './ratio-search.ts'
import { fixedUnitCriterion } from './reml-criterion.ts'

export interface MixedFit {
  readonly data: ReducedData
  readonly hasInteraction: boolean
  readonly positions: number
  /** σ²p/σ²e and, where the model holds it, σ²pu/σ²e. */
  readonly ratios: readonly number[]
  /** Variances in points². */
  readonly panelist: number
  readonly interaction: number
  readonly residual: number
  readonly remlCriterion: number
  /** Corrections in scaled units: multiply effects and errors by `data.scale`, add `data.centre`. */
  readonly kenwardRoger: KenwardRoger
}

/**
 * Linear mixed model by REML: score ~ unit + (1 | panelist) [+ (1 | panelist:unit)] [+ position].
 *
 * Unit is fixed, the listener random; listener × unit is random when some listener scored some unit twice; position is
 * a factor where asked for. Complete, incomplete and unbalanced tables alike. Assumes normal errors with one variance
 * for all listeners and values missing for reasons that have nothing to do with the score. Not for fewer than two
 * listeners or units. Variances are in points², never below zero; one at zero stays in the model.
 *
 * Sources: Patterson & Thompson 1971 (REML); Kenward & Roger 1997. Cost: linear in listeners, cells² each, and one
 * block for all listeners with the same design.
 *
 * @param table one descriptor's scores as cells
 * @param withPosition the scores themselves, where position is to be adjusted for as a factor
 */
export function fitMixedModel(table: CellTable, withPosition: Scores | null = null): MixedFit | Cannot {
  if (table.listeners < 2) return cannot(table.listeners === 0 ? 'no-ratings' : 'fewer-than-two-listeners')
  if (table.units < 2) return cannot('fewer-than-two-units')
  const { centre, scale } = centring(table)
  if (scale === 0) return cannot('no-variation-left')
  const positions = withPosition?.positions ?? 1
  const data =
    withPosition && positions > 1
      ? reduceWithPosition(withPosition, table, centre, scale)
      : reduceCells(table, centre, scale)
  return fitReduced(data, hasRepeats(table), positions)
}

/** The same for data already reduced, from known ratios near by where there are some. */
export function fitReduced(
  data: ReducedData,
  hasInteraction: boolean,
  positions: number,
  start?: readonly number[],
): MixedFit | Cannot {
  if (data.observations - data.columns < 2) return cannot('not-estimable')
  if (hasInteraction && data.withinYY < 1e-18) return cannot('no-variation-left')
  const ratios = searchRatios((at) => fixedUnitCriterion(data, at), hasInteraction ? 2 : 1, start)
  if (!ratios) return cannot('not-estimable')
  const found = fixedUnitCriterion(data, ratios)
  if (!found) return cannot('did-not-converge')
  const [panelist = 0, interaction = 0] = ratios.map((ratio) => ratio * found.residual)
  const corrections = kenwardRoger(
    data,
    { panelist, interaction, residual: found.residual },
    hasInteraction ? [0, 1, 2] : [0, 2],
  )
  if (!corrections || hasNoErrorLeft(corrections, data.units)) return cannot('not-estimable')
  const square = data.scale * data.scale
  return {
    data,
    hasInteraction,
    positions,
    ratios,
    panelist: panelist * square,
    interaction: interaction * square,
    residual: found.residual * square,
    remlCriterion: found.value + (data.observations - data.columns) * Math.log(square),
    kenwardRoger: corrections,
  }
}

/** Differences on next to no degrees of freedom: the listeners' ties leave nothing to measure an error by. */
const hasNoErrorLeft = (corrections: KenwardRoger, units: number): boolean =>
  Array.from({ length: units - 1 }, (_, i) => {
    const between = [
      [0, 1],
      [i + 1, -1],
    ] as const
    return contrast(corrections, between).df
  }).some((df) => !(df >= FEWEST_DF))

const FEWEST_DF = 0.1

/** Each unit's mean of cell means, and the spread about them: taken off first, so that no digits are lost. */
function centring(table: CellTable): { centre: Float64Array; scale: number } {
  const centre = new Float64Array(table.units)
  const filled = new Float64Array(table.units)
  let squares = 0
  let cells = 0
  table.mean.forEach((mean, cell) => {
    if (!table.count[cell]) return
    centre[cell % table.units]! += mean
    filled[cell % table.units]!++
  })
  for (let unit = 0; unit < table.units; unit++) centre[unit]! /= filled[unit]!
  table.mean.forEach((mean, cell) => {
    if (!table.count[cell]) return
    squares += (mean - centre[cell % table.units]!) ** 2
    cells++
  })
  for (const within of table.within) squares += within
  const size = Math.max(...centre.map(Math.abs))
  const scale = Math.sqrt(squares / cells)
  return { centre, scale: scale > 1e-9 * size ? scale : 0 }
}
