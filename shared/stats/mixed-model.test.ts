import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import type { DescriptorAnalysis } from './analysis-types.ts'
import { analyse } from './analyse.ts'
import { isCannot } from './cannot.ts'
import { cellTable, scoresFrom } from './cell-table.ts'
import { fitAllRandom } from './mixed-model/all-random.ts'

type Row = [panelist: string, unit: string, replicate: number, position: number | null, score: number]

const one = (rows: readonly Row[], position = false): DescriptorAnalysis =>
  analyse(
    rows.map(([panelist, unit, replicate, at, score]) => ({
      panelist,
      unit,
      descriptor: 'd',
      replicate,
      position: at,
      score,
    })),
    { draws: 0, position },
  ).descriptors['d']!

const modelOf = (found: DescriptorAnalysis) => {
  if (isCannot(found.model) || isCannot(found.pairs)) throw new Error('expected a model')
  return { model: found.model, pairs: found.pairs, components: found.model.varianceComponents }
}

const fixture = (name: string): string =>
  readFileSync(new URL(`../../tests/fixtures/stats/${name}`, import.meta.url), 'utf8')
const rowsOf = (name: string): Row[] =>
  fixture(name)
    .trim()
    .split('\n')
    .slice(1)
    .map((line) => {
      const [panelist = '', unit = '', , replicate, , score] = line.split(',')
      return [panelist, unit, Number(replicate), null, Number(score)]
    })

/** nlme's Machines: 6 workers as listeners, 3 machines as units, 3 servings. Figures by lme4, emmeans, pbkrtest. */
const machines = rowsOf('machines.csv')
const byMachine = [...machines].sort(
  (a, b) => a[1].localeCompare(b[1]) || Number(a[0]) - Number(b[0]) || a[2] - b[2],
)

