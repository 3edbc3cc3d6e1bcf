import { expect, test } from 'vitest'
import { answerByKey, answerByStep, middleOf, sayAnswer, snap, valueAt } from './answer.ts'
import type { LineScale } from './answer.ts'

const width: LineScale = {
  low: 0,
  high: 100,
  step: 1,
  sided: 'one',
  lowWord: 'inside the head',
  highWord: 'well outside the ears',
}
const imported: LineScale = { ...width, low: 1, high: 7, step: 0.5, lowWord: 'little', highWord: 'much' }

test('a place on the line becomes the nearest step, and no place beyond its ends counts', () => {
  expect(valueAt(width, 0.634)).toBe(63)
  expect(valueAt(width, -0.2)).toBe(0)
  expect(valueAt(width, 1.4)).toBe(100)
  expect(valueAt(imported, 0.5)).toBe(4)
  expect(snap(imported, 3.3)).toBe(3.5)
})

test('a scale that has no exact middle takes the step nearest to it', () => {
  expect(middleOf({ ...width, low: 0, high: 9 })).toBe(5)
  expect(middleOf({ ...width, low: 0, high: 10, step: 0.1 })).toBe(5)
})

test('steps stop at the ends and never gather fractions', () => {
  const tenth: LineScale = { ...width, low: 0, high: 1, step: 0.1 }
  expect(answerByStep(tenth, 0.2, 1)).toBe(0.3)
  expect(answerByStep(tenth, 1, 1)).toBe(1)
  expect(answerByKey(width, 96, 'PageUp')).toBe(100)
})

test('words say the value, the scale and the end that it leans to', () => {
  expect(sayAnswer(width, 63)).toBe('63 of 100, towards well outside the ears')
  expect(sayAnswer(width, 12)).toBe('12 of 100, towards inside the head')
  expect(sayAnswer(width, 50)).toBe('50 of 100, halfway')
  expect(sayAnswer(imported, 6.5)).toBe('6.5, from 1 to 7, towards much')
  expect(sayAnswer(width, null)).toBe('not answered')
})

test('a first key on "can’t tell" sets the middle too, and other keys are left to the page', () => {
  expect(answerByKey(width, 'cant-tell', 'ArrowUp')).toBe(50)
  expect(answerByKey(width, null, 'Tab')).toBeUndefined()
  expect(answerByKey(width, 40, 'Backspace')).toBeNull()
})
