import type { Figure, PairDifference, UnitSummary } from './analysis-types.ts'
import { cannot, isCannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import type { CellTable } from './cell-table.ts'
import type { DescriptorData } from './descriptor-data.ts'
import { hinges } from './median.ts'
import { adjustedMeans, comparisonBars } from './mixed-model/means.ts'
import type { MixedFit } from './mixed-model/fit.ts'
import { mean, standardDeviation } from './moments.ts'

/**
 * What is said of each unit on one descriptor: how many scores and people, the middle and the middle half of the raw
 * scores, and the adjusted mean with its interval. Scores in points of the round's scale.
 */
export function unitSummaries(
  data: DescriptorData,
  table: CellTable,
  fit: MixedFit | Cannot,
  pairs: readonly PairDifference[] | Cannot,
): Record<string, UnitSummary> {
  const means = isCannot(fit) ? null : adjustedMeans(fit)
  const bars = isCannot(pairs) ? null : comparisonBars(pairs, data.scoredUnits)
  const scores = scoresByUnit(data)
  const columnOf = new Map(data.scoredUnits.map((name, i) => [name, i]))
  return Object.fromEntries(
    data.units.map((unit) => {
      const column = columnOf.get(unit)
      const own = column === undefined ? [] : scores[column]!
      const reason = isCannot(fit) ? fit : cannot('no-ratings')
      const found = column === undefined ? undefined : means?.[column]
      const summary: UnitSummary = {
        n: own.length,
        listeners: column === undefined ? 0 : raters(table, column),
        cantTell: data.cantTellByUnit.get(unit) ?? 0,
        ...describe(own),
        ...(found ?? {
          adjustedMean: reason,
          standardError: reason,
          df: reason,
          low: reason,
          high: reason,
        }),
        comparisonBar: bars?.get(unit) ?? reason,
      }
      return [unit, summary]
    }),
  )
}

function describe(own: readonly number[]): Record<'mean' | 'median' | 'q1' | 'q3' | 'sd', Figure> {
  if (own.length === 0) {
    const none = cannot('no-ratings')
    return { mean: none, median: none, q1: none, q3: none, sd: none }
  }
  return {
    mean: mean(own),
    ...hinges(own),
    sd: own.length > 1 ? standardDeviation(own) : cannot('fewer-than-two-scores'),
  }
}

function scoresByUnit({ scores }: DescriptorData): number[][] {
  const lists = Array.from({ length: scores.units }, (): number[] => [])
  scores.score.forEach((score, i) => lists[scores.unit[i]!]!.push(score))
  return lists
}

function raters(table: CellTable, unit: number): number {
  let count = 0
  for (let listener = 0; listener < table.listeners; listener++) {
    if (table.count[listener * table.units + unit]! > 0) count++
  }
  return count
}
