import type { IccEstimate, IccFromModel } from './analysis-types.ts'
import { cannot, isCannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { hasRepeats, isComplete } from './cell-table.ts'
import type { CellTable } from './cell-table.ts'
import { fQuantile } from './fisher-f.ts'
import { fitAllRandom } from './mixed-model/all-random.ts'
import type { RandomComponents } from './mixed-model/all-random.ts'
import { invertPositive, times, dot } from './mixed-model/cholesky.ts'
import type { MixedFit } from './mixed-model/fit.ts'
import { sumOfSquares } from './moments.ts'

/**
 * Agreement from the all-random model: of one listener with one serving (absolute), of the panel's mean, and of one
 * listener leaving out how high he rates throughout.
 *
 * single = σ²u/(σ²u+σ²p+σ²pu+σ²e); average = σ²u/(σ²u+(σ²p+σ²pu)/h+σ²e/g) with h and g the harmonic means over units of
 * listeners and of servings; consistency leaves σ²p out. Use it whenever anything came back or a cell is missing;
 * without repeats and holes it is ICC(2,1), ICC(2,k) and ICC(3,1), negative values apart (a variance is never below 0).
 *
 * Interval of `single`: in a complete table without repeats that of Shrout & Fleiss for ICC(2,1). Otherwise the same
 * argument on the model's components: F of units over F(.975; t−1, v), where v is Satterthwaite's df of the mean
 * squares that the components stand for, counts replaced by their harmonic means and the precision of the unit means
 * taken from the model. Units count as drawn from many, so few units make it wide. Limits of `average` follow from it
 * by the generalised Spearman–Brown step.
 *
 * Sources: McGraw & Wong 1996; Satterthwaite 1946. Cost: one fit.
 *
 * @param fixed the model with units fixed, for the interval
 * @param shroutFleiss ICC(2,1) of the same table, where it is complete
 */
export function iccFromModel(
  table: CellTable,
  fixed: MixedFit | Cannot,
  shroutFleiss: IccEstimate | Cannot | null,
): IccFromModel | Cannot {
  const random = fitAllRandom(table, isCannot(fixed) ? undefined : [unitRatio(fixed), ...fixed.ratios])
  if (isCannot(random)) return random
  const { unit, panelist, interaction = 0, residual } = random
  const single = unit / (unit + panelist + interaction + residual)
  const noise = noiseOfMean(table, random)
  const classic = shroutFleiss && !isCannot(shroutFleiss) && isComplete(table) && !hasRepeats(table)
  const limits = classic
    ? { low: shroutFleiss.low, high: shroutFleiss.high }
    : isCannot(fixed)
      ? {}
      : limitsFromComponents(fixed, single)
  const low = limits.low === undefined ? undefined : Math.min(limits.low, single)
  const high = limits.high === undefined ? undefined : Math.max(limits.high, single)
  const ratio = noise / (panelist + interaction + residual)
  const step = (limit: number | undefined): number | Cannot => {
    if (limit === undefined) return cannot('not-estimable')
    const below = limit + ratio * (1 - limit)
    return below > 0 ? limit / below : cannot('not-estimable')
  }
  return {
    single,
    singleLow: low ?? cannot('not-estimable'),
    singleHigh: high ?? cannot('not-estimable'),
    singleMethod: classic
      ? 'Shrout and Fleiss, ICC(2,1), Satterthwaite df'
      : 'F of units on the model’s components, Satterthwaite df',
    average: unit / (unit + noise),
    averageLow: step(low),
    averageHigh: step(high),
    consistency: unit / (unit + interaction + residual),
    varianceComponents: {
      unit,
      panelist,
      'panelist:unit': random.interaction ?? cannot('no-repeats'),
      residual,
    },
  }
}

/** Spread of the adjusted means over the residual: where the search for the unit's variance begins. */
function unitRatio({ data, kenwardRoger, residual }: MixedFit): number {
  const means = [...data.centre].map((centre, unit) => centre + data.scale * kenwardRoger.effects[unit]!)
  return sumOfSquares(means) / (means.length - 1) / residual
}

/** Variance of a unit's mean over the panel: (σ²p + σ²pu)/h + σ²e/g. */
function noiseOfMean(table: CellTable, { panelist, interaction = 0, residual }: RandomComponents): number {
  let listeners = 0
  let servings = 0
  for (let unit = 0; unit < table.units; unit++) {
    let cells = 0
    let scores = 0
    for (let listener = 0; listener < table.listeners; listener++) {
      const count = table.count[listener * table.units + unit]!
      if (count > 0) cells++
      scores += count
    }
    listeners += 1 / cells
    servings += 1 / scores
  }
  return ((panelist + interaction) * listeners + residual * servings) / table.units
}

function limitsFromComponents(fit: MixedFit, single: number): { low?: number; high?: number } {
  const { panelist, interaction, residual, data } = fit
  const units = data.units
  const wald = unadjustedF(fit)
  const dfCells = data.cells - data.listeners - units + 1
  if (wald === null || dfCells < 1) return {}
  let inverse = 0
  let perListener = 0
  for (const block of data.blocks) {
    for (const n of block.servings) inverse += block.size / n
    perListener += block.size / block.unit.length
  }
  const servings = data.cells / inverse
  const rated = data.listeners / perListener
  const cellSquare = servings * interaction + residual
  const listenerSquare = servings * rated * panelist + cellSquare
  const error = meanErrorOfDifference(fit)
  const total = panelist + interaction + residual
  const odds = Math.max(0, single) / (1 - Math.max(0, single))
  const parts: [number, number][] = [
    [(odds / (servings * rated)) * listenerSquare, data.listeners - 1],
    [(odds * (1 / servings - 1 / (servings * rated)) + error / cellSquare) * cellSquare, dfCells],
    [odds * (1 - 1 / servings) * residual, data.observations - data.cells],
  ]
  let sum = 0
  let spread = 0
  for (const [part, df] of parts) {
    sum += part
    if (df > 0) spread += (part * part) / df
  }
  const v = (sum * sum) / spread
  const limit = (ratio: number): number | undefined => {
    const at = (error * (wald / ratio - 1)) / total
    return 1 + at > 0 ? at / (1 + at) : undefined
  }
  const low = limit(fQuantile(0.025, units - 1, v))
  const high = limit(1 / fQuantile(0.025, v, units - 1))
  return { ...(low === undefined ? {} : { low }), ...(high === undefined ? {} : { high }) }
}

/** Wald's F of units on the covariance without corrections: in a complete table the F of the mean squares. */
function unadjustedF(fit: MixedFit): number | null {
  const { covariance, effects, size } = fit.kenwardRoger
  const { units, centre, scale } = fit.data
  const q = units - 1
  const mean = (unit: number): number => centre[unit]! / scale + effects[unit]!
  const at = (i: number, j: number): number => covariance[i * size + j]!
  const form = new Float64Array(q * q)
  for (let a = 0; a < q; a++) {
    for (let b = 0; b < q; b++) form[a * q + b] = at(0, 0) - at(0, b + 1) - at(a + 1, 0) + at(a + 1, b + 1)
  }
  const inverse = invertPositive(form, q)?.inverse
  if (!inverse) return null
  const differences = Float64Array.from({ length: q }, (_, i) => mean(0) - mean(i + 1))
  return dot(differences, times(inverse, differences, q)) / q
}

/** Half the mean variance of a difference between two adjusted means, in points². */
function meanErrorOfDifference(fit: MixedFit): number {
  const { covariance, size } = fit.kenwardRoger
  const { units, scale } = fit.data
  let total = 0
  for (let a = 0; a < units; a++) {
    for (let b = 0; b < a; b++) {
      total += covariance[a * size + a]! + covariance[b * size + b]! - 2 * covariance[a * size + b]!
    }
  }
  return (scale * scale * total) / (units * (units - 1))
}
