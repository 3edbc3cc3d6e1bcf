import type { CellTable } from '../cell-table.ts'
import { addListener } from './blocks.ts'
import type { Block, ReducedData } from './blocks.ts'

/** The data of one listener alone, in the centre and scale of the whole. */
export function onlyListener(data: ReducedData, table: CellTable, listener: number): ReducedData {
  const design = data.blocks[data.member[listener]!]!
  const y = scaledCells(data, table, listener, design)
  const block: Block = {
    ...design,
    size: 1,
    sum: Float64Array.from(y),
    products: Float64Array.from(y.flatMap((a) => y.map((b) => a * b))),
  }
  return {
    ...data,
    blocks: [block],
    observations: design.servings.reduce((total, n) => total + n, 0),
    cells: design.unit.length,
    listeners: 1,
    withinYY: table.within[listener]! / data.scale ** 2,
  }
}

/** The data of everybody else. */
export function withoutListener(data: ReducedData, table: CellTable, listener: number): ReducedData {
  const place = data.member[listener]!
  const old = data.blocks[place]!
  const block = { ...old, size: old.size - 1, sum: old.sum.slice(), products: old.products.slice() }
  addListener(block, scaledCells(data, table, listener, old), -1)
  const blocks = [...data.blocks]
  if (block.size > 0) blocks[place] = block
  else blocks.splice(place, 1)
  return {
    ...data,
    blocks,
    observations: data.observations - old.servings.reduce((total, n) => total + n, 0),
    cells: data.cells - old.unit.length,
    listeners: data.listeners - 1,
    withinYY: Math.max(0, data.withinYY - table.within[listener]! / data.scale ** 2),
  }
}

const scaledCells = (data: ReducedData, table: CellTable, listener: number, block: Block): number[] =>
  [...block.unit].map(
    (unit) => (table.mean[listener * table.units + unit]! - data.centre[unit]!) / data.scale,
  )
