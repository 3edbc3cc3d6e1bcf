import { describe, expect, it } from 'vitest'
import { oneServing } from '#tests/fixtures/stats/rows.ts'
import { analyse } from './analyse.ts'
import type { Analysis } from './analysis-types.ts'
import { isCannot } from './cannot.ts'
import { cellTable, scoresFrom } from './cell-table.ts'
import { iccFromModel } from './icc-from-model.ts'
import { fitMixedModel } from './mixed-model/fit.ts'
import { seededRandom } from './random.ts'

describe('agreement from the model', () => {
  const agreementOf = (found: Analysis) => {
    const said = found.descriptors['bass']!.agreement.iccFromModel
    if (isCannot(said)) throw new Error(said.reason)
    return said
  }
  it('is ICC(2,1) with its interval on a complete table without repeats', () => {
    const rows = oneServing([
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
    const random = seededRandom('holes')
    const table = Array.from({ length: 12 }, () => {
      const level = 20 * random()
      return Array.from({ length: 5 }, (_, unit) => Math.round(20 + level + 9 * unit + 25 * random()))
    })
    const full = agreementOf(analyse(oneServing(table), { draws: 0 }))
    const holed = agreementOf(
      analyse(oneServing(table.map((row, j) => (j === 0 ? [null, ...row.slice(1)] : row))), { draws: 0 }),
    )
    expect(holed.singleMethod).not.toBe(full.singleMethod)
    expect(Math.abs(Number(holed.singleLow) - Number(full.singleLow))).toBeLessThan(0.06)
    expect(Math.abs(Number(holed.singleHigh) - Number(full.singleHigh))).toBeLessThan(0.06)
  })
})

describe('the interval of single in a simulated panel', () => {
  it(
    'holds the truth in 95 % of 400 incomplete panels, within the binomial 99.9 % band',
    { timeout: 120_000 },
    () => {
      const random = seededRandom('coverage')
      const normal = (): number =>
        Math.sqrt(-2 * Math.log(random() || 1e-9)) * Math.cos(2 * Math.PI * random())
      const truth = 0.3
      let held = 0
      let said = 0
      for (let panel = 0; panel < 400; panel++) {
        const units = Array.from({ length: 6 }, () => normal() * Math.sqrt(truth))
        const rows: [number, number, number][] = []
        for (let listener = 0; listener < 10; listener++) {
          const level = normal() * Math.sqrt(0.3)
          units.forEach((unit, i) => {
            if ((i + listener) % 6 > 3) return
            rows.push([listener, i, unit + level + normal() * Math.sqrt(0.4)])
          })
        }
        const table = cellTable(scoresFrom(rows))
        const found = iccFromModel(table, fitMixedModel(table), null)
        if (isCannot(found) || isCannot(found.singleLow) || isCannot(found.singleHigh)) continue
        said++
        if (found.singleLow <= truth && truth <= found.singleHigh) held++
      }
      expect(said).toBeGreaterThan(390)
      // 3.29 standard errors either way of .95.
      expect(Math.abs(held / said - 0.95)).toBeLessThan(3.29 * Math.sqrt((0.95 * 0.05) / said))
    },
  )
})
