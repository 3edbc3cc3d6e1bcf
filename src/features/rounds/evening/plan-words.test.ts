import { expect, it } from 'vitest'
import { eveningTitle } from './blank-evening.ts'
import { eveningSentence, extraTurnWords, panelSizeWords } from './plan-words.ts'

it('says an evening’s size in one sentence', () => {
  expect(eveningSentence(4, 3, 5)).toBe(
    'Four units, three listeners: four turns of about 7 minutes, about 30 minutes.',
  )
  expect(eveningSentence(3, 6, 5)).toBe(
    'Three units, six listeners: six turns of about 7 minutes, about 50 minutes with one break.',
  )
})

it('says why there is a turn more than listeners, and only then', () => {
  expect(extraTurnWords(3, 4)).toContain('One turn more')
  expect(extraTurnWords(3, 5)).toBeNull()
})

it('says what so few listeners may say in public', () => {
  expect(panelSizeWords(4)).toContain('no figures are published')
  expect(panelSizeWords(5)).toContain('informal')
  expect(panelSizeWords(6)).toBeNull()
})

it('names the evening after its day in the panel’s zone', () => {
  expect(eveningTitle(new Date('2026-12-01T18:00:00Z'), 'UTC')).toBe(
    'An evening of listening, Tuesday 1 December',
  )
})
