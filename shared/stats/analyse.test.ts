import { describe, expect, it } from 'vitest'
import { analyse } from './analyse.ts'
import type { Analysis, DescriptorAnalysis, LongRating } from './analysis-types.ts'
import { isCannot } from './cannot.ts'
import { seededRandom } from './random.ts'

type Cell = number | null
/** Listeners × units × servings to rows. */
const rowsOf = (table: readonly (readonly (readonly Cell[])[])[], descriptor = 'bass'): LongRating[] =>
  table.flatMap((byUnit, j) =>
    byUnit.flatMap((servings, u) =>
      servings.map((score, r) => ({
        panelist: `L${j + 1}`,
        unit: 'ABCDEFGH'[u]!,
        descriptor,
        replicate: r + 1,
        position: null,
        score,
        cantTell: score === null,
      })),
    ),
  )
const single = (table: readonly (readonly Cell[])[]): LongRating[] =>
  rowsOf(table.map((row) => row.map((score) => [score])))
const bassOf = (rows: readonly LongRating[]): DescriptorAnalysis =>
  analyse(rows, { draws: 0 }).descriptors['bass']!

const random = seededRandom('analyse test')
const invented = Array.from({ length: 9 }, () => {
  const level = 20 * random()
  return Array.from({ length: 5 }, (_, unit) =>
    [0, 1].map(() => Math.round(20 + level + 9 * unit + 25 * random())),
  )
})
const ragged = rowsOf(invented).filter((_, i) => i % 11 !== 3)

/** Every number in a result, by path. */
function numbers(value: unknown, path = ''): [string, number][] {
  if (typeof value === 'number') return [[path, value]]
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, entry]) => numbers(entry, `${path}/${key}`))
}

