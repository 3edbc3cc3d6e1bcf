import { textWidth } from './text-width.ts'

export interface PlacedWord {
  text: string
  x: number
  /** Which line of text, counted from 0. */
  line: number
  anchor: 'start' | 'middle' | 'end'
}

const GAP = 12

/**
 * Places the end words of a scale (and the word of its middle) over a line from x0 to x1 so that none meets another:
 * all on one line where they fit, else the middle word above, else one word a line.
 */
export function placeEndWords(
  words: { low: string; mid?: string; high: string },
  x0: number,
  x1: number,
  size: number,
): { words: PlacedWord[]; lines: number } {
  const width = x1 - x0
  const [low, mid, high] = [words.low, words.mid ?? '', words.high].map((word) => textWidth(word, size)) as [
    number,
    number,
    number,
  ]
  const place = (text: string, at: 'low' | 'mid' | 'high', line: number): PlacedWord => ({
    text,
    x: at === 'low' ? x0 : at === 'high' ? x1 : (x0 + x1) / 2,
    line,
    anchor: at === 'low' ? 'start' : at === 'high' ? 'end' : 'middle',
  })
  const endsFit = low + GAP + high <= width
  const middleFits = !words.mid || Math.max(low, high) + GAP + mid / 2 <= width / 2
  if (endsFit && middleFits) {
    const placed = [place(words.low, 'low', 0), place(words.high, 'high', 0)]
    if (words.mid) placed.splice(1, 0, place(words.mid, 'mid', 0))
    return { words: placed, lines: 1 }
  }
  const above = words.mid ? 1 : 0
  const placed = words.mid ? [place(words.mid, 'mid', 0)] : []
  placed.push(place(words.low, 'low', above), place(words.high, 'high', above + (endsFit ? 0 : 1)))
  return { words: placed, lines: above + (endsFit ? 1 : 2) }
}
