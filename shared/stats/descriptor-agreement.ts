import type { Agreement } from './analysis-types.ts'
import { alphaWithJackknife } from './alpha-jackknife.ts'
import type { AlphaValue } from './alpha-jackknife.ts'
import type { Cannot } from './cannot.ts'
import { hasRepeats, isComplete } from './cell-table.ts'
import type { CellTable } from './cell-table.ts'
import { intraclass } from './icc.ts'
import { iccFromModel } from './icc-from-model.ts'
import { kendallW } from './kendall-w.ts'
import { rounded } from './mid-ranks.ts'
import type { MixedFit } from './mixed-model/fit.ts'

/**
 * Every measure of agreement on one descriptor: alpha on cell means with missing allowed; the six ICC and W on cell means
 * of the listeners who scored every unit; agreement of one serving from the model of all scores.
 */
export function descriptorAgreement(
  table: CellTable,
  fit: MixedFit | Cannot,
  draws: number,
  random: () => number,
): Agreement {
  const values = alphaValues(table)
  const complete = completeRows(table)
  const icc = intraclass(complete.length > 0 ? transpose(complete) : [])
  const classic = isComplete(table) && !hasRepeats(table) ? icc['ICC(2,1)'] : null
  return {
    krippendorffInterval: alphaWithJackknife(values, 'interval'),
    krippendorffOrdinal: alphaWithJackknife(
      values.map((entry) => ({ ...entry, value: rounded(entry.value) })),
      'ordinal',
    ),
    icc,
    listwise: { used: complete.length, leftOut: table.listeners - complete.length },
    iccFromModel: iccFromModel(table, fit, classic),
    kendallW: kendallW(complete, draws, random),
  }
}

function alphaValues(table: CellTable): AlphaValue[] {
  const values: AlphaValue[] = []
  table.count.forEach((count, cell) => {
    if (count === 0) return
    values.push({
      listener: Math.floor(cell / table.units),
      unit: cell % table.units,
      value: table.mean[cell]!,
    })
  })
  return values
}

function completeRows(table: CellTable): number[][] {
  const rows: number[][] = []
  for (let listener = 0; listener < table.listeners; listener++) {
    const from = listener * table.units
    const to = from + table.units
    if (table.count.subarray(from, to).every((count) => count > 0))
      rows.push([...table.mean.subarray(from, to)])
  }
  return rows
}

const transpose = (rows: readonly number[][]): number[][] =>
  (rows[0] ?? []).map((_, unit) => rows.map((row) => row[unit]!))
