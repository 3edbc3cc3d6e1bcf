import { describe, expect, it } from 'vitest'
import { isCannot } from './cannot.ts'
import type { IccEstimate, IccForm } from './analysis-types.ts'
import { intraclass } from './icc.ts'

const said = (table: number[][], form: IccForm): IccEstimate => {
  const found = intraclass(table)[form]
  if (isCannot(found)) throw new Error(found.reason)
  return found
}
const transpose = (rows: number[][]): number[][] => rows[0]!.map((_, i) => rows.map((row) => row[i]!))

/** Shrout & Fleiss 1979, table 2: six targets, four judges. */
const shroutFleiss = [
  [9, 2, 5, 8],
  [6, 1, 3, 2],
  [8, 4, 6, 8],
  [7, 1, 2, 6],
  [10, 5, 6, 9],
  [6, 2, 4, 7],
]

describe('intraclass correlation', () => {
  it.each([
    // Estimates: Shrout & Fleiss 1979, table 4 (.17 .29 .71 .44 .62 .91); F, p and intervals recomputed with R psych 2.2.9.
    ['ICC(1,1)', 0.165742, 1.794678, 18, 0.164769, -0.132932, 0.72256],
    ['ICC(2,1)', 0.289764, 11.027248, 15, 0.000134567, 0.018787, 0.761084],
    ['ICC(3,1)', 0.714841, 11.027248, 15, 0.000134567, 0.342465, 0.945858],
    ['ICC(1,k)', 0.442797, 1.794678, 18, 0.164769, -0.884442, 0.912415],
    ['ICC(2,k)', 0.620051, 11.027248, 15, 0.000134567, 0.071137, 0.927232],
    ['ICC(3,k)', 0.909316, 11.027248, 15, 0.000134567, 0.675675, 0.985892],
  ] as const)('%s of Shrout and Fleiss', (form, estimate, f, df2, p, low, high) => {
    const found = said(shroutFleiss, form)
    expect(found.estimate).toBeCloseTo(estimate, 6)
    expect(found.f).toBeCloseTo(f, 6)
    expect([found.df1, found.df2]).toEqual([5, df2])
    expect(found.p).toBeCloseTo(p, 6)
    expect(found.low).toBeCloseTo(low, 6)
    expect(found.high).toBeCloseTo(high, 6)
  })

  it('the anxiety ratings of the R package irr (20 subjects, 3 raters; McGraw & Wong 1996 formulas)', () => {
    const raters = [
      [3, 3, 3, 4, 5, 5, 2, 3, 5, 2, 2, 6, 1, 5, 2, 2, 1, 2, 4, 3],
      [3, 6, 4, 6, 2, 4, 2, 4, 3, 3, 2, 3, 3, 3, 2, 2, 1, 3, 3, 4],
      [2, 1, 4, 4, 3, 2, 1, 6, 1, 1, 1, 2, 3, 3, 1, 1, 3, 3, 2, 2],
    ]
    const table = transpose(raters)
    expect(said(table, 'ICC(1,1)').estimate).toBeCloseTo(0.175022, 6)
    expect(said(table, 'ICC(2,1)').estimate).toBeCloseTo(0.197998, 6)
    expect(said(table, 'ICC(2,1)').low).toBeCloseTo(-0.038911, 6)
    expect(said(table, 'ICC(2,1)').high).toBeCloseTo(0.493574, 6)
    expect(said(table, 'ICC(3,1)').low).toBeCloseTo(-0.046258, 6)
    expect(said(table, 'ICC(2,k)').low).toBeCloseTo(-0.126583, 6)
    expect(said(table, 'ICC(3,k)').estimate).toBeCloseTo(0.452586, 6)
  })

  it('leaves the lower limit of the average out where the step from one to many has a pole', () => {
    // Constructed panel of four by five; the single form's lower limit is −.348634, below −1/3.
    const means = [
      [22, 33, 52, 64, 79],
      [42, 48, 53, 59, 63],
      [45, 45, 45, 57.5, 72.5],
      [68, 62, 51, 43, 29],
    ]
    const table = transpose(means)
    expect(said(table, 'ICC(2,1)').low).toBeCloseTo(-0.348634, 5)
    const average = said(table, 'ICC(2,k)')
    expect(average.low).toBeUndefined()
    expect(average.lowReason).toBe('not estimable')
  })

  it('does not change with the order of listeners or units, nor with a constant added', () => {
    const moved = [...shroutFleiss]
      .reverse()
      .map((row) => [row[2]! + 1000, row[0]! + 1000, row[3]! + 1000, row[1]! + 1000])
    for (const form of ['ICC(1,1)', 'ICC(2,1)', 'ICC(3,1)', 'ICC(2,k)'] as const) {
      expect(said(moved, form).estimate).toBeCloseTo(said(shroutFleiss, form).estimate, 10)
      expect(said(moved, form).low).toBeCloseTo(said(shroutFleiss, form).low!, 8)
    }
  })

  it('keeps negative values', () => {
    expect(
      said(
        [
          [1, 9],
          [9, 1],
          [5, 5],
        ],
        'ICC(2,1)',
      ).estimate,
    ).toBeLessThan(0)
  })

  it('says when there is nothing to say', () => {
    expect(
      intraclass([
        [5, 5],
        [5, 5],
      ])['ICC(2,1)'],
    ).toEqual({ ok: false, reason: 'no-variation' })
    expect(intraclass([[5], [7]])['ICC(2,1)']).toEqual({
      ok: false,
      reason: 'fewer-than-two-complete-listeners',
    })
    expect(intraclass([[5, 7]])['ICC(2,1)']).toEqual({ ok: false, reason: 'fewer-than-two-units' })
    expect(intraclass([])['ICC(2,1)']).toEqual({ ok: false, reason: 'fewer-than-two-complete-listeners' })
    expect(() => intraclass([[1, 2], [3]])).toThrow(RangeError)
  })

  it('gives the estimate and no limits where listeners differ by a constant only', () => {
    const found = said(
      [
        [1, 3],
        [5, 7],
        [9, 11],
      ],
      'ICC(3,1)',
    )
    expect(found.estimate).toBe(1)
    expect(found.low).toBeUndefined()
    expect(found.f).toEqual({ ok: false, reason: 'no-variation-left' })
  })
})
