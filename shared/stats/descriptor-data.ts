import type { LongRating } from './analysis-types.ts'
import type { Scores } from './cell-table.ts'

/** One descriptor's rows, names turned into numbers. */
export interface DescriptorData {
  /** Everybody and every unit with a row, rated or not, sorted. */
  readonly panelists: readonly string[]
  readonly units: readonly string[]
  /** Names behind the rows and columns of `scores`: those with at least one score. */
  readonly scoredPanelists: readonly string[]
  readonly scoredUnits: readonly string[]
  readonly scores: Scores
  readonly cantTellByUnit: ReadonlyMap<string, number>
  readonly cantTellByPanelist: ReadonlyMap<string, number>
}

/** Order by code points: the same on every machine. */
export const byName = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0)

const sortedNames = (names: Iterable<string>): string[] => [...new Set(names)].sort(byName)

/**
 * Splits rows by descriptor, descriptors sorted by name.
 *
 * @throws RangeError when a score is not a finite number
 */
export function byDescriptor(rows: readonly LongRating[]): Map<string, LongRating[]> {
  const groups = new Map<string, LongRating[]>()
  for (const row of rows) {
    if (row.score !== null && !Number.isFinite(row.score)) throw new RangeError(`score ${row.score}`)
    const group = groups.get(row.descriptor)
    if (group) group.push(row)
    else groups.set(row.descriptor, [row])
  }
  return new Map([...groups].sort(([a], [b]) => byName(a, b)))
}

/** Units that one analysis compares at most: pairs grow with their square. */
export const MOST_UNITS = 500

/**
 * Columns of one descriptor, in an order that does not depend on the order of the rows.
 *
 * @throws RangeError for more than `MOST_UNITS` units
 */
export function descriptorData(rows: readonly LongRating[]): DescriptorData {
  const rated = rows.filter((row) => row.score !== null)
  const scoredPanelists = sortedNames(rated.map((row) => row.panelist))
  const scoredUnits = sortedNames(rated.map((row) => row.unit))
  if (scoredUnits.length > MOST_UNITS) throw new RangeError(`${scoredUnits.length} units`)
  const positions = [...new Set(rated.map((row) => row.position ?? -Infinity))].sort((a, b) => a - b)
  const listenerOf = new Map(scoredPanelists.map((name, i) => [name, i]))
  const unitOf = new Map(scoredUnits.map((name, i) => [name, i]))
  const positionOf = new Map(positions.map((position, i) => [position, i]))
  const cells = new Map<number, { position: number; score: number }[]>()
  for (const row of rated) {
    const cell = listenerOf.get(row.panelist)! * scoredUnits.length + unitOf.get(row.unit)!
    const entry = { position: positionOf.get(row.position ?? -Infinity)!, score: row.score! }
    const others = cells.get(cell)
    if (others) others.push(entry)
    else cells.set(cell, [entry])
  }
  return {
    panelists: sortedNames(rows.map((row) => row.panelist)),
    units: sortedNames(rows.map((row) => row.unit)),
    scoredPanelists,
    scoredUnits,
    scores: columns(
      cells,
      scoredPanelists.length,
      scoredUnits.length,
      Math.max(1, positions.length),
      rated.length,
    ),
    cantTellByUnit: countCantTell(rows, 'unit'),
    cantTellByPanelist: countCantTell(rows, 'panelist'),
  }
}

function columns(
  cells: ReadonlyMap<number, { position: number; score: number }[]>,
  listeners: number,
  units: number,
  positions: number,
  length: number,
): Scores {
  const listener = new Int32Array(length)
  const unit = new Int32Array(length)
  const position = new Int32Array(length)
  const score = new Float64Array(length)
  let at = 0
  for (let cell = 0; cell < listeners * units; cell++) {
    const entries = cells.get(cell)
    if (!entries) continue
    if (entries.length > 1) entries.sort((a, b) => a.score - b.score || a.position - b.position)
    for (const entry of entries) {
      listener[at] = Math.floor(cell / units)
      unit[at] = cell % units
      position[at] = entry.position
      score[at] = entry.score
      at++
    }
  }
  return { listeners, units, positions, listener, unit, position, score }
}

function countCantTell(rows: readonly LongRating[], by: 'unit' | 'panelist'): Map<string, number> {
  const counts = new Map<string, number>()
  for (const row of rows) {
    if (row.cantTell && row.score === null) counts.set(row[by], (counts.get(row[by]) ?? 0) + 1)
  }
  return counts
}
