import { describe, expect, it } from 'vitest'
import type { KendallW } from './analysis-types.ts'
import { isCannot } from './cannot.ts'
import { friedman, kendallW } from './kendall-w.ts'
import { exactRankTail } from './kendall-w-exact.ts'
import { midRanks } from './mid-ranks.ts'
import { seededRandom } from './random.ts'

const said = (scores: number[][], draws = 0): KendallW => {
  const found = kendallW(scores, draws, seededRandom('test'))
  if (isCannot(found)) throw new Error(found.reason)
  return found
}

/** Siegel 1956: three executives rank six applicants (data from memory; rank sums check). */
const siegel = [
  [1, 6, 3, 2, 5, 4],
  [1, 5, 6, 4, 2, 3],
  [6, 3, 2, 5, 4, 1],
]
/** Kendall 1948, quoted in Siegel 1956 (data from memory). */
const kendall = [
  [1, 4.5, 2, 4.5, 3, 7.5, 6, 9, 7.5, 10],
  [2.5, 1, 2.5, 4.5, 4.5, 8, 9, 6.5, 10, 6.5],
  [2, 1, 4.5, 4.5, 4.5, 4.5, 8, 8, 8, 10],
]

describe('Kendall’s W', () => {
  it('without ties: Siegel’s executives, .16', () => {
    const found = said(siegel)
    expect(found.w).toBeCloseTo(0.161905, 6)
    expect(found.chiSquare).toBeCloseTo(2.428571, 6)
    expect(found.df).toBe(5)
    expect(found.p).toBeCloseTo(0.787212, 6)
  })
  it('with ties: Kendall 1948, .828', () => {
    const found = said(kendall)
    expect(found.w).toBeCloseTo(0.827731, 6)
    expect(found.chiSquare).toBeCloseTo(22.348739, 6)
    expect(found.p).toBeCloseTo(0.007837, 6)
  })
  it('does not change with the order of listeners or units, nor with any rising scale', () => {
    const moved = [...kendall]
      .reverse()
      .map((row) => [...row].reverse().map((value) => Math.exp(value / 3) + 7))
    expect(said(moved).w).toBeCloseTo(0.827731, 6)
  })
  it('keeps a listener who rates everything alike, all tied', () => {
    expect(said([...siegel, [5, 5, 5, 5, 5, 5]]).listeners).toBe(4)
    expect(
      said([
        [1, 2, 3],
        [5, 5, 5],
      ]).w,
    ).toBeCloseTo(0.5, 10)
  })
  it('says when there is nothing to say', () => {
    expect(
      kendallW(
        [
          [5, 5],
          [7, 7],
        ],
        0,
      ),
    ).toEqual({ ok: false, reason: 'all-constant' })
    expect(kendallW([[5, 6]], 0)).toEqual({ ok: false, reason: 'fewer-than-two-complete-listeners' })
    expect(kendallW([[5], [7]], 0)).toEqual({ ok: false, reason: 'fewer-than-two-units' })
    expect(() => kendallW([[1, 2], [1]], 0)).toThrow(RangeError)
  })
})

describe('the exact p of W', () => {
  const permutations = (row: number[]): number[][] =>
    row.length < 2
      ? [row]
      : row.flatMap((value, i) =>
          permutations([...row.slice(0, i), ...row.slice(i + 1)]).map((rest) => [value, ...rest]),
        )
  const spread = (rows: number[][]): number =>
    rows[0]!.reduce((total, _, unit) => total + rows.reduce((sum, row) => sum + row[unit]!, 0) ** 2, 0)

  it('counts the same share as going through every order of every listener', () => {
    for (const scores of [
      [
        [1, 2, 3, 4],
        [2, 1, 4, 3],
        [1, 3, 2, 4],
      ],
      [
        [1, 1, 2],
        [3, 1, 1],
        [2, 2, 2],
      ],
    ]) {
      const ranks = scores.map((row) => midRanks(row).ranks)
      const all = ranks.map(permutations)
      const observed = spread(ranks)
      let count = 0
      let total = 0
      for (const a of all[0]!)
        for (const b of all[1]!)
          for (const c of all[2]!) {
            total++
            if (spread([a, b, c]) >= observed - 1e-9) count++
          }
      expect(exactRankTail(ranks, 1).pExact).toBeCloseTo(count / total, 12)
    }
  })
  it('of three listeners in full accord over three units is 1/36', () => {
    expect(
      said(
        [
          [1, 2, 3],
          [1, 2, 3],
          [1, 2, 3],
        ],
        1,
      ),
    ).toMatchObject({ exactMethod: 'enumeration' })
    expect(
      said(
        [
          [1, 2, 3],
          [1, 2, 3],
          [1, 2, 3],
        ],
        1,
      ).pExact,
    ).toBeCloseTo(1 / 36, 12)
  })
  it('is drawn by seed where there are too many orders, never zero, and repeats itself', () => {
    const many = Array.from({ length: 8 }, () => [1, 2, 3, 4, 5, 6])
    const found = said(many, 500)
    expect(found).toMatchObject({ exactMethod: 'monte-carlo', pExact: 1 / 501 })
    expect(said(kendall, 4000)).toEqual(said(kendall, 4000))
    // The chi-square tail of this table is .0078; the draws must land near the exact value below it.
    expect(said(kendall, 4000).pExact).toBeLessThan(0.004)
  })
  it('is switched off with the draws', () => {
    expect(said(siegel, 0).pExact).toEqual({ ok: false, reason: 'draws-switched-off' })
  })
})

describe('Friedman’s test', () => {
  it('rounding first base, Hollander & Wolfe 1973, p. 140', () => {
    const players =
      '5.40,5.50,5.55 5.85,5.70,5.75 5.20,5.60,5.50 5.55,5.50,5.40 5.90,5.85,5.70 5.45,5.55,5.60 5.40,5.40,5.35 5.45,5.50,5.35 5.25,5.15,5.00 5.85,5.80,5.70 5.25,5.20,5.10 5.65,5.55,5.45 5.60,5.35,5.45 5.05,5.00,4.95 5.50,5.50,5.40 5.45,5.55,5.50 5.55,5.55,5.35 5.45,5.50,5.55 5.50,5.45,5.25 5.65,5.60,5.40 5.70,5.65,5.55 6.30,6.30,6.25'
    const found = friedman(players.split(' ').map((row) => row.split(',').map(Number)))
    expect(found).toMatchObject({ df: 2, df1: 2, df2: 42 })
    if ('ok' in found || typeof found.f !== 'number') throw new Error('expected a test')
    expect(found.chiSquare).toBeCloseTo(11.142857, 6)
    expect(found.p).toBeCloseTo(0.003805, 6)
    expect(found.f).toBeCloseTo(7.121739, 6)
  })
  it('grass example, Conover 1999 (data from memory): 8.097 and 3.19', () => {
    const rows =
      '4,3,2,1 4,2,3,1 3,1.5,1.5,4 3,1,2,4 4,2,1,3 2,2,2,4 1,3,2,4 2,4,1,3 3.5,1,2,3.5 4,1,3,2 4,2,3,1 3.5,1,2,3.5'
    const found = friedman(rows.split(' ').map((row) => row.split(',').map(Number)))
    if ('ok' in found || typeof found.f !== 'number') throw new Error('expected a test')
    expect(found.chiSquare).toBeCloseTo(8.097345, 6)
    expect(found.f).toBeCloseTo(3.192198, 6)
  })
})
