import type { CellTable } from './cell-table.ts'
import { isCannot } from './cannot.ts'
import { addListener } from './mixed-model/blocks.ts'
import type { Block, ReducedData } from './mixed-model/blocks.ts'
import { fitMixedModel, fitReduced } from './mixed-model/fit.ts'
import type { MixedFit } from './mixed-model/fit.ts'

/**
 * What the rest of the panel makes of each unit without one listener, in points: plain means of cell means in a complete
 * table, adjusted means of the model refitted without him in an incomplete one. Null where nobody else rated a unit, or
 * the rest is too thin for a model.
 *
 * Cost: units, or one refit from near by.
 *
 * @param fit the model with everybody, where there is one
 * @param complete every listener scored every unit
 */
export function meansWithoutListener(
  table: CellTable,
  fit: MixedFit | null,
  complete: boolean,
  listener: number,
): (number | null)[] {
  if (complete) return plainMeans(table, listener)
  const raters = Array.from({ length: table.units }, (_, unit) => others(table, listener, unit))
  if (!fit || fit.positions > 1 || raters.some((count) => count === 0)) {
    return afterDroppingUnits(table, listener, raters)
  }
  const data = reducedWithout(fit.data, table, listener)
  const repeated = data.observations > data.cells
  const again = fitReduced(data, repeated, 1, fit.ratios.slice(0, repeated ? 2 : 1))
  if (isCannot(again)) return raters.map(() => null)
  return unitMeans(again)
}

const unitMeans = (fit: MixedFit): number[] =>
  [...fit.data.centre].map((centre, unit) => centre + fit.data.scale * fit.kenwardRoger.effects[unit]!)

function plainMeans(table: CellTable, listener: number): (number | null)[] {
  return Array.from({ length: table.units }, (_, unit) => {
    let total = 0
    for (let other = 0; other < table.listeners; other++) {
      if (other !== listener) total += table.mean[other * table.units + unit]!
    }
    return table.listeners > 1 ? total / (table.listeners - 1) : null
  })
}

function others(table: CellTable, listener: number, unit: number): number {
  let count = 0
  for (let other = 0; other < table.listeners; other++) {
    if (other !== listener && table.count[other * table.units + unit]! > 0) count++
  }
  return count
}

function reducedWithout(data: ReducedData, table: CellTable, listener: number): ReducedData {
  const place = data.member[listener]!
  const old = data.blocks[place]!
  const block: { -readonly [K in keyof Block]: Block[K] } = {
    ...old,
    size: old.size - 1,
    sum: old.sum.slice(),
    products: old.products.slice(),
  }
  const y = [...old.unit].map(
    (unit) => (table.mean[listener * table.units + unit]! - data.centre[unit]!) / data.scale,
  )
  addListener(block, y, -1)
  const blocks = [...data.blocks]
  if (block.size > 0) blocks[place] = block
  else blocks.splice(place, 1)
  return {
    ...data,
    blocks,
    observations: data.observations - old.servings.reduce((total, n) => total + n, 0),
    cells: data.cells - old.unit.length,
    listeners: data.listeners - 1,
    withinYY: data.withinYY - table.within[listener]! / data.scale ** 2,
  }
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
