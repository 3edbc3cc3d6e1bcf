import { expect, it } from 'vitest'
import { counted, listed, numberWord, sentenceCase, spokenMinutes } from './counts.ts'

it('says counts in words up to twelve, then in digits', () => {
  expect([0, 1, 12, 13].map(numberWord)).toEqual(['no', 'one', 'twelve', '13'])
  expect(counted(1, 'unit')).toBe('one unit')
  expect(counted(0, 'listener')).toBe('no listeners')
  expect(counted(2, 'serving is', 'servings are')).toBe('two servings are')
  expect(sentenceCase(counted(4, 'unit'))).toBe('Four units')
})

it('lists names as people do', () => {
  expect(listed([])).toBe('')
  expect(listed(['Ada'])).toBe('Ada')
  expect(listed(['Ada', 'Bo'])).toBe('Ada and Bo')
  expect(listed(['Ada', 'Bo', 'Cy'])).toBe('Ada, Bo and Cy')
})

it.each([
  [2, 'about 5 minutes'],
  [42, 'about 40 minutes'],
  [59, 'about an hour'],
  [100, 'about 1 h 40 min'],
  [121, 'about two hours'],
])('says %i minutes as "%s"', (minutes, words) => expect(spokenMinutes(minutes)).toBe(words))
