import { curveBumpY, line } from 'd3-shape'

/** Where rows and values of the reveal's picture stand, in pixels. */
export interface Stage {
  width: number
  rowHeight: number
  scale: { low: number; high: number }
}

const EDGE = 14

/** The x of a value on the scale. */
export const xOf = (value: number, { width, scale }: Stage): number =>
  EDGE + ((value - scale.low) / (scale.high - scale.low)) * (width - 2 * EDGE)

/** The y of a row's line: low in the row, so that the name stands above it. */
export const yOf = (row: number, { rowHeight }: Stage): number => row * rowHeight + rowHeight * 0.68

/**
 * A thread through the first `rows` units, downwards. It is broken where a listener could not tell, and holds nothing
 * of a unit that is still under the cloth.
 */
export function threadPath(values: readonly (number | null)[], rows: number, stage: Stage): string {
  const points = values.slice(0, rows).map((value, row) => ({ value, row }))
  return (
    line<{ value: number | null; row: number }>()
      .defined((point) => point.value !== null)
      .x((point) => xOf(point.value ?? 0, stage))
      .y((point) => yOf(point.row, stage))
      .curve(curveBumpY)(points) ?? ''
  )
}