describe('the model on published data', () => {
  it('Machines, complete', () => {
    const found = one(machines)
    const { model, pairs, components } = modelOf(found)
    expect(components.panelist).toBeCloseTo(22.858444, 5)
    expect(components['panelist:unit']).toBeCloseTo(13.909457, 5)
    expect(components.residual).toBeCloseTo(0.92463, 6)
    expect(model.remlCriterion).toBeCloseTo(215.687568, 6)
    expect(model.boundary).toEqual([])
    expect(model.unitTest).toMatchObject({ df1: 2 })
    if (isCannot(model.unitTest)) throw new Error('expected a test')
    expect(model.unitTest.f).toBeCloseTo(20.576083, 6)
    expect(model.unitTest.df2).toBeCloseTo(10, 8)
    expect(model.unitTest.p).toBeCloseTo(0.000286, 6)
    const [a, b, c] = ['A', 'B', 'C'].map((unit) => found.units[unit]!)
    expect(a!.adjustedMean).toBeCloseTo(52.355556, 6)
    expect(b!.adjustedMean).toBeCloseTo(60.322222, 6)
    expect(c!.adjustedMean).toBeCloseTo(66.272222, 6)
    expect(a!.standardError).toBeCloseTo(2.48583, 5)
    expect(a!.df).toBeCloseTo(8.52, 2)
    expect(pairs.map((pair) => Number(pair.pTukey.toFixed(4)))).toEqual([0.0111, 0.0002, 0.0507])
    expect(pairs[0]!.standardError).toBeCloseTo(2.176975, 6)
    // q(.95; 3, 10)/√2·SE/2 each side of the mean: bars of A and B part, those of B and C just touch.
    const bar = b!.comparisonBar as number
    expect(Number(a!.adjustedMean) + bar).toBeLessThan(Number(b!.adjustedMean) - bar)
    expect(Number(b!.adjustedMean) + bar).toBeGreaterThan(Number(c!.adjustedMean) - bar)
  })

  it('Machines, unbalanced (Pinheiro & Bates: ten rows deleted)', () => {
    const gone = new Set([2, 3, 6, 8, 9, 12, 19, 20, 27, 33])
    const found = one(byMachine.filter((_, i) => !gone.has(i + 1)))
    const { model, pairs, components } = modelOf(found)
    expect(components.panelist).toBeCloseTo(22.455775, 4)
    expect(components['panelist:unit']).toBeCloseTo(14.234009, 4)
    expect(components.residual).toBeCloseTo(0.870868, 5)
    expect(['A', 'B', 'C'].map((unit) => Number(found.units[unit]!.adjustedMean).toFixed(4))).toEqual([
      '52.3540',
      '60.3164',
      '66.2722',
    ])
    expect(['A', 'B', 'C'].map((unit) => Number(found.units[unit]!.standardError).toFixed(5))).toEqual([
      '2.49067',
      '2.48745',
      '2.48261',
    ])
    expect(['A', 'B', 'C'].map((unit) => Number(found.units[unit]!.df).toFixed(2))).toEqual([
      '8.71',
      '8.67',
      '8.60',
    ])
    if (isCannot(model.unitTest)) throw new Error('expected a test')
    expect(model.unitTest.f).toBeCloseTo(19.964, 3)
    expect(model.unitTest.df2).toBeCloseTo(9.998, 3)
    expect(pairs[0]!.difference).toBeCloseTo(-7.962445, 6)
    expect(pairs[0]!.standardError).toBeCloseTo(2.214828, 5)
    expect(pairs[0]!.df).toBeCloseTo(10.08, 2)
  })

  it('Machines, repeats of A only and one cell missing', () => {
    const found = one(
      machines.filter(
        ([worker, machine, replicate]) =>
          (replicate === 1 || (replicate === 2 && machine === 'A')) && !(worker === '6' && machine === 'C'),
      ),
    )
    expect(found.counts).toMatchObject({ ratings: 23, missingCells: 1 })
    const { model, pairs, components } = modelOf(found)
    expect(components.panelist).toBeCloseTo(34.377227, 3)
    expect(components['panelist:unit']).toBeCloseTo(11.444508, 4)
    expect(components.residual).toBeCloseTo(0.542136, 5)
    expect(model.remlCriterion).toBeCloseTo(108.088157, 5)
    const rows: [string, number, number, number][] = [
      ['A', 52.241667, 2.771666, 6.94],
      ['B', 60.35, 2.779804, 7.02],
      ['C', 65.223006, 2.885958, 7.86],
    ]
    for (const [unit, mean, error, df] of rows) {
      expect(found.units[unit]!.adjustedMean).toBeCloseTo(mean, 5)
      expect(found.units[unit]!.standardError).toBeCloseTo(error, 5)
      expect(found.units[unit]!.df).toBeCloseTo(df, 2)
    }
    expect(
      pairs.map((pair) => [pair.standardError.toFixed(6), pair.df.toFixed(2), pair.pTukey.toFixed(4)]),
    ).toEqual([
      ['1.987554', '8.94', '0.0071'],
      ['2.133497', '9.07', '0.0005'],
      ['2.144059', '9.25', '0.1102'],
    ])
  })

  it('Montgomery’s catalysts, a balanced incomplete design whose raw means turn two units round (data from memory)', () => {
    const found = one([
      ['b1', '1', 1, null, 73],
      ['b2', '1', 1, null, 74],
      ['b4', '1', 1, null, 71],
      ['b2', '2', 1, null, 75],
      ['b3', '2', 1, null, 67],
      ['b4', '2', 1, null, 72],
      ['b1', '3', 1, null, 73],
      ['b2', '3', 1, null, 75],
      ['b3', '3', 1, null, 68],
      ['b1', '4', 1, null, 75],
      ['b3', '4', 1, null, 72],
      ['b4', '4', 1, null, 75],
    ])
    const { model, pairs, components } = modelOf(found)
    expect(components.panelist).toBeCloseTo(8.016667, 5)
    expect(components.residual).toBeCloseTo(0.65, 6)
    expect(components['panelist:unit']).toEqual({ ok: false, reason: 'no-repeats' })
    expect(model.remlCriterion).toBeCloseTo(34.220464, 6)
    expect(found.units['1']!.adjustedMean).toBeCloseTo(71.413115, 6)
    expect(found.units['2']!.adjustedMean).toBeCloseTo(71.616393, 6)
    expect(Number(found.units['1']!.mean)).toBeGreaterThan(Number(found.units['2']!.mean))
    expect(found.units['4']!.adjustedMean).toBeCloseTo(74.970492, 6)
    expect(found.units['1']!.standardError).toBeCloseTo(1.497273, 6)
    expect(found.units['1']!.df).toBeCloseTo(3.51, 2)
    if (isCannot(model.unitTest)) throw new Error('expected a test')
    expect(model.unitTest.f).toBeCloseTo(11.3294, 5)
    expect(model.unitTest.df2).toBeCloseTo(5.032966, 5)
    expect(model.unitTest.p).toBeCloseTo(0.011238, 6)
    const pair = pairs.find(({ a, b }) => a === '1' && b === '4')!
    expect(pair.difference).toBeCloseTo(-3.557377, 6)
    expect(pair.standardError).toBeCloseTo(0.699508, 6)
    expect(pair.pTukey).toBeCloseTo(0.0139, 4)
  })

  it('keeps a component that is estimated at zero (constructed; R): six df, not eighteen', () => {
    const scores = [
      [50, 62, 55, 70, 66, 80],
      [41, 53, 50, 60, 62, 71],
      [60, 49, 70, 58, 77, 66],
      [38, 50, 47, 59, 54, 67],
    ]
    const found = one(
      scores.flatMap((row, j) =>
        row.map((score, i): Row => [`L${j}`, 'ABC'[Math.floor(i / 2)]!, (i % 2) + 1, null, score]),
      ),
    )
    const { model, pairs, components } = modelOf(found)
    expect(model.boundary).toEqual(['panelist:unit'])
    expect(components['panelist:unit']).toBe(0)
    expect(components.panelist).toBeCloseTo(22.63503, 4)
    expect(components.residual).toBeCloseTo(49.00926, 4)
    expect(model.remlCriterion).toBeCloseTo(151.5480475, 6)
    expect(found.units['B']!.adjustedMean).toBeCloseTo(58.625, 8)
    expect(found.units['B']!.standardError).toBeCloseTo(3.432917, 5)
    expect(found.units['B']!.df).toBeCloseTo(6.16, 2)
    if (isCannot(model.unitTest)) throw new Error('expected a test')
    expect(model.unitTest.f).toBeCloseTo(12.511241, 5)
    expect(model.unitTest.df2).toBeCloseTo(6, 6)
    expect(model.unitTest.p).toBeCloseTo(0.007235, 6)
    expect(pairs[0]!.standardError).toBeCloseTo(3.500331, 5)
    expect(pairs[0]!.df).toBeCloseTo(6, 6)
  })
})

