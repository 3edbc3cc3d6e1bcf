import type { Stream } from './stream.ts'

/** Complete orders of n units for any number of listeners; `tables[i]` is the table (0-based) of row i. */
export type Rows = { rows: number[][]; tables: number[] }

export function drawRows(_input: { units: number; listeners: number; stream: Stream }): Rows {
  throw new Error('not built yet')
}
