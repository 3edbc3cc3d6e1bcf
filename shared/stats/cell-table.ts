/** One descriptor's scores as columns of numbers; every listener and every unit named here has at least one. */
export interface Scores {
  readonly listeners: number
  readonly units: number
  /** Levels of position (a missing position is a level of its own). */
  readonly positions: number
  readonly listener: Int32Array
  readonly unit: Int32Array
  readonly position: Int32Array
  readonly score: Float64Array
}

/** The same, summed to listener × unit cells, flat by listener. */
export interface CellTable {
  readonly listeners: number
  readonly units: number
  /** Scores in each cell. */
  readonly count: Int32Array
  /** Mean of each cell; 0 where it is empty. */
  readonly mean: Float64Array
  /** Each listener's sum of squares about the means of his own cells. */
  readonly within: Float64Array
}

/**
 * Cell means and the squares within cells, in two passes over the scores.
 *
 * @example
 * cellTable(scores).count.length // => listeners × units
 */
export function cellTable(scores: Scores): CellTable {
  const { listeners, units } = scores
  const count = new Int32Array(listeners * units)
  const mean = new Float64Array(listeners * units)
  const within = new Float64Array(listeners)
  const n = scores.score.length
  for (let i = 0; i < n; i++) {
    const cell = scores.listener[i]! * units + scores.unit[i]!
    count[cell]!++
    mean[cell]! += scores.score[i]!
  }
  for (let cell = 0; cell < count.length; cell++) if (count[cell]! > 1) mean[cell]! /= count[cell]!
  for (let i = 0; i < n; i++) {
    const listener = scores.listener[i]!
    const cell = listener * units + scores.unit[i]!
    if (count[cell]! > 1) within[listener]! += (scores.score[i]! - mean[cell]!) ** 2
  }
  return { listeners, units, count, mean, within }
}

/** Cell mean of a listener, or null where the cell is empty. */
export const cellMean = (table: CellTable, listener: number, unit: number): number | null => {
  const cell = listener * table.units + unit
  return table.count[cell]! > 0 ? table.mean[cell]! : null
}

/** Whether any listener scored any unit twice. */
export const hasRepeats = (table: CellTable): boolean => table.count.some((count) => count > 1)

/** Whether every listener scored every unit. */
export const isComplete = (table: CellTable): boolean => table.count.every((count) => count > 0)

/** Builds columns from rows of [listener, unit, score, position]: for tests and examples. */
export function scoresFrom(rows: readonly (readonly [number, number, number, number?])[]): Scores {
  return {
    listeners: 1 + Math.max(-1, ...rows.map((row) => row[0])),
    units: 1 + Math.max(-1, ...rows.map((row) => row[1])),
    positions: 1 + Math.max(0, ...rows.map((row) => row[3] ?? 0)),
    listener: Int32Array.from(rows, (row) => row[0]),
    unit: Int32Array.from(rows, (row) => row[1]),
    position: Int32Array.from(rows, (row) => row[3] ?? 0),
    score: Float64Array.from(rows, (row) => row[2]),
  }
}
