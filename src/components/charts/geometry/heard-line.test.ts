import { describe, expect, test } from 'vitest'
import { countWords, layOutHeardLine } from './heard-line.ts'
import type { HeardRow, HeardScale } from './heard-line.ts'
import { textWidth } from './text-width.ts'

const scale: HeardScale = {
  low: 0,
  high: 100,
  sided: 'two',
  lowWord: 'cool, thin',
  midWord: 'neutral',
  highWord: 'warm, thick',
}
const row = (name: string, scores: number[], cantTell = 0): HeardRow => ({
  name,
  scores,
  q1: 40,
  median: 50,
  q3: 60,
  n: scores.length,
  cantTell,
})
const rows = [row('Dunlin', [20, 20, 20, 50]), row('Whimbrel', [80], 2)]

describe('a heard line', () => {
  test('has names beside their rows on a wide column and above them on a phone', () => {
    const wide = layOutHeardLine(rows, scale, 672)
    const phone = layOutHeardLine(rows, scale, 350)
    expect(wide.narrow).toBe(false)
    expect(wide.left).toBeGreaterThanOrEqual(textWidth('Whimbrel', 16))
    expect(phone.narrow).toBe(true)
    expect(phone.rows[0]?.nameY).toBeLessThan((phone.rows[0]?.y ?? 0) - 20)
  })

  test('puts a name above its row when it would take a third of a wide column', () => {
    const long = [row('Tern One with the second pair of filters', [50])]
    expect(layOutHeardLine(long, scale, 672).narrow).toBe(true)
  })

  test('keeps room at the end of a row for what it says there', () => {
    const { right } = layOutHeardLine(rows, scale, 672)
    expect(672 - right).toBeGreaterThan(textWidth('1 · 2 can’t tell', 14))
    expect(rows.map(countWords)).toEqual(['4', '1 · 2 can’t tell'])
  })

  test('draws the ends of the scale at the ends of the line and nothing beyond them', () => {
    const { x, left, right } = layOutHeardLine(rows, scale, 672)
    expect(x(0)).toBe(left)
    expect(x(100)).toBe(right)
    expect(x(112)).toBe(right)
  })

  test('stacks equal ratings and sets all rows at one pitch that clears the tallest stack', () => {
    const laid = layOutHeardLine([...rows, row('Knot', [10])], scale, 672)
    expect(laid.rows[0]?.points.map((point) => point.level)).toEqual([0, 1, 2, 0])
    const [a = 0, b = 0, c = 0] = laid.rows.map((place) => place.y)
    expect(b - a).toBe(c - b)
    expect(laid.height).toBeGreaterThan(c)
  })

  test('holds for no unit at all', () => {
    expect(layOutHeardLine([], scale, 350).rows).toEqual([])
  })
})
