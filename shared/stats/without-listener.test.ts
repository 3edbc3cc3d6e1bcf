import { describe, expect, it } from 'vitest'
import { isCannot } from './cannot.ts'
import { cellTable, scoresFrom } from './cell-table.ts'
import { fitMixedModel } from './mixed-model/fit.ts'
import type { MixedFit } from './mixed-model/fit.ts'
import { seededRandom } from './random.ts'
import { meansWithoutListener } from './without-listener.ts'

type Row = readonly [listener: number, unit: number, score: number]

const panel = (listeners: number, servings: number): Row[] => {
  const random = seededRandom(`${listeners} ${servings}`)
  const noise = (): number => random() + random() + random() - 1.5
  return Array.from({ length: listeners }, (_, listener) => {
    const level = 16 * noise()
    return Array.from({ length: 6 }, (_, unit) => {
      const own = 8 * noise()
      return random() < 0.3
        ? []
        : Array.from({ length: servings }, (): Row => [
            listener,
            unit,
            Math.round(50 + 6 * unit + level + own + 14 * noise()),
          ])
    }).flat()
  }).flat()
}
const fitOf = (rows: readonly Row[]): MixedFit => {
  const found = fitMixedModel(cellTable(scoresFrom(rows)))
  if (isCannot(found)) throw new Error(found.reason)
  return found
}
const refitWithout = (rows: readonly Row[], gone: number): number[] => {
  const rest = rows
    .filter(([listener]) => listener !== gone)
    .map(([listener, unit, score]) => [listener > gone ? listener - 1 : listener, unit, score] as const)
  const { data, kenwardRoger } = fitOf(rest)
  return [...data.centre].map((centre, unit) => centre + data.scale * kenwardRoger.effects[unit]!)
}

describe('the panel without one listener', () => {
  it.each([
    [12, 1, 1e-6],
    [12, 2, 1e-6],
    [45, 1, 2e-3],
    [45, 2, 2e-3],
  ])('of %s, %s servings: as a model fitted from the start', (listeners, servings, tolerance) => {
    const rows = panel(listeners, servings)
    const table = cellTable(scoresFrom(rows))
    const without = meansWithoutListener(table, fitOf(rows), false)
    for (let gone = 0; gone < listeners; gone += 4) {
      const expected = refitWithout(rows, gone)
      without(gone).forEach((mean, unit) => {
        expect(Math.abs(mean! - expected[unit]!)).toBeLessThan(tolerance)
      })
    }
  })
  it('in a complete table is the plain mean of the others', () => {
    const rows: Row[] = [
      [0, 0, 10],
      [0, 1, 20],
      [1, 0, 30],
      [1, 1, 60],
      [2, 0, 50],
      [2, 1, 40],
    ]
    const without = meansWithoutListener(cellTable(scoresFrom(rows)), null, true)
    expect(without(0)).toEqual([40, 50])
    expect(without(2)).toEqual([20, 40])
  })
})
