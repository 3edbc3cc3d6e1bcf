import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { chiSquareUpperTail } from './chi-square.ts'
import { fQuantile, fUpperTail } from './fisher-f.ts'
import { rangeQuantile, rangeUpperTail } from './studentized-range.ts'
import { tQuantile, tTwoSided } from './student-t.ts'

/** Made by tests/fixtures/stats/distributions.R with R 4.2.2. */
const file = new URL('../../tests/fixtures/stats/distributions.csv', import.meta.url)
const points = readFileSync(file, 'utf8')
  .trim()
  .split('\n')
  .slice(1)
  .map((line) => {
    const [kind = '', ...numbers] = line.split(',')
    const [a = 0, b = 0, c = 0, value = 0] = numbers.map(Number)
    return { kind, a, b, c, value }
  })

const worst = (
  kind: string,
  ours: (a: number, b: number, c: number) => number,
): { relative: number; absolute: number } => {
  const own = points.filter((point) => point.kind === kind)
  expect(own.length).toBeGreaterThan(45)
  const errors = own.map(({ a, b, c, value }) => Math.abs(ours(a, b, c) - value))
  return {
    absolute: Math.max(...errors),
    relative: Math.max(...errors.map((error, i) => error / own[i]!.value)),
  }
}

describe('distribution functions agree with R', () => {
  it('two tails of t keep their digits far out', () => {
    expect(worst('t tail', tTwoSided).relative).toBeLessThan(5e-7)
  })
  it('quantiles of t', () => {
    expect(worst('t quantile', tQuantile).relative).toBeLessThan(1e-7)
  })
  it('upper tail of F keeps its digits far out', () => {
    expect(worst('F tail', fUpperTail).relative).toBeLessThan(5e-7)
  })
  it('quantiles of F', () => {
    expect(worst('F quantile', fQuantile).relative).toBeLessThan(2e-7)
  })
  it('upper tail of chi-square keeps its digits far out', () => {
    expect(worst('chi-square tail', chiSquareUpperTail).relative).toBeLessThan(1e-9)
  })
  it('upper tail of the studentized range, by nested integration', () => {
    expect(worst('range tail', rangeUpperTail).absolute).toBeLessThan(3e-7)
  })
})

describe('the studentized range', () => {
  it('has quantiles that its own tail takes back', () => {
    for (const means of [2, 3, 7, 12]) {
      for (const df of [1, 2.4, 9, 300]) {
        expect(rangeUpperTail(rangeQuantile(0.05, means, df), means, df)).toBeCloseTo(0.05, 8)
      }
    }
  })
  it('gives the tabled q(.95; 3, 12) = 3.772929 (R qtukey) and q(.99; 12, 2) = 33.40 (Harter’s table, from memory)', () => {
    expect(rangeQuantile(0.05, 3, 12)).toBeCloseTo(3.772929, 6)
    expect(rangeQuantile(0.01, 12, 2)).toBeCloseTo(33.4, 2)
  })
  it('is Student’s t for two means', () => {
    expect(rangeUpperTail(2.228138852 * Math.SQRT2, 2, 10)).toBeCloseTo(0.05, 7)
  })
})

describe('arguments out of range', () => {
  it('are refused as a programmer’s error', () => {
    expect(() => tTwoSided(1, 0)).toThrow(RangeError)
    expect(() => tQuantile(0, 5)).toThrow(RangeError)
    expect(() => fUpperTail(1, 0, 5)).toThrow(RangeError)
    expect(() => fQuantile(1, 2, 5)).toThrow(RangeError)
    expect(() => chiSquareUpperTail(1, 0)).toThrow(RangeError)
    expect(() => rangeUpperTail(1, 1, 5)).toThrow(RangeError)
    expect(() => rangeQuantile(2, 3, 5)).toThrow(RangeError)
  })
  it('a statistic of zero or less has its whole tail above it', () => {
    expect([tTwoSided(0, 4), fUpperTail(0, 2, 4), chiSquareUpperTail(0, 3), rangeUpperTail(0, 3, 4)]).toEqual(
      [1, 1, 1, 1],
    )
  })
})
