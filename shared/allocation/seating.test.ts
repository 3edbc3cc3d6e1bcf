import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { range } from './balance.ts'
import { codesMet, drawSeating, meetsAny } from './seating.ts'
import { createStream } from './stream.ts'
import type { DrawRow } from './types.ts'

/** A row of one unit whose codes are its number (served), + 100 (taken over) and + 200 (reserve). */
const row = (number: number): DrawRow => ({
  listener: number,
  takeoverListener: number + 10,
  spare: false,
  places: [
    {
      turn: 1,
      position: 1,
      unit: 'a',
      codes: { served: number, takeover: number + 100, reserve: number + 200 },
    },
  ],
})

const stream = (label: string) => createStream('d4'.repeat(32), label)

function permutations(items: number[]): number[][] {
  if (items.length === 0) return [[]]
  return items.flatMap((item) =>
    permutations(items.filter((other) => other !== item)).map((rest) => [item, ...rest]),
  )
}

describe('who gets which row', () => {
  test('counts the codes served and those for voids, or those of a takeover', () => {
    expect(codesMet(row(3), 'served')).toEqual([3, 203])
    expect(codesMet(row(3), 'takeover')).toEqual([103, 203])
    expect(meetsAny(row(3), 'served', [103])).toBe(false)
    expect(meetsAny(row(3), 'takeover', [103])).toBe(true)
  })

  test('is a seating without remembered codes exactly when enumeration finds one', () => {
    const memory = fc.array(fc.subarray([0, 1, 2, 3, 4]), { minLength: 5, maxLength: 5 })
    fc.assert(
      fc.property(memory, fc.nat(), (remembered, label) => {
        const rows = range(5).map(row)
        const possible = permutations(range(5)).some((rowOf) =>
          rowOf.every((r, seat) => !remembered[seat]!.includes(r)),
        )
        const seating = drawSeating(
          rows,
          remembered.map((codes) => new Set(codes)),
          stream(`${label}`),
        )
        expect(seating !== null).toBe(possible)
        if (seating === null) return
        expect([...seating].sort()).toEqual(range(5))
        seating.forEach((r, seat) => expect(remembered[seat]).not.toContain(r))
      }),
    )
  })

  test('finds the single seating that is left', () => {
    const rows = range(9).map(row)
    const remembered = range(9).map((seat) => new Set(range(9).filter((r) => r > seat)))
    expect(drawSeating(rows, remembered, stream('single'))).toEqual(range(9))
  })

  test('is drawn, not the order of the seats', () => {
    const counts = new Map<string, number>()
    const shared = stream('fair')
    for (let i = 0; i < 1200; i += 1) {
      const seating = drawSeating(
        range(3).map(row),
        range(3).map(() => new Set<number>()),
        shared,
      )!.join('')
      counts.set(seating, (counts.get(seating) ?? 0) + 1)
    }
    expect(counts.size).toBe(6)
    for (const count of counts.values()) expect(Math.abs(count - 200)).toBeLessThan(65)
  })
})
