import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { dodge } from './dodge.ts'
import { placeEndWords } from './end-words.ts'
import { labelWhatFits, shortNames, staggerLabels } from './labels.ts'
import { textWidth } from './text-width.ts'

const units = ['Avocet', 'Dunlin', 'Godwit', 'Knot', 'Tern One', 'Whimbrel']
const columnsOver = (width: number, count: number) =>
  Array.from({ length: count }, (_, nth) => 12 + ((width - 24) * nth) / Math.max(1, count - 1))

function overlaps(boxes: { x: number; width: number; line: number }[]) {
  return boxes.some((a, nth) =>
    boxes.slice(nth + 1).some((b) => a.line === b.line && a.x < b.x + b.width && b.x < a.x + a.width),
  )
}

describe('names under columns', () => {
  test('stand on one line where there is room and take turns on two on a phone', () => {
    expect(staggerLabels(units, columnsOver(700, 6), 0, 700, 14).lines).toBe(1)
    expect(staggerLabels(units, columnsOver(350, 6), 0, 350, 14).lines).toBe(2)
  })

  test('never meet and are never cut, whatever the names, down to a phone of 320 px', () => {
    fc.assert(
      fc.property(
        fc.array(fc.string({ minLength: 1, maxLength: 22, unit: 'grapheme-ascii' }), {
          minLength: 1,
          maxLength: 12,
        }),
        fc.integer({ min: 280, max: 760 }),
        (names, width) => {
          const { labels } = staggerLabels(names, columnsOver(width, names.length), 0, width, 14)
          const boxes = labels.map((label) => ({ ...label, width: textWidth(names[label.nth] ?? '', 14) }))
          expect(labels).toHaveLength(names.length)
          expect(overlaps(boxes)).toBe(false)
          for (const box of boxes) {
            expect(box.x).toBeGreaterThanOrEqual(0)
            if (box.width <= width) expect(box.x + box.width).toBeLessThanOrEqual(width)
          }
        },
      ),
    )
  })
})

test('on a line of points the two ends are named first, and no two names meet', () => {
  const xs = [20, 24, 120, 126, 300]
  const placed = labelWhatFits(units.slice(0, 5), xs, 0, 320, 13)
  const named = placed.map((label) => label.nth)
  expect(named).toContain(0)
  expect(named).toContain(4)
  expect(named).not.toContain(1)
  const boxes = placed.map((label) => ({ ...label, width: textWidth(units[label.nth] ?? '', 13) }))
  expect(overlaps(boxes)).toBe(false)
})

test('short names are the shortest beginnings that tell the names apart', () => {
  expect(Object.fromEntries(shortNames(['Tern One', 'Tern Two', 'Knot', 'Knot']))).toEqual({
    'Tern One': 'Tern O',
    'Tern Two': 'Tern T',
    Knot: 'Kn',
  })
  expect(shortNames(['A', 'AB']).get('A')).toBe('A')
})

describe('end words', () => {
  const words = { low: 'cool, thin', mid: 'neutral', high: 'warm, thick' }

  test('share one line where they fit', () => {
    const { lines, words: placed } = placeEndWords(words, 0, 350, 14)
    expect(lines).toBe(1)
    expect(placed.map((word) => word.text)).toEqual(['cool, thin', 'neutral', 'warm, thick'])
  })

  test('put the middle word above when the ends come too near to it', () => {
    const { lines, words: placed } = placeEndWords(words, 0, 170, 14)
    expect(lines).toBe(2)
    expect(placed.find((word) => word.text === 'neutral')?.line).toBe(0)
    expect(placed.find((word) => word.text === 'cool, thin')?.line).toBe(1)
  })

  test('take a line each when even the ends do not fit side by side', () => {
    const long = { low: 'all at one distance from the listener', high: 'near and far at once' }
    const { lines, words: placed } = placeEndWords(long, 0, 300, 14)
    expect(lines).toBe(2)
    expect(new Set(placed.map((word) => word.line)).size).toBe(2)
  })
})

describe('points that would lie on one another', () => {
  test('are stacked, and points apart stay on the line', () => {
    expect(dodge([10, 10, 10, 40], 3)).toEqual([0, 1, 2, 0])
    expect(dodge([10, 13, 16], 3)).toEqual([0, 0, 0])
  })

  test('keep the order of the input, and pile up no higher than they may', () => {
    expect(dodge([40, 10, 11], 3)).toEqual([0, 0, 1])
    expect(Math.max(...dodge(new Array<number>(9).fill(5), 3, 4))).toBe(3)
  })
})
