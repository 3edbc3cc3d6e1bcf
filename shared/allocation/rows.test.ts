import { describe, expect, test } from 'vitest'
import { followerCounts, positionCounts, range, spread } from './balance.ts'
import { drawRows } from './rows.ts'
import { createStream } from './stream.ts'

const units = range(11).map((i) => i + 2)
const draw = (n: number, listeners: number, label = 'rows') =>
  drawRows({ units: n, listeners, stream: createStream('a7'.repeat(32), `${label} ${n} ${listeners}`) })

describe('complete orders', () => {
  test.each(units)('are even for %i units and 2 to 40 listeners', (n) => {
    for (let listeners = 2; listeners <= 40; listeners += 1) {
      const { rows } = draw(n, listeners)
      expect(rows).toHaveLength(listeners)
      for (const row of rows) expect([...row].sort((a, b) => a - b)).toEqual(range(n))
      expect(spread(positionCounts(rows, n), false), `positions, ${listeners}`).toBeLessThanOrEqual(1)
      const exactAt = n % 2 === 0 ? n : 2 * n
      const allowed = listeners % exactAt === 0 ? 0 : n % 2 === 0 ? 1 : 2
      expect(spread(followerCounts(rows, n), true), `followers, ${listeners}`).toBeLessThanOrEqual(allowed)
    }
  })

  test.each(units)('never need one of %i units twice at a position of a table', (n) => {
    for (let listeners = 2; listeners <= 40; listeners += 1) {
      const { rows, tables, unused } = draw(n, listeners)
      const last = tables[tables.length - 1]!
      for (let table = 0; table <= last; table += 1) {
        const at = rows.filter((_, i) => tables[i] === table).concat(table === last ? unused : [])
        expect(at).toHaveLength(n)
        expect(
          positionCounts(at, n)
            .flat()
            .every((count) => count === 1),
        ).toBe(true)
      }
    }
  })

  test('say nothing by themselves: units and rows come in another order with another stream', () => {
    const orders = new Set(range(30).map((i) => JSON.stringify(draw(5, 5, `stream ${i}`).rows)))
    expect(orders.size).toBe(30)
    const first = new Set(range(60).map((i) => draw(4, 4, `first ${i}`).rows[0]![0]))
    expect(first.size).toBe(4)
  })

  test('refuse a round without listeners', () => {
    expect(() => draw(4, 0)).toThrow(RangeError)
  })
})
