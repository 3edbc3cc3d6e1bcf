import { describe, expect, test } from 'vitest'
import { range } from './balance.ts'
import { createStream } from './stream.ts'
import { drawTurns, turnsNeeded } from './turns.ts'
import type { TurnPlan } from './types.ts'

const draw = (units: number, listeners: number, spares = 2, label = 'evening') =>
  drawTurns({ units, listeners, spares, stream: createStream('3e'.repeat(32), label) })

/** Every listener and spare hears each unit once, in ascending turns, and no turn has a unit twice. */
function expectSound(plan: TurnPlan, units: number): void {
  const taken = new Set<string>()
  for (const { places } of [...plan.rows, ...plan.spareRows]) {
    expect(places.map((place) => place.unit).sort((a, b) => a - b)).toEqual(range(units))
    expect(places.map((place) => place.position)).toEqual(range(units).map((i) => i + 1))
    places.forEach((place, i) => expect(place.turn).toBeGreaterThan(places[i - 1]?.turn ?? 0))
    for (const { turn, unit } of places) taken.add(`${turn} ${unit}`)
  }
  expect(taken.size).toBe((plan.rows.length + plan.spareRows.length) * units)
}

/** Counted here anew, not read from the plan's own balance. */
function countedSpread(
  plan: TurnPlan,
  units: number,
  keyOf: (row: number[], i: number) => string | null,
): number {
  const counts = new Map<string, number>()
  for (const { places } of plan.rows) {
    const order = places.map((place) => place.unit)
    order.forEach((_, i) => {
      const key = keyOf(order, i)
      if (key !== null) counts.set(key, (counts.get(key) ?? 0) + 1)
    })
  }
  const values = [...counts.values()]
  const cells = keyOf([0], 0) === null ? units * (units - 1) : units * units
  return Math.max(...values) - (values.length < cells ? 0 : Math.min(...values))
}

const positions = (order: number[], i: number) => `${order[i]} at ${i}`
const followers = (order: number[], i: number) => (i === 0 ? null : `${order[i - 1]} then ${order[i]}`)

describe('an evening in turns', () => {
  test.each(range(11).map((i) => i + 2))(
    'is free of clashes and even for %i units and 2 to 40 listeners',
    (n) => {
      for (let listeners = 2; listeners <= 40; listeners += 1) {
        const plan = draw(n, listeners)
        expectSound(plan, n)
        expect(plan.rows).toHaveLength(listeners)
        expect(plan.spareRows).toHaveLength(2)
        expect(plan.turns).toBe(turnsNeeded(n, listeners))
        const last = plan.rows.flatMap((row) => row.places.map((place) => place.turn))
        expect(Math.max(...last)).toBeLessThanOrEqual(plan.turns)
        expect(plan.balance.positionsWithinOne, `${listeners} listeners`).toBe(true)
        expect(countedSpread(plan, n, positions)).toBeLessThanOrEqual(1)
        expect(plan.balance.followerSpread).toBe(countedSpread(plan, n, followers))
        const allowed = n === 6 ? 3 : n % 2 === 0 ? 1 : 2
        expect(plan.balance.followerSpread, `${listeners} listeners`).toBeLessThanOrEqual(allowed)
        if (n % 2 === 0 && listeners % n === 0) expect(plan.balance.followerSpread).toBe(0)
        if (n % 2 === 0 && listeners < n) expect(plan.balance.followerSpread).toBe(1)
      }
    },
    240_000,
  )

  test('takes as many turns as there are people or units, whichever are more, and one more for n + 1 people', () => {
    for (const n of [2, 3, 4, 5, 6]) {
      for (let listeners = 1; listeners <= 40; listeners += 1) {
        const more = n > 2 && listeners === n + 1 ? 1 : 0
        expect(turnsNeeded(n, listeners)).toBe(Math.max(n, listeners) + more)
      }
    }
    expect(turnsNeeded(8, 9)).toBe(16)
  })

  test('gives spare people rows in step where the evening has room, and turns after the last where it has none', () => {
    const room = draw(6, 4, 3)
    expectSound(room, 6)
    const ends = room.spareRows.map((row) => row.places[5]!.turn)
    expect(ends).toEqual([6, 6, 12])
    const full = draw(4, 8, 6)
    expectSound(full, 4)
    for (const row of full.spareRows) expect(row.places[0]!.turn).toBeGreaterThan(8)
    expect(draw(4, 4, 0).spareRows).toEqual([])
  })

  test('seats a single listener, and refuses numbers that no evening has', () => {
    expect(draw(3, 1).rows).toHaveLength(1)
    for (const [units, listeners, spares] of [
      [1, 4, 2],
      [13, 4, 2],
      [4, 0, 2],
      [4, 41, 2],
      [4, 4, -1],
      [4, 4.5, 2],
    ] as const) {
      expect(() => draw(units, listeners, spares)).toThrow(RangeError)
    }
  })

  test('is the same again from the same stream and another from another', () => {
    expect(draw(4, 6)).toEqual(draw(4, 6))
    expect(new Set(range(12).map((i) => JSON.stringify(draw(4, 6, 2, `other ${i}`)))).size).toBe(12)
  })
})

/** All plans of n + 1 listeners in n + 1 turns (listener l rests in turn l) with positions within one. */
function plansWithOneRest(n: number): number[][][] {
  const plans: number[][][] = []
  const rows = range(n + 1).map(() => new Array<number>(n).fill(-1))
  const inTurn = range(n + 1).map(() => new Set<number>())
  const atPosition = range(n).map(() => new Array<number>(n).fill(0))
  const fill = (listener: number, position: number): void => {
    if (position === n) return fill(listener + 1, 0)
    if (listener > n) {
      if (atPosition.every((counts) => Math.min(...counts) >= 1)) plans.push(rows.map((row) => [...row]))
      return
    }
    const turn = position < listener ? position : position + 1
    for (let unit = 0; unit < n; unit += 1) {
      if (listener === 0 && unit !== position) continue // names of units do not matter
      if (rows[listener]!.slice(0, position).includes(unit) || inTurn[turn]!.has(unit)) continue
      if (atPosition[position]![unit]! >= 2) continue
      rows[listener]![position] = unit
      inTurn[turn]!.add(unit)
      atPosition[position]![unit]! += 1
      fill(listener, position + 1)
      inTurn[turn]!.delete(unit)
      atPosition[position]![unit]! -= 1
    }
    rows[listener]![position] = -1
  }
  fill(0, 0)
  return plans
}

test.each([2, 3, 4, 5])('%i units and one listener more, without a turn more, leave one plan only', (n) => {
  const rotations = range(n + 1).map((by) => range(n).map((i) => (i - by + 2 * n) % n))
  expect(plansWithOneRest(n)).toEqual([rotations])
})
