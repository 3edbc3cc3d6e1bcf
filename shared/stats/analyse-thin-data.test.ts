import { describe, expect, it } from 'vitest'
import { oneServing, rowsOf } from '#tests/fixtures/stats/rows.ts'
import { analyse } from './analyse.ts'
import type { DescriptorAnalysis, LongRating } from './analysis-types.ts'
import { isCannot } from './cannot.ts'

const bassOf = (rows: readonly LongRating[]): DescriptorAnalysis =>
  analyse(rows, { draws: 0 }).descriptors['bass']!

const varied = [
  [
    [22, 31],
    [40, 37],
    [52, 60],
    [71, 66],
  ],
  [
    [35, 20],
    [44, 50],
    [39, 58],
    [80, 74],
  ],
  [
    [18, 29],
    [33, 41],
    [66, 49],
    [59, 77],
  ],
  [
    [30, 38],
    [28, 47],
    [55, 62],
    [69, 83],
  ],
]

describe('thin data says so instead of failing', () => {
  const reasonOf = (value: unknown): string => (isCannot(value) ? value.reason : 'said')

  it('no rows at all', () => {
    expect(analyse([])).toMatchObject({
      descriptors: {},
      order: { descriptors: [], units: [], panelists: [] },
    })
  })
  it('all missing', () => {
    const found = bassOf(
      oneServing([
        [null, null],
        [null, null],
      ]),
    )
    expect(found.counts).toEqual({ panelists: 0, units: 2, ratings: 0, missingCells: 0, cantTell: 4 })
    expect(found.units['A']).toMatchObject({
      n: 0,
      listeners: 0,
      cantTell: 2,
      mean: { ok: false, reason: 'no-ratings' },
    })
    expect(reasonOf(found.model)).toBe('no-ratings')
    expect(reasonOf(found.pairs)).toBe('no-ratings')
    expect(reasonOf(found.agreement.krippendorffInterval)).toBe('no-pair-of-scores')
    expect(reasonOf(found.panelists['L1']!.bias)).toBe('no-ratings-by-this-listener')
  })
  it('one listener', () => {
    const found = bassOf(oneServing([[10, 40, 70]]))
    expect(reasonOf(found.model)).toBe('fewer-than-two-listeners')
    expect(reasonOf(found.agreement.kendallW)).toBe('fewer-than-two-complete-listeners')
    expect(reasonOf(found.panelists['L1']!.agreement)).toBe('fewer-than-two-listeners')
    expect(found.units['A']).toMatchObject({ n: 1, median: 10, sd: { reason: 'fewer-than-two-scores' } })
  })
  it('one unit', () => {
    const found = bassOf(oneServing([[10], [40], [70]]))
    expect(reasonOf(found.model)).toBe('fewer-than-two-units')
    expect(reasonOf(found.agreement.icc['ICC(2,1)'])).toBe('fewer-than-two-units')
    expect(found.units['A']!.median).toBe(40)
  })
  it('two listeners have a model; their agreement has no jackknife interval', () => {
    const found = bassOf(
      oneServing([
        [10, 40, 70],
        [22, 31, 80],
      ]),
    )
    expect(reasonOf(found.model)).toBe('said')
    expect(found.agreement.krippendorffInterval).toMatchObject({ lowReason: 'fewer-than-three-listeners' })
  })
  it('a listener who gives one rating throughout', () => {
    const found = bassOf(
      rowsOf([
        [
          [50, 50],
          [50, 50],
          [50, 50],
          [50, 50],
        ],
        ...varied,
      ]),
    )
    expect(found.panelists['L1']).toMatchObject({
      discriminationF: { reason: 'constant-listener' },
      repeatability: 0,
      agreement: { reason: 'constant-listener' },
      slope: 0,
    })
    expect(typeof found.panelists['L1']!.bias).toBe('number')
  })
  it('the same rating by everybody everywhere', () => {
    const found = bassOf(
      oneServing([
        [50, 50],
        [50, 50],
        [50, 50],
      ]),
    )
    expect(reasonOf(found.model)).toBe('no-variation-left')
    expect(reasonOf(found.agreement.iccFromModel)).toBe('no-variation')
    expect(reasonOf(found.agreement.kendallW)).toBe('all-constant')
    expect(found.units['A']).toMatchObject({ mean: 50, median: 50, sd: 0 })
  })
  it('everybody in perfect accord', () => {
    const found = bassOf(
      oneServing([
        [10, 40, 70],
        [10, 40, 70],
        [10, 40, 70],
      ]),
    )
    expect(reasonOf(found.model)).toBe('no-variation-left')
    expect(found.agreement.krippendorffInterval).toMatchObject({ estimate: 1 })
    expect(found.agreement.kendallW).toMatchObject({ w: 1 })
  })
  it('listeners who differ by a constant only', () => {
    const found = bassOf(
      oneServing([
        [10, 40, 70],
        [15, 45, 75],
        [20, 50, 80],
      ]),
    )
    expect(reasonOf(found.model)).toBe('not-estimable')
  })
  it('each listener rated one unit: listener and unit cannot be told apart', () => {
    const found = bassOf(
      oneServing([
        [10, null],
        [null, 30],
        [20, null],
        [null, 50],
      ]),
    )
    expect(reasonOf(found.model)).toBe('not-estimable')
    expect(found.counts.missingCells).toBe(4)
  })
  it('listeners who hang together by single units only: nothing is left to measure an error by', () => {
    const found = bassOf(
      oneServing([
        [null, null, null, 30, 10],
        [10, null, null, 30, null],
        [0, 40, null, null, null],
        [10, null, 10, null, null],
      ]),
    )
    expect(reasonOf(found.model)).toBe('not-estimable')
    expect(found.units['A']!.median).toBe(10)
  })
  it('repeats that are all identical', () => {
    const found = bassOf(
      rowsOf([
        [
          [10, 10],
          [40, 40],
        ],
        [
          [20, 20],
          [60, 60],
        ],
        [
          [15, 15],
          [20, 20],
        ],
      ]),
    )
    expect(reasonOf(found.model)).toBe('no-variation-left')
  })
  it('a unit that nobody scored is named and the others go on', () => {
    const found = bassOf(
      oneServing([
        [10, 40, null],
        [22, 31, null],
        [25, 50, null],
      ]),
    )
    expect(found.counts).toMatchObject({ units: 3, missingCells: 3 })
    expect(found.units['C']).toMatchObject({ n: 0, adjustedMean: { ok: false, reason: 'no-ratings' } })
    expect(typeof found.units['A']!.adjustedMean).toBe('number')
  })
  it('a score that is no number is a programmer’s error', () => {
    expect(() => analyse([{ ...oneServing([[1]])[0]!, score: NaN }])).toThrow(RangeError)
    expect(() => analyse([], { draws: -1 })).toThrow(RangeError)
  })
})
