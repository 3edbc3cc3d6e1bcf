import { describe, expect, it } from 'vitest'
import { differenceSentence, points, verdictSentence, widestPair } from './verdict-words.ts'

const width = {
  name: 'Width',
  low: 0,
  high: 100,
  lowWords: 'inside the head',
  highWords: 'well outside the ears',
}
const pair = (a: string, b: string, difference: number, low: number, high: number) => ({
  a,
  b,
  difference,
  low,
  high,
})

describe('what a verdict says of a descriptor', () => {
  it('names the widest pair with its simultaneous interval, the larger one first', () => {
    const pairs = [pair('Knot', 'Dunlin', -21.4, -29.2, -13.1), pair('Knot', 'Avocet', -3, -11, 5)]
    expect(differenceSentence(width, pairs, true)).toBe(
      'Dunlin lies further towards “well outside the ears” than Knot; difference 21, between 13 and 29.',
    )
  })
  it('says what the data exclude where no difference was found', () => {
    const pairs = [pair('Knot', 'Dunlin', 4, -5.2, 13.1), pair('Knot', 'Avocet', -3, -14.6, 8)]
    expect(differenceSentence(width, pairs, true)).toBe(
      'No difference found; differences larger than 15 are unlikely.',
    )
  })
  it('says no pair where the test of units does not hold, even if one interval leaves 0 out', () => {
    expect(differenceSentence(width, [pair('Knot', 'Dunlin', -9, -17, -1)], false)).toBe(
      'No difference found; differences larger than 17 are unlikely.',
    )
  })
  it('marks a hint as a hint', () => {
    expect(
      verdictSentence(width, 'No difference found; differences larger than 17 are unlikely.', true),
    ).toBe('Width: no difference found; differences larger than 17 are unlikely. As a hint only.')
  })
  it('gives no more decimals than a scale can bear, and never a minus before nought', () => {
    expect([
      points(7.966, { low: 40, high: 75 }),
      points(-0.2, width),
      points(1.234, { low: 1, high: 5 }),
    ]).toEqual(['8.0', '0', '1.23'])
  })
  it('has no widest pair where there is none', () => {
    expect(widestPair([])).toBeNull()
  })
})
