import type { CellTable, Scores } from '../cell-table.ts'

/**
 * Listeners with the same design (same units, servings and mean positions), summed: the likelihood of the model needs
 * nothing finer, so a complete table of two hundred listeners is one block.
 */
export interface Block {
  /** Listeners in it. */
  readonly size: number
  /** Unit of each cell. */
  readonly unit: Int32Array
  /** Scores behind each cell mean. */
  readonly servings: Float64Array
  /** Mean of the position columns in each cell, cells × columns, or null without position. */
  readonly position: Float64Array | null
  /** Σ over listeners of the cell means, and of their products (cells × cells). */
  readonly sum: Float64Array
  readonly products: Float64Array
}

export interface ReducedData {
  readonly units: number
  /** Fixed effects: units, then one column for each position but the first. */
  readonly columns: number
  readonly blocks: readonly Block[]
  /** Block of each listener. */
  readonly member: Int32Array
  readonly observations: number
  readonly cells: number
  readonly listeners: number
  /** Products of deviations within cells: of scores, of fixed columns with scores, of fixed columns. */
  readonly withinYY: number
  readonly withinXY: Float64Array
  readonly withinXX: Float64Array
  /** y = (score − centre of its unit) / scale. */
  readonly centre: Float64Array
  readonly scale: number
}

/** Sums a table to blocks, without position. Cost: linear in cells, and cells² for each listener. */
export function reduceCells(table: CellTable, centre: Float64Array, scale: number): ReducedData {
  const groups = new Groups()
  let cells = 0
  let observations = 0
  let within = 0
  for (let listener = 0; listener < table.listeners; listener++) {
    const units = unitsOf(table, listener)
    const servings = units.map((unit) => table.count[listener * table.units + unit]!)
    const y = units.map((unit) => (table.mean[listener * table.units + unit]! - centre[unit]!) / scale)
    groups.add(`${units.join()}|${servings.join()}`, units, servings, null, y)
    cells += units.length
    for (const n of servings) observations += n
    within += table.within[listener]!
  }
  return {
    units: table.units,
    columns: table.units,
    blocks: groups.blocks,
    member: Int32Array.from(groups.member),
    observations,
    cells,
    listeners: table.listeners,
    withinYY: within / scale ** 2,
    withinXY: new Float64Array(table.units),
    withinXX: new Float64Array(table.units ** 2),
    centre,
    scale,
  }
}

/** As `reduceCells`, with position as a factor (first level the reference). */
export function reduceWithPosition(
  scores: Scores,
  table: CellTable,
  centre: Float64Array,
  scale: number,
): ReducedData {
  const plain = reduceCells(table, centre, scale)
  const extra = scores.positions - 1
  const columns = table.units + extra
  const share = new Float64Array(table.count.length * extra)
  scores.score.forEach((_, i) => {
    const cell = scores.listener[i]! * table.units + scores.unit[i]!
    const level = scores.position[i]! - 1
    if (level >= 0) share[cell * extra + level]! += 1 / table.count[cell]!
  })
  const withinXY = new Float64Array(columns)
  const withinXX = new Float64Array(columns * columns)
  const deviation = new Float64Array(extra)
  scores.score.forEach((score, i) => {
    const cell = scores.listener[i]! * table.units + scores.unit[i]!
    if (table.count[cell]! < 2) return
    for (let k = 0; k < extra; k++) {
      deviation[k] = (scores.position[i]! - 1 === k ? 1 : 0) - share[cell * extra + k]!
    }
    const y = (score - table.mean[cell]!) / scale
    for (let k = 0; k < extra; k++) {
      withinXY[table.units + k]! += deviation[k]! * y
      for (let l = 0; l < extra; l++) {
        withinXX[(table.units + k) * columns + table.units + l]! += deviation[k]! * deviation[l]!
      }
    }
  })
  const groups = new Groups()
  for (let listener = 0; listener < table.listeners; listener++) {
    const units = unitsOf(table, listener)
    const base = listener * table.units
    const servings = units.map((unit) => table.count[base + unit]!)
    const y = units.map((unit) => (table.mean[base + unit]! - centre[unit]!) / scale)
    const position = Float64Array.from(
      units.flatMap((unit) => [...share.subarray((base + unit) * extra, (base + unit + 1) * extra)]),
    )
    groups.add(`${units.join()}|${servings.join()}|${position.join()}`, units, servings, position, y)
  }
  return {
    ...plain,
    columns,
    blocks: groups.blocks,
    member: Int32Array.from(groups.member),
    withinXY,
    withinXX,
  }
}

const unitsOf = (table: CellTable, listener: number): number[] => {
  const units: number[] = []
  for (let unit = 0; unit < table.units; unit++)
    if (table.count[listener * table.units + unit]!) units.push(unit)
  return units
}

class Groups {
  readonly blocks: { -readonly [K in keyof Block]: Block[K] }[] = []
  readonly member: number[] = []
  readonly #places = new Map<string, number>()

  /** Puts the next listener into the block of his design. */
  add(key: string, units: number[], servings: number[], position: Float64Array | null, y: number[]): void {
    let place = this.#places.get(key)
    if (place === undefined) {
      place = this.blocks.length
      this.#places.set(key, place)
      this.blocks.push({
        size: 0,
        unit: Int32Array.from(units),
        servings: Float64Array.from(servings),
        position,
        sum: new Float64Array(units.length),
        products: new Float64Array(units.length ** 2),
      })
    }
    const block = this.blocks[place]!
    block.size++
    addListener(block, y, 1)
    this.member.push(place)
  }
}

/** Adds (sign 1) or takes out (sign −1) one listener's cell means. */
export function addListener(
  block: Pick<Block, 'sum' | 'products'>,
  y: readonly number[],
  sign: 1 | -1,
): void {
  const k = y.length
  for (let i = 0; i < k; i++) {
    block.sum[i]! += sign * y[i]!
    for (let j = 0; j < k; j++) block.products[i * k + j]! += sign * y[i]! * y[j]!
  }
}
