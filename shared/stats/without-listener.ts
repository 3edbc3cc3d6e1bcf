import { isCannot } from './cannot.ts'
import type { CellTable } from './cell-table.ts'
import { fitMixedModel, fitReduced } from './mixed-model/fit.ts'
import type { MixedFit } from './mixed-model/fit.ts'
import { withoutListener } from './mixed-model/one-listener.ts'
import { sharedRefits } from './shared-refits.ts'

/** From this many listeners on, refits share their sums (see `sharedRefits`). */
const SHARED_FROM = 40

/**
 * What the rest of the panel makes of each unit without one listener, in points: plain means of cell means in a complete
 * table, adjusted means of the model refitted without him in an incomplete one. Null where nobody else rated a unit, or
 * the rest is too thin for a model. Cost: units in a complete table, else a refit each.
 *
 * @param fit the model with everybody, where there is one
 * @param complete every listener scored every unit
 * @returns for a listener's row, one figure for each unit
 */
export function meansWithoutListener(
  table: CellTable,
  fit: MixedFit | null,
  complete: boolean,
): (listener: number) => (number | null)[] {
  if (complete) return plainMeans(table)
  const raters = ratersOf(table)
  const plain = fit?.positions === 1 ? fit : null
  const shared = plain && table.listeners >= SHARED_FROM ? sharedRefits(table, plain) : null
  return (listener) => {
    const left = raters.map((count, unit) => count - Math.min(1, table.count[listener * table.units + unit]!))
    if (!plain || left.some((count) => count === 0)) return afterDroppingUnits(table, listener, left)
    const quick = shared?.(listener)
    if (quick) return quick
    const data = withoutListener(plain.data, table, listener)
    const repeated = data.observations > data.cells
    const again = fitReduced(data, repeated, 1, plain.ratios.slice(0, repeated ? 2 : 1))
    return isCannot(again) ? raters.map(() => null) : unitMeans(again)
  }
}

const unitMeans = (fit: MixedFit): number[] =>
  [...fit.data.centre].map((centre, unit) => centre + fit.data.scale * fit.kenwardRoger.effects[unit]!)

function plainMeans(table: CellTable): (listener: number) => (number | null)[] {
  const totals = new Float64Array(table.units)
  table.mean.forEach((mean, cell) => (totals[cell % table.units]! += mean))
  const others = table.listeners - 1
  return (listener) =>
    [...totals].map((total, unit) =>
      others > 0 ? (total - table.mean[listener * table.units + unit]!) / others : null,
    )
}

function ratersOf(table: CellTable): number[] {
  const raters = new Array<number>(table.units).fill(0)
  table.count.forEach((count, cell) => {
    if (count > 0) raters[cell % table.units]!++
  })
  return raters
}

/** A new table without the listener and without units that only he rated, fitted from the start. */
function afterDroppingUnits(
  table: CellTable,
  listener: number,
  raters: readonly number[],
): (number | null)[] {
  const units = raters.flatMap((count, unit) => (count > 0 ? [unit] : []))
  const rows = Array.from({ length: table.listeners }, (_, row) => row).filter((row) => row !== listener)
  const pick = (from: Int32Array | Float64Array): number[] =>
    rows.flatMap((row) => units.map((unit) => from[row * table.units + unit]!))
  const rest: CellTable = {
    listeners: rows.length,
    units: units.length,
    count: Int32Array.from(pick(table.count)),
    mean: Float64Array.from(pick(table.mean)),
    within: Float64Array.from(rows, (row) => table.within[row]!),
  }
  const fit = fitMixedModel(rest)
  if (isCannot(fit)) return raters.map(() => null)
  const means = unitMeans(fit)
  return raters.map((_, unit) => means[units.indexOf(unit)] ?? null)
}
