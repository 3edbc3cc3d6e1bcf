import { describe, expect, it } from 'vitest'
import { hinges, median } from './median.ts'
import { midRanks, rounded } from './mid-ranks.ts'
import { correlation, mean, standardDeviation, sum, varies } from './moments.ts'
import { plain } from './plain.ts'
import { seededRandom } from './random.ts'

describe('median and hinges', () => {
  it('count the median in both halves when n is odd (definition of ITU-R BS.1534-3)', () => {
    expect(hinges([12, 35, 41, 44, 47, 50, 53, 58, 97])).toEqual({ q1: 41, median: 47, q3: 53 })
  })
  it('take halves as they are when n is even', () => {
    expect(hinges([97, 12, 35, 41, 44, 47, 50, 53, 58, 60])).toEqual({ q1: 41, median: 48.5, q3: 58 })
  })
  it('are the value itself for one score, and leave the list as it was', () => {
    expect(hinges([7])).toEqual({ q1: 7, median: 7, q3: 7 })
    const scores = [3, 1, 2]
    expect(median(scores)).toBe(2)
    expect(scores).toEqual([3, 1, 2])
    expect(() => hinges([])).toThrow(RangeError)
  })
})

describe('moments', () => {
  it('mean and standard deviation of 2, 4, 4, 4, 5, 5, 7, 9', () => {
    const values = [2, 4, 4, 4, 5, 5, 7, 9]
    expect(mean(values)).toBe(5)
    expect(standardDeviation(values)).toBeCloseTo(Math.sqrt(32 / 7), 12)
  })
  it('lose nothing to a large constant', () => {
    expect(standardDeviation([1e9 + 1, 1e9 + 2, 1e9 + 3])).toBeCloseTo(1, 9)
    expect(sum([1e16, 1, -1e16])).toBeGreaterThanOrEqual(0)
  })
  it('Efron’s law school data correlate at .776374', () => {
    const lsat = [576, 635, 558, 578, 666, 580, 555, 661, 651, 605, 653, 575, 545, 572, 594]
    const gpa = [3.39, 3.3, 2.81, 3.03, 3.44, 3.07, 3.0, 3.43, 3.36, 3.13, 3.12, 2.74, 2.76, 2.88, 2.96]
    expect(correlation(lsat, gpa)).toBeCloseTo(0.776374, 6)
  })
  it('have no correlation where a side stands still, rounding noise included', () => {
    expect(correlation([1, 2, 3], [4, 4, 4])).toBeNull()
    expect(varies([0.1 + 0.2, 0.3])).toBe(false)
    expect(() => correlation([1], [1, 2])).toThrow(RangeError)
    expect(() => mean([])).toThrow(RangeError)
    expect(() => standardDeviation([1])).toThrow(RangeError)
  })
})

describe('ranks', () => {
  it('share the mean of their places', () => {
    expect(midRanks([30, 10, 20, 20])).toEqual({ ranks: [4, 1, 2.5, 2.5], ties: 6 })
  })
  it('are not split by means that are equal on paper', () => {
    expect(rounded((0.1 + 0.7) / 2)).toBe(rounded(0.8 / 2))
    expect(rounded(52.5)).toBe(52.5)
  })
})

describe('the seeded stream', () => {
  it('is the same for the same text, another for another, and evenly spread', () => {
    const take = (seed: string): number[] => {
      const next = seededRandom(seed)
      return Array.from({ length: 2000 }, () => next())
    }
    expect(take('a')).toEqual(take('a'))
    expect(take('a')).not.toEqual(take('b'))
    const values = take('scrim')
    expect(Math.min(...values)).toBeGreaterThanOrEqual(0)
    expect(Math.max(...values)).toBeLessThan(1)
    // Mean of 2000 uniform values: .5 ± 5 standard errors.
    expect(Math.abs(mean(values) - 0.5)).toBeLessThan(5 / Math.sqrt(12 * 2000))
  })
})

describe('plain data', () => {
  it('drops absent keys and says what is not finite', () => {
    expect(plain({ a: 1, b: undefined, c: [-0, NaN], d: null })).toEqual({
      a: 1,
      c: [0, { ok: false, reason: 'not-estimable' }],
      d: null,
    })
  })
})
