import type {
  Analysis,
  AnalyseOptions,
  Component,
  DescriptorAnalysis,
  LongRating,
  Model,
} from './analysis-types.ts'
import { blockRanks } from './block-ranks.ts'
import { cannot, isCannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { cellMean, cellTable } from './cell-table.ts'
import type { CellTable } from './cell-table.ts'
import { descriptorAgreement } from './descriptor-agreement.ts'
import { byDescriptor, byName, descriptorData } from './descriptor-data.ts'
import { durbin } from './durbin.ts'
import { fitMixedModel } from './mixed-model/fit.ts'
import type { MixedFit } from './mixed-model/fit.ts'
import { pairDifferences, unitTest } from './mixed-model/means.ts'
import { panelistSummaries } from './panelist-summaries.ts'
import { plain } from './plain.ts'
import { seededRandom } from './random.ts'
import { unitSummaries } from './unit-summaries.ts'

/** Stored with every result; raised when a method or convention changes a figure. */
export const STATISTICS_VERSION = '1.0.0'

export const DEFAULT_DRAWS = 2000
export const DEFAULT_SEED = 'scrim'

/**
 * The whole analysis of a round, descriptor by descriptor: what the agreement screen, the verdict and the command show.
 *
 * Pure and repeatable: the same rows in any order, draws and seed give the same result to the last digit. Plain data
 * that survives JSON; what cannot be said is `{ ok: false, reason }`. Cost: linear in ratings for complete tables; one
 * refit a listener for incomplete ones.
 *
 * @param rows long form; a null score is missing
 * @throws RangeError when a score is not finite or draws is not a whole number ≥ 0
 */
export function analyse(rows: readonly LongRating[], options: AnalyseOptions = {}): Analysis {
  const { draws = DEFAULT_DRAWS, seed = DEFAULT_SEED, position = false } = options
  if (!Number.isInteger(draws) || draws < 0) throw new RangeError(`draws: ${draws}`)
  const groups = byDescriptor(rows)
  const names = (pick: (row: LongRating) => string): string[] => [...new Set(rows.map(pick))].sort(byName)
  return plain({
    version: STATISTICS_VERSION,
    seed,
    draws,
    position,
    order: {
      descriptors: [...groups.keys()],
      units: names((row) => row.unit),
      panelists: names((row) => row.panelist),
    },
    descriptors: Object.fromEntries(
      [...groups].map(([descriptor, own]) => [
        descriptor,
        analyseDescriptor(own, draws, seededRandom(`${seed}|${descriptor}`), position),
      ]),
    ),
  })
}

function analyseDescriptor(
  rows: readonly LongRating[],
  draws: number,
  random: () => number,
  position: boolean,
): DescriptorAnalysis {
  const data = descriptorData(rows)
  const table = cellTable(data.scores)
  const fit = fitMixedModel(table, position ? data.scores : null)
  const pairs = isCannot(fit) ? fit : pairDifferences(fit, data.scoredUnits)
  const cells = table.count.reduce((total, count) => total + (count > 0 ? 1 : 0), 0)
  const ranked = cellRows(table)
  return {
    counts: {
      panelists: data.scoredPanelists.length,
      units: data.units.length,
      ratings: data.scores.score.length,
      missingCells: data.scoredPanelists.length * data.units.length - cells,
      cantTell: [...data.cantTellByUnit.values()].reduce((total, count) => total + count, 0),
    },
    units: unitSummaries(data, table, fit, pairs),
    agreement: descriptorAgreement(table, fit, draws, random),
    model: isCannot(fit) ? fit : modelOf(fit),
    pairs,
    durbin: table.listeners === 0 ? cannot('no-ratings') : durbin(ranked),
    blockRanks: table.listeners === 0 ? cannot('no-ratings') : blockRanks(ranked),
    panelists: panelistSummaries(data, table, fit),
  }
}

function modelOf(fit: MixedFit): Model {
  const interaction: number | Cannot = fit.hasInteraction ? fit.interaction : cannot('no-repeats')
  const boundary: Component[] = []
  if (fit.panelist === 0) boundary.push('panelist')
  if (interaction === 0) boundary.push('panelist:unit')
  const terms = ['unit', ...(fit.positions > 1 ? ['position'] : []), '(1 | panelist)']
  if (fit.hasInteraction) terms.push('(1 | panelist:unit)')
  return {
    formula: `score ~ ${terms.join(' + ')}`,
    method: 'REML, Kenward–Roger',
    remlCriterion: fit.remlCriterion,
    varianceComponents: { panelist: fit.panelist, 'panelist:unit': interaction, residual: fit.residual },
    boundary,
    unitTest: unitTest(fit),
  }
}

const cellRows = (table: CellTable): (number | null)[][] =>
  Array.from({ length: table.listeners }, (_, listener) =>
    Array.from({ length: table.units }, (_, unit) => cellMean(table, listener, unit)),
  )
