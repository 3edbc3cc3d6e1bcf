import type { PanelistSummary } from './analysis-types.ts'
import { cannot, isCannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { isComplete } from './cell-table.ts'
import type { CellTable } from './cell-table.ts'
import type { DescriptorData } from './descriptor-data.ts'
import { listenerAgreement } from './listener-agreement.ts'
import { discrimination, FEWEST_ERROR_DF } from './listener-discrimination.ts'
import type { MixedFit } from './mixed-model/fit.ts'
import { meansWithoutListener } from './without-listener.ts'

/**
 * What is said of each listener on one descriptor. Correlation and slope need three units in a complete table, four in
 * an incomplete one.
 */
export function panelistSummaries(
  data: DescriptorData,
  table: CellTable,
  fit: MixedFit | Cannot,
): Record<string, PanelistSummary> {
  const complete = isComplete(table)
  const withoutHim = meansWithoutListener(table, isCannot(fit) ? null : fit, complete)
  const scores = scoresByListener(data)
  const rowOf = new Map(data.scoredPanelists.map((name, i) => [name, i]))
  return Object.fromEntries(
    data.panelists.map((panelist) => {
      const row = rowOf.get(panelist)
      const cantTell = data.cantTellByPanelist.get(panelist) ?? 0
      if (row === undefined) return [panelist, nothingSaid(cantTell)]
      const byUnit = scores[row]!
      const own = discrimination(byUnit, FEWEST_ERROR_DF)
      const rest = withoutHim(row)
      const units = rest.flatMap((value, unit) => (value !== null && byUnit[unit]!.length > 0 ? [unit] : []))
      const compared =
        units.length === 0
          ? noRest()
          : listenerAgreement(
              units.map((unit) => table.mean[row * table.units + unit]!),
              units.map((unit) => rest[unit]!),
              complete ? 3 : 4,
            )
      const summary: PanelistSummary = {
        discriminationF: own.f,
        discriminationP: own.p,
        repeatability: own.repeatability,
        ...compared,
        scores: byUnit.reduce((total, list) => total + list.length, 0),
        cantTell,
      }
      return [panelist, summary]
    }),
  )
}

function noRest(): Pick<PanelistSummary, 'agreement' | 'slope' | 'bias'> {
  const reason = cannot('fewer-than-two-listeners')
  return { agreement: reason, slope: reason, bias: reason }
}

function nothingSaid(cantTell: number): PanelistSummary {
  const none = cannot('no-ratings-by-this-listener')
  return {
    discriminationF: none,
    discriminationP: none,
    repeatability: none,
    agreement: none,
    slope: none,
    bias: none,
    scores: 0,
    cantTell,
  }
}

function scoresByListener({ scores }: DescriptorData): number[][][] {
  const lists = Array.from({ length: scores.listeners }, () =>
    Array.from({ length: scores.units }, (): number[] => []),
  )
  scores.score.forEach((score, i) => lists[scores.listener[i]!]![scores.unit[i]!]!.push(score))
  return lists
}
