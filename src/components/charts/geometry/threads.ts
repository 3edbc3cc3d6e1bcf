import { scaleLinear, scalePoint } from 'd3-scale'
import { curveBumpX, line } from 'd3-shape'
import { staggerLabels } from './labels.ts'
import type { PlacedLabel } from './labels.ts'
import { textWidth } from './text-width.ts'

export interface ThreadUnit {
  name: string
  /** The panel's mean (adjusted where there is one). */
  mean: number
  /** One per listener, in one order for all units; null where there is no rating. */
  scores: (number | null)[]
}

export interface ThreadsLayout {
  /** Indices of the units, lowest mean first. */
  order: number[]
  columns: number[]
  x0: number
  top: number
  bottom: number
  y: (value: number) => number
  names: PlacedLabel[]
  namesY: number
  /** The end words stand beside the columns; above and below them where that costs too much width. */
  wordsBeside: boolean
  height: number
}

const WORD = 14

export function layOutThreads(
  units: ThreadUnit[],
  scale: { low: number; high: number; lowWord: string; midWord?: string; highWord: string },
  width: number,
): ThreadsLayout {
  const order = units
    .map((_, nth) => nth)
    .sort((a, b) => (units[a]?.mean ?? 0) - (units[b]?.mean ?? 0) || a - b)
  const words = Math.max(
    ...[scale.lowWord, scale.midWord ?? '', scale.highWord].map((word) => textWidth(word, WORD)),
  )
  const wordsBeside = width >= 560 && words <= width * 0.24
  const x0 = wordsBeside ? words + 20 : 12
  const spread = scalePoint<number>(order, [x0 + 8, width - (wordsBeside ? 36 : 12)]).padding(
    units.length === 1 ? 0.5 : wordsBeside ? 0.12 : 0.16,
  )
  const columns = order.map((nth) => spread(nth) ?? x0)
  const plot = Math.round(Math.min(320, Math.max(200, width * 0.42)))
  const top = wordsBeside ? 10 : 28
  const bottom = top + plot
  const namesTop = bottom + (wordsBeside ? 22 : 40)
  const { labels, lines } = staggerLabels(
    order.map((nth) => units[nth]?.name ?? ''),
    columns,
    wordsBeside ? x0 - 12 : 0,
    width,
    WORD,
  )
  return {
    order,
    columns,
    x0,
    top,
    bottom,
    y: scaleLinear([scale.low, scale.high], [bottom, top]).clamp(true),
    names: labels,
    namesY: namesTop,
    wordsBeside,
    height: namesTop + lines * 19 - 8,
  }
}

const weave = line<[number, number | null]>()
  .defined(([, y]) => y !== null)
  .x(([x]) => x)
  .y(([, y]) => y ?? 0)
  .curve(curveBumpX)

/** The path of one thread; a missing rating is a gap. A lone point between two gaps becomes a short dash. */
export function threadPath(columns: number[], heights: (number | null)[]): string {
  const path = weave(columns.map((x, nth) => [x, heights[nth] ?? null])) ?? ''
  const lone = columns
    .map((x, nth) => {
      const y = heights[nth] ?? null
      const alone = y !== null && (heights[nth - 1] ?? null) === null && (heights[nth + 1] ?? null) === null
      return alone ? `M${x - 3},${y}L${x + 3},${y}` : ''
    })
    .join('')
  return path.replace(/M[^A-Z]+Z/g, '') + lone
}
