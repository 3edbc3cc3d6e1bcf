import type { Balance, TurnRow } from './types.ts'

export function range(count: number): number[] {
  return Array.from({ length: count }, (_, i) => i)
}

export function grid(rows: number, columns: number): number[][] {
  return Array.from({ length: rows }, () => new Array<number>(columns).fill(0))
}

/** `[unit][place in the order, from 0]` → how many of the orders have the unit there. */
export function positionCounts(orders: readonly (readonly number[])[], units: number): number[][] {
  const counts = grid(units, units)
  for (const order of orders) order.forEach((unit, place) => (counts[unit]![place]! += 1))
  return counts
}

/** `[unit][next unit]` → how many of the orders have the second right after the first. */
export function followerCounts(orders: readonly (readonly number[])[], units: number): number[][] {
  const counts = grid(units, units)
  for (const order of orders) {
    for (let i = 1; i < order.length; i += 1) counts[order[i - 1]!]![order[i]!]! += 1
  }
  return counts
}

/** Largest less smallest count; pairs of a unit with itself are left out of follower counts. */
export function spread(counts: readonly (readonly number[])[], withoutDiagonal: boolean): number {
  const cells = counts.flatMap((row, i) => row.filter((_, j) => !(withoutDiagonal && i === j)))
  return Math.max(...cells) - Math.min(...cells)
}

export function balanceOf(rows: readonly TurnRow[], units: number): Balance {
  const orders = rows.map((row) => row.places.map((place) => place.unit))
  const positions = positionCounts(orders, units)
  const followers = followerCounts(orders, units)
  const rests = rows.flatMap(({ places }) => places.slice(1).map((p, i) => p.turn - places[i]!.turn - 1))
  return {
    positionsWithinOne: spread(positions, false) <= 1,
    positionCounts: positions,
    followerCounts: followers,
    followerSpread: spread(followers, true),
    longestRest: Math.max(...rests),
  }
}
