import { describe, expect, it } from 'vitest'
import { analyse } from './analyse.ts'
import type { DescriptorAnalysis, LongRating } from './analysis-types.ts'
import { isCannot } from './cannot.ts'
import { seededRandom } from './random.ts'
import { oneServing, rowsOf } from '#tests/fixtures/stats/rows.ts'

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
    if (isCannot(renamed.pairs) || isCannot(named.pairs)) throw new Error('expected pairs')
    const pair = renamed.pairs.find(({ a, b }) => a === 'Y' && b === 'Z')!
    const same = named.pairs.find(({ a, b }) => a === 'A' && b === 'B')!
    expect(pair.difference).toBeCloseTo(-same.difference, 8)
  })

  it('keeps names that JavaScript treats oddly', () => {
    const odd = oneServing([
      [1, 5],
      [3, 6],
      [2, 9],
    ]).map((row) => ({ ...row, unit: row.unit === 'A' ? '__proto__' : '10' }))
    const found = analyse(odd, { draws: 0 })
    expect(found.order.units).toEqual(['10', '__proto__'])
    expect(Object.keys(found.descriptors['bass']!.units)).toEqual(['10', '__proto__'])
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
      oneServing([
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
      oneServing([
        [10, 40, 70, 33],
        [22, 31, 80, null],
        [25, 50, 60, null],
        [9, 30, 66, null],
      ]),
    )
    expect(typeof found.panelists['L1']!.bias).toBe('number')
  })
})