describe('an analysis', () => {
  it('survives JSON unchanged and holds no null', () => {
    const found = analyse(ragged, { draws: 200 })
    const text = JSON.stringify(found)
    expect(JSON.parse(text)).toEqual(found)
    expect(text).not.toContain('null')
  })

  it('has the keys that the command promises', () => {
    const found = bassOf(ragged)
    expect(Object.keys(found)).toEqual(
      expect.arrayContaining([
        'counts',
        'units',
        'agreement',
        'model',
        'pairs',
        'durbin',
        'blockRanks',
        'panelists',
      ]),
    )
    expect(found.counts).toMatchObject({ panelists: 9, units: 5, ratings: ragged.length, missingCells: 0 })
    expect(Object.keys(found.units['A']!)).toEqual(
      expect.arrayContaining(
        'n listeners mean median q1 q3 sd adjustedMean standardError df low high'.split(' '),
      ),
    )
    expect(Object.keys(found.panelists['L1']!)).toEqual(
      expect.arrayContaining('discriminationF discriminationP repeatability agreement slope bias'.split(' ')),
    )
    expect(found.pairs).toHaveLength(10)
  })

  it('is the same to the last digit for rows in any order, and for the same seed', () => {
    const turned = [...ragged].reverse()
    expect(analyse(turned, { draws: 300, seed: 's' })).toEqual(analyse(ragged, { draws: 300, seed: 's' }))
  })

  it('moves means by a constant added to every score and nothing else', () => {
    const shifted = ragged.map((row) => ({ ...row, score: row.score! + 500 }))
    const before = bassOf(ragged)
    const after = bassOf(shifted)
    expect(Number(after.units['C']!.adjustedMean) - Number(before.units['C']!.adjustedMean)).toBeCloseTo(
      500,
      8,
    )
    const still = (found: DescriptorAnalysis) => numbers({ ...found, units: {} })
    const moved = still(after)
    still(before).forEach(([path, value], i) => {
      expect(moved[i]![0]).toBe(path)
      expect(moved[i]![1]).toBeCloseTo(value, 6)
    })
  })

  it('does not care what listeners and units are called', () => {
    const swap: Record<string, string> = { A: 'Z', B: 'Y', C: 'X', D: 'W', E: 'V' }
    const renamed = bassOf(
      ragged.map((row) => ({
        ...row,
        panelist: `x${10 - Number(row.panelist.slice(1))}`,
        unit: swap[row.unit]!,
      })),
    )
    const named = bassOf(ragged)
    expect(renamed.units['Z']!.adjustedMean).toBeCloseTo(named.units['A']!.adjustedMean as number, 8)
    expect(renamed.panelists['x9']!.bias).toBeCloseTo(named.panelists['L1']!.bias as number, 6)
    if (isCannot(renamed.model) || isCannot(named.model)) throw new Error('expected models')
    expect(renamed.model.remlCriterion).toBeCloseTo(named.model.remlCriterion, 8)
    const pair = (renamed.pairs as { a: string; b: string; difference: number }[]).find(
      ({ a, b }) => a === 'Y' && b === 'Z',
    )!
    const same = (named.pairs as { a: string; b: string; difference: number }[]).find(
      ({ a, b }) => a === 'A' && b === 'B',
    )!
    expect(pair.difference).toBeCloseTo(-same.difference, 8)
  })

  it('keeps names that JavaScript treats oddly', () => {
    const odd = single([
      [1, 5],
      [3, 6],
      [2, 9],
    ]).map((row) => ({ ...row, unit: row.unit === 'A' ? '__proto__' : '10' }))
    const found = analyse(odd, { draws: 0 })
    expect(found.order.units).toEqual(['10', '__proto__'])
    expect(Object.keys(found.descriptors['bass']!.units)).toEqual(['10', '__proto__'])
  })
})

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
      single([
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
    const found = bassOf(single([[10, 40, 70]]))
    expect(reasonOf(found.model)).toBe('fewer-than-two-listeners')
    expect(reasonOf(found.agreement.kendallW)).toBe('fewer-than-two-complete-listeners')
    expect(reasonOf(found.panelists['L1']!.agreement)).toBe('fewer-than-two-listeners')
    expect(found.units['A']).toMatchObject({ n: 1, median: 10, sd: { reason: 'fewer-than-two-scores' } })
  })
  it('one unit', () => {
    const found = bassOf(single([[10], [40], [70]]))
    expect(reasonOf(found.model)).toBe('fewer-than-two-units')
    expect(reasonOf(found.agreement.icc['ICC(2,1)'])).toBe('fewer-than-two-units')
    expect(found.units['A']!.median).toBe(40)
  })
  it('two listeners have a model; their agreement has no jackknife interval', () => {
    const found = bassOf(
      single([
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
        ...invented.slice(0, 4).map((row) => row.slice(0, 4)),
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
      single([
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
      single([
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
      single([
        [10, 40, 70],
        [15, 45, 75],
        [20, 50, 80],
      ]),
    )
    expect(reasonOf(found.model)).toBe('not-estimable')
  })
  it('each listener rated one unit: listener and unit cannot be told apart', () => {
    const found = bassOf(
      single([
        [10, null],
        [null, 30],
        [20, null],
        [null, 50],
      ]),
    )
    expect(reasonOf(found.model)).toBe('not-estimable')
    expect(found.counts.missingCells).toBe(4)
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
      single([
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
    expect(() => analyse([{ ...single([[1]])[0]!, score: NaN }])).toThrow(RangeError)
    expect(() => analyse([], { draws: -1 })).toThrow(RangeError)
  })
})

describe('listeners in an incomplete table', () => {
  it('are compared with the model refitted without them, the same as a fit from the start', () => {
    const found = bassOf(ragged.filter((row) => !(row.panelist === 'L2' && row.unit === 'D')))
    const without = bassOf(ragged.filter((row) => row.panelist !== 'L2'))
    const units = ['A', 'B', 'C', 'E']
    const own = units.map((unit) => {
      const scores = ragged
        .filter((row) => row.panelist === 'L2' && row.unit === unit)
        .map((row) => row.score!)
      return scores.reduce((total, score) => total + score, 0) / scores.length
    })
    const bias =
      units.reduce((total, unit, i) => total + own[i]! - Number(without.units[unit]!.mean), 0) / units.length
    const adjusted =
      units.reduce((total, unit, i) => total + own[i]! - Number(without.units[unit]!.adjustedMean), 0) /
      units.length
    expect(found.panelists['L2']!.bias).toBeCloseTo(adjusted, 6)
    expect(Math.abs(adjusted - bias)).toBeLessThan(10)
  })
  it('need four units for correlation and slope', () => {
    const found = bassOf(
      single([
        [10, 40, 70, null],
        [22, 31, 80, 50],
        [25, 50, 60, 41],
        [9, 30, 66, 58],
      ]),
    )
    expect(found.panelists['L1']).toMatchObject({ agreement: { reason: 'fewer-than-four-units' } })
    expect(typeof found.panelists['L2']!.agreement).toBe('number')
  })
  it('still have their others where they alone rated a unit', () => {
    const found = bassOf(
      single([
        [10, 40, 70, 33],
        [22, 31, 80, null],
        [25, 50, 60, null],
        [9, 30, 66, null],
      ]),
    )
    expect(typeof found.panelists['L1']!.bias).toBe('number')
  })
})

describe('agreement from the model', () => {
  const agreementOf = (found: Analysis) => {
    const said = found.descriptors['bass']!.agreement.iccFromModel
    if (isCannot(said)) throw new Error(said.reason)
    return said
  }
  it('is ICC(2,1) with its interval on a complete table without repeats', () => {
    const rows = single([
      [9, 6, 8, 7, 10, 6],
      [2, 1, 4, 1, 5, 2],
      [5, 3, 6, 2, 6, 4],
      [8, 2, 8, 6, 9, 7],
    ])
    const said = agreementOf(analyse(rows, { draws: 0 }))
    // Shrout & Fleiss 1979: .29 (.018787, .761084), average .62, consistency .71.
    expect(said.single).toBeCloseTo(0.289764, 6)
    expect(said.singleLow).toBeCloseTo(0.018787, 6)
    expect(said.singleHigh).toBeCloseTo(0.761084, 6)
    expect(said.average).toBeCloseTo(0.620051, 6)
    expect(said.averageLow).toBeCloseTo(0.071137, 5)
    expect(said.averageHigh).toBeCloseTo(0.927232, 5)
    expect(said.consistency).toBeCloseTo(0.714841, 6)
  })
  it('its general interval passes into Shrout and Fleiss’s as the table fills up', () => {
    const table = Array.from({ length: 12 }, (_, j) => invented[j % 9]!.map(([a, b]) => (j < 9 ? a! : b!)))
    const full = agreementOf(analyse(single(table), { draws: 0 }))
    const holed = agreementOf(
      analyse(single(table.map((row, j) => (j === 0 ? [null, ...row.slice(1)] : row))), { draws: 0 }),
    )
    expect(holed.singleMethod).not.toBe(full.singleMethod)
    expect(Math.abs(Number(holed.singleLow) - Number(full.singleLow))).toBeLessThan(0.06)
    expect(Math.abs(Number(holed.singleHigh) - Number(full.singleHigh))).toBeLessThan(0.06)
  })
})
