import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { alphaWithJackknife } from './alpha-jackknife.ts'
import { isCannot } from './cannot.ts'
import { krippendorffAlpha } from './krippendorff.ts'

type Table = readonly (readonly (number | null)[])[]
const byUnit = (table: Table): number[][] =>
  table[0]!.map((_, unit) => table.flatMap((row) => (row[unit] === null ? [] : [row[unit]!])))
const values = (table: Table) =>
  table.flatMap((row, listener) =>
    row.flatMap((value, unit) => (value === null ? [] : [{ listener, unit, value }])),
  )

const _ = null
/** Krippendorff 2011, "Computing Krippendorff's Alpha-Reliability", example with missing values. */
const example: Table = [
  [1, 2, 3, 3, 2, 1, 4, 1, 2, _, _, _],
  [1, 2, 3, 3, 2, 2, 4, 1, 2, 5, _, 3],
  [_, 3, 3, 3, 2, 3, 4, 2, 2, 5, 1, _],
  [1, 2, 3, 3, 2, 4, 4, 1, 2, 5, 1, _],
]

describe('Krippendorff’s alpha', () => {
  it.each([
    ['nominal', 0.743421],
    ['ordinal', 0.815388],
    ['interval', 0.849107],
    ['ratio', 0.797403],
  ] as const)('%s: the 2011 example with missing values (.743 .815 .849 .797)', (metric, alpha) => {
    expect(krippendorffAlpha(byUnit(example), metric)).toBeCloseTo(alpha, 6)
  })

  it('of the Shrout and Fleiss table is .147308 (interval) and .109059 (ordinal), recomputed in R', () => {
    const table = [
      [9, 2, 5, 8],
      [6, 1, 3, 2],
      [8, 4, 6, 8],
      [7, 1, 2, 6],
      [10, 5, 6, 9],
      [6, 2, 4, 7],
    ]
    expect(krippendorffAlpha(table, 'interval')).toBeCloseTo(0.147308, 6)
    expect(krippendorffAlpha(table, 'ordinal')).toBeCloseTo(0.109059, 6)
  })

  it('is one for perfect agreement and does not change when a constant is added', () => {
    expect(
      krippendorffAlpha(
        [
          [1, 1],
          [4, 4, 4],
          [2, 2],
        ],
        'interval',
      ),
    ).toBe(1)
    const shifted = byUnit(example).map((unit) => unit.map((value) => value + 1e6))
    expect(krippendorffAlpha(shifted, 'interval')).toBeCloseTo(0.849107, 6)
  })

  it('says when there is nothing to say', () => {
    expect(krippendorffAlpha([[1], [2]], 'interval')).toEqual({ ok: false, reason: 'no-pair-of-scores' })
    expect(
      krippendorffAlpha(
        [
          [3, 3],
          [3, 3],
        ],
        'interval',
      ),
    ).toEqual({ ok: false, reason: 'no-variation' })
    expect(
      krippendorffAlpha(
        [
          [3, 3],
          [3, 3],
        ],
        'nominal',
      ),
    ).toEqual({ ok: false, reason: 'no-variation' })
    expect(
      krippendorffAlpha(
        [
          [-3, 3],
          [3, 3],
        ],
        'ratio',
      ),
    ).toEqual({ ok: false, reason: 'not-a-ratio-scale' })
  })
})

interface Reference {
  readonly name: string
  readonly table: Table
  readonly interval: { estimate: number; low: number; high: number }
  readonly ordinal: { estimate: number; low: number; high: number }
}
/** Made by tests/fixtures/stats/alpha-jackknife.R through the full coincidence matrix. */
const file = new URL('../../tests/fixtures/stats/alpha-jackknife.json', import.meta.url)
const references = JSON.parse(readFileSync(file, 'utf8')) as Reference[]

describe('the jackknife interval of alpha', () => {
  for (const { name, table, ...expected } of references) {
    for (const metric of ['interval', 'ordinal'] as const) {
      it(`${name}, ${metric}: as in R, listener by listener`, () => {
        const found = alphaWithJackknife(values(table), metric)
        if (isCannot(found)) throw new Error(found.reason)
        expect(found.estimate).toBeCloseTo(expected[metric].estimate, 10)
        expect(found.low).toBeCloseTo(expected[metric].low, 6)
        expect(found.high).toBeCloseTo(expected[metric].high, 6)
      })
    }
  }

  it('is left out, with the reason, for two listeners, for perfect agreement and for a fragile table', () => {
    expect(
      alphaWithJackknife(
        values([
          [1, 2, 3],
          [1, 3, 3],
        ]),
        'interval',
      ),
    ).toMatchObject({
      lowReason: 'fewer-than-three-listeners',
    })
    expect(
      alphaWithJackknife(
        values([
          [1, 2],
          [1, 2],
          [1, 2],
        ]),
        'ordinal',
      ),
    ).toEqual({
      estimate: 1,
      lowReason: 'no-variation-left',
      highReason: 'no-variation-left',
    })
    expect(
      alphaWithJackknife(
        values([
          [1, _],
          [2, _],
          [_, 5],
        ]),
        'interval',
      ),
    ).toMatchObject({ lowReason: 'not-estimable' })
    expect(alphaWithJackknife([], 'interval')).toEqual({ ok: false, reason: 'no-pair-of-scores' })
  })
})
