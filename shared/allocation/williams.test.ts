import { describe, expect, test } from 'vitest'
import { followerCounts, positionCounts, range } from './balance.ts'
import { half, square } from './williams.ts'

const written = (rows: number[][]) => rows.map((row) => row.join('')).join(' ')

describe('the Williams square', () => {
  // Williams 1949, Aust. J. Sci. Res. A2:149: construction; the squares below are its n = 4, 5, 6 as commonly printed.
  test('is the published one for four, five and six units', () => {
    expect(written(square(4))).toBe('0132 1203 2310 3021')
    expect(written(square(5))).toBe('01423 12034 23140 34201 40312 32410 43021 04132 10243 21304')
    expect(written(square(6))).toBe('015243 120354 231405 342510 453021 504132')
  })

  test.each(range(12).map((i) => i + 2))('balances positions and followers for %i units', (n) => {
    const rows = square(n)
    const times = n % 2 === 0 ? 1 : 2
    expect(rows).toHaveLength(n * times)
    for (const row of rows) expect([...row].sort((a, b) => a - b)).toEqual(range(n))
    expect(
      positionCounts(rows, n)
        .flat()
        .every((count) => count === times),
    ).toBe(true)
    followerCounts(rows, n).forEach((counts, unit) =>
      counts.forEach((count, next) => expect(count).toBe(unit === next ? 0 : times)),
    )
  })

  test.each(range(12).map((i) => i + 2))('has each half free of clashes in step for %i units', (n) => {
    for (const direction of ['forward', 'reversed'] as const) {
      expect(
        positionCounts(half(n, direction), n)
          .flat()
          .every((count) => count === 1),
      ).toBe(true)
    }
  })

  test('cannot mix the halves at one table: a forward and a reversed row always meet once', () => {
    for (const n of [3, 5, 7, 9, 11]) {
      for (const row of half(n, 'forward')) {
        for (const other of half(n, 'reversed')) {
          expect(row.filter((unit, position) => other[position] === unit)).toHaveLength(1)
        }
      }
    }
  })
})
