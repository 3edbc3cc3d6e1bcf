import { scaleLinear } from 'd3-scale'
import { dodge } from './dodge.ts'
import { placeEndWords } from './end-words.ts'
import type { PlacedWord } from './end-words.ts'
import { textWidth } from './text-width.ts'

export interface HeardScale {
  low: number
  high: number
  sided: 'one' | 'two'
  lowWord: string
  midWord?: string
  highWord: string
}

export interface HeardRow {
  name: string
  scores: number[]
  q1: number
  median: number
  q3: number
  adjusted?: { mean: number; low: number; high: number }
  /** Half the length of the comparison bar: two bars that do not touch differ. */
  comparisonHalf?: number
  n: number
  cantTell: number
}

interface RowLayout {
  /** Where the row's line lies. */
  y: number
  nameY: number
  points: { x: number; level: number }[]
}

export interface HeardLayout {
  /** Names stand above their rows instead of beside them. */
  narrow: boolean
  x: (value: number) => number
  left: number
  right: number
  words: PlacedWord[]
  wordLines: number
  rows: RowLayout[]
  top: number
  height: number
}

const NAME = 16
const WORD = 14
const EDGE = 6
/** A tick of a raw point and its stacking step, in pixels. */
export const TICK = 6
export const TICK_STEP = 7.5
/** Below a line: the adjusted mean, and more air where the next name stands above its row. */
const BELOW = 24
const BELOW_NARROW = 34

export const countWords = (row: Pick<HeardRow, 'n' | 'cantTell'>) =>
  row.cantTell > 0 ? `${row.n} · ${row.cantTell} can’t tell` : `${row.n}`

/** Where everything of a heard line lies, for a width in pixels. Nothing is cut and no two words meet. */
export function layOutHeardLine(rows: HeardRow[], scale: HeardScale, width: number): HeardLayout {
  const names = Math.max(0, ...rows.map((row) => textWidth(row.name, NAME))) + 20
  const counts = Math.max(textWidth('n', WORD), ...rows.map((row) => textWidth(countWords(row), WORD))) + 16
  const narrow = width < 560 || names > width * 0.34
  const left = narrow ? EDGE : names
  const right = narrow ? width - EDGE : width - counts
  const x = scaleLinear([scale.low, scale.high], [left, right]).clamp(true)
  const { words, lines } = placeEndWords(
    { low: scale.lowWord, mid: scale.sided === 'two' ? scale.midWord : undefined, high: scale.highWord },
    narrow ? 0 : left,
    narrow ? width : right,
    WORD,
  )
  const top = lines * 19 + 8
  let y = top
  const stacks = rows.map((row) => {
    const xs = row.scores.map((score) => x(score))
    return { xs, levels: dodge(xs, 2.6) }
  })
  const above = 7 + TICK + Math.max(0, ...stacks.flatMap((stack) => stack.levels)) * TICK_STEP
  const laid = stacks.map(({ xs, levels }) => {
    const nameY = y + 15
    const line = narrow ? y + 20 + Math.max(14, above) : y + Math.max(20, above + 4)
    y = line + (narrow ? BELOW_NARROW : BELOW)
    return {
      y: line,
      nameY: narrow ? nameY : line + 5,
      points: xs.map((at, nth) => ({ x: at, level: levels[nth] ?? 0 })),
    }
  })
  return { narrow, x, left, right, words, wordLines: lines, rows: laid, top, height: narrow ? y - 10 : y }
}
