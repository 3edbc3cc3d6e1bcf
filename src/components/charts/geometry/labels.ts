import { textWidth } from './text-width.ts'

export interface PlacedLabel {
  /** Index in the input. */
  nth: number
  /** Left edge of the text. */
  x: number
  line: number
}

const GAP = 10

const within = (left: number, width: number, x0: number, x1: number) =>
  Math.max(x0, Math.min(left, x1 - width))

/**
 * Names under columns: centred on their column, kept inside x0 to x1, on as few lines as keep them apart (neighbours
 * take turns on the lines). `columns` ascend.
 */
export function staggerLabels(
  names: string[],
  columns: number[],
  x0: number,
  x1: number,
  size: number,
): { labels: PlacedLabel[]; lines: number } {
  const widths = names.map((name) => textWidth(name, size))
  for (let lines = 1; lines <= names.length; lines++) {
    const ends = new Array<number>(lines).fill(-Infinity)
    const labels: PlacedLabel[] = []
    for (let nth = 0; nth < names.length; nth++) {
      const width = widths[nth] ?? 0
      const x = within((columns[nth] ?? 0) - width / 2, width, x0, x1)
      const line = nth % lines
      if (x < (ends[line] ?? 0) + GAP) break
      ends[line] = x + width
      labels.push({ nth, x, line })
    }
    if (labels.length === names.length) return { labels, lines }
  }
  return { labels: [], lines: 0 }
}

/**
 * Names on one line over points, as many as stand apart: the two ends first, then the others in order. A name that finds
 * no room is left out (the table has it).
 */
export function labelWhatFits(
  names: string[],
  xs: number[],
  x0: number,
  x1: number,
  size: number,
): PlacedLabel[] {
  const order = xs.map((_, nth) => nth).sort((a, b) => (xs[a] ?? 0) - (xs[b] ?? 0))
  const last = order.pop()
  const inTurn = last === undefined ? order : [last, ...order]
  const placed: (PlacedLabel & { right: number })[] = []
  for (const nth of inTurn) {
    const width = textWidth(names[nth] ?? '', size)
    if (width > x1 - x0) continue
    const x = within((xs[nth] ?? 0) - width / 2, width, x0, x1)
    const right = x + width
    if (placed.every((other) => right + GAP <= other.x || x >= other.right + GAP))
      placed.push({ nth, x, line: 0, right })
  }
  return placed.map(({ nth, x, line }) => ({ nth, x, line }))
}

/** Shortest beginnings, at least two letters, that still tell the names apart; whole names where they must. */
export function shortNames(names: string[]): Map<string, string> {
  const distinct = [...new Set(names)]
  const short = new Map<string, string>()
  for (const name of distinct) {
    let length = Math.min(2, name.length)
    while (
      length < name.length &&
      distinct.some((other) => other !== name && other.slice(0, length) === name.slice(0, length))
    )
      length++
    short.set(name, name.slice(0, length))
  }
  return short
}
