import { expect, test } from 'vitest'
import { layOutPlan, threadStretches } from './plan-rows.ts'
import { layOutThreads, threadPath } from './threads.ts'

const scale = { low: 0, high: 100, lowWord: 'cool, thin', midWord: 'neutral', highWord: 'warm, thick' }
const units = [
  { name: 'Whimbrel', mean: 70, scores: [60, 80] },
  { name: 'Avocet', mean: 38, scores: [40, null] },
  { name: 'Knot', mean: 56, scores: [50, 62] },
]

test('units stand in the order of their means, lowest first, whatever the order they come in', () => {
  const { order, columns } = layOutThreads(units, scale, 672)
  expect(order.map((nth) => units[nth]?.name)).toEqual(['Avocet', 'Knot', 'Whimbrel'])
  expect([...columns].sort((a, b) => a - b)).toEqual(columns)
})

test('end words stand beside the columns on a wide page and above and below them on a phone', () => {
  const wide = layOutThreads(units, scale, 672)
  expect(wide.wordsBeside).toBe(true)
  expect(Math.min(...wide.columns)).toBeGreaterThan(wide.x0)
  expect(layOutThreads(units, scale, 350).wordsBeside).toBe(false)
})

test('a higher rating stands higher, and the scale fills the picture', () => {
  const { y, top, bottom } = layOutThreads(units, scale, 672)
  expect(y(0)).toBe(bottom)
  expect(y(100)).toBe(top)
})

test('a missing rating is a gap in the thread, and a lone one between two gaps a short dash', () => {
  const whole = threadPath([0, 50, 100], [10, 20, 30])
  expect(whole.match(/M/g)).toHaveLength(1)
  const gap = threadPath([0, 50, 100, 150], [10, 20, null, 30])
  expect(gap).toContain('M147,30L153,30')
  expect(gap).not.toContain('100,')
  expect(threadPath([0, 50], [null, null])).toBe('')
})

test('one unit alone is drawn too', () => {
  const { columns } = layOutThreads(units.slice(0, 1), scale, 350)
  expect(columns).toHaveLength(1)
  expect(columns[0]).toBeGreaterThan(0)
})

test('a thread rests between two servings that do not follow one another', () => {
  const places = [{ turn: 5 }, { turn: 1 }, { turn: 2 }]
  expect(threadStretches(places)).toEqual([
    { from: 1, to: 2, rest: false },
    { from: 2, to: 5, rest: true },
  ])
})

test('cells of a plan hold whole names where they fit, and their beginnings where they do not', () => {
  const rows = [
    {
      name: 'Ines',
      places: [
        { turn: 1, label: 'Whimbrel' },
        { turn: 2, label: 'Knot' },
      ],
    },
  ]
  expect(layOutPlan(rows, 2, 672).words.get('Whimbrel')).toBe('Whimbrel')
  expect(layOutPlan(rows, 8, 350).words.get('Whimbrel')).toBe('Wh')
  const phone = layOutPlan(rows, 8, 350)
  expect((phone.turnX[7] ?? 0) + phone.cellWidth / 2).toBeLessThanOrEqual(350)
})