describe('the all-random model', () => {
  const fit = (rows: readonly Row[]) => {
    const names = (at: 0 | 1): string[] => [...new Set(rows.map((row) => row[at]))]
    const panelists = names(0)
    const units = names(1)
    const table = cellTable(
      scoresFrom(rows.map((row) => [panelists.indexOf(row[0]), units.indexOf(row[1]), row[4]] as const)),
    )
    const found = fitAllRandom(table)
    if (isCannot(found)) throw new Error(found.reason)
    return found
  }
  it('Penicillin: exact by mean squares, plate .716908, sample 3.730918, residual .302415', () => {
    const found = fit(rowsOf('penicillin.csv'))
    expect(found.panelist).toBeCloseTo(0.716908, 6)
    expect(found.unit).toBeCloseTo(3.730918, 6)
    expect(found.residual).toBeCloseTo(0.302415, 6)
    expect(found.mean).toBeCloseTo(22.972222, 6)
    expect(found.remlCriterion).toBeCloseTo(330.860589, 5)
  })
})

interface Case {
  readonly name: string
  readonly position: boolean
  readonly rows: readonly Row[]
  readonly components: { panelist: number; interaction: number | null; residual: number }
  readonly criterion: number
  readonly means: { unit: string; mean: number; se: number; df: number; low: number; high: number }[]
  readonly pairs: { a: string; b: string; difference: number; se: number; df: number; p: number }[]
  readonly test: { f: number; df1: number; df2: number; p: number }
  readonly random: { unit: number; panelist: number; interaction: number | null; residual: number }
}
const { cases } = JSON.parse(fixture('mixed-models.json')) as { cases: Case[] }
const near = (value: unknown, expected: number, relative: number, floor = 0): void => {
  expect(typeof value).toBe('number')
  expect(Math.abs((value as number) - expected)).toBeLessThanOrEqual(
    Math.max(relative * Math.abs(expected), floor),
  )
}

describe('the model on invented panels, against lme4, pbkrtest and emmeans (mixed-models.R)', () => {
  for (const { name, rows, position, ...expected } of cases) {
    it(name, () => {
      const found = one(rows, position)
      const { model, pairs, components } = modelOf(found)
      near(components.panelist, expected.components.panelist, 1e-5, 1e-5)
      near(components.residual, expected.components.residual, 1e-5)
      if (expected.components.interaction !== null) {
        near(components['panelist:unit'], expected.components.interaction, 1e-5, 1e-5)
      }
      near(model.remlCriterion, expected.criterion, 1e-9)
      for (const { unit, mean, se, df, low, high } of expected.means) {
        const ours = found.units[unit]!
        near(ours.adjustedMean, mean, 1e-8)
        near(ours.standardError, se, 1e-6)
        near(ours.df, df, 1e-6)
        near(ours.low, low, 1e-6)
        near(ours.high, high, 1e-6)
      }
      for (const { a, b, difference, se, df, p } of expected.pairs) {
        const ours = pairs.find((pair) => pair.a === a && pair.b === b)!
        near(ours.difference, difference, 0, 1e-6)
        near(ours.standardError, se, 1e-6)
        near(ours.df, df, 1e-6)
        near(ours.pTukey, p, 0, 1e-5)
      }
      if (isCannot(model.unitTest)) throw new Error('expected a test')
      near(model.unitTest.f, expected.test.f, 1e-6)
      near(model.unitTest.df2, expected.test.df2, 1e-6)
      near(model.unitTest.p, expected.test.p, 0, 1e-7)
      const agreement = found.agreement.iccFromModel
      if (isCannot(agreement)) throw new Error('expected agreement')
      near(agreement.varianceComponents.unit, expected.random.unit, 1e-5, 1e-5)
      if (!position) near(agreement.varianceComponents.panelist, expected.random.panelist, 1e-5, 1e-5)
    })
  }
})
