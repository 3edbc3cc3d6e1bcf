import type { KendallW } from './analysis-types.ts'
import { cannot } from './cannot.ts'
import { shuffle } from './random.ts'

const MOST_ARRANGEMENTS = 2e6

/**
 * Chance, if every listener's order were random, of rank sums at least as far apart as these.
 *
 * All arrangements are counted where there are at most 2e6 of them (the first listener's order may stay: only orders
 * relative to it matter; equal sorted rank sums are counted together). Otherwise seeded draws, (1 + c)/(1 + B): never
 * zero (Phipson & Smyth 2010).
 *
 * @param ranks listeners × units, mid-ranks
 * @param draws 0: said to be switched off
 */
export function exactRankTail(
  ranks: readonly (readonly number[])[],
  draws: number,
  random?: () => number,
): Pick<KendallW, 'pExact' | 'exactMethod'> {
  if (draws <= 0) return { pExact: cannot('draws-switched-off') }
  const doubled = ranks.map((row) => row.map((rank) => Math.round(2 * rank)))
  const observed = squares(
    doubled[0]!.map((_, unit) => doubled.reduce((total, row) => total + row[unit]!, 0)),
  )
  let arrangements = 1
  for (const row of doubled.slice(1)) {
    arrangements *= orders(row)
    if (arrangements > MOST_ARRANGEMENTS) {
      if (!random) return { pExact: cannot('draws-switched-off') }
      return { pExact: drawn(doubled, observed, draws, random), exactMethod: 'monte-carlo' }
    }
  }
  return { pExact: enumerated(doubled, observed), exactMethod: 'enumeration' }
}

const squares = (sums: ArrayLike<number>): number => {
  let total = 0
  for (let i = 0; i < sums.length; i++) total += sums[i]! * sums[i]!
  return total
}

/** Different orders of a row with ties. */
function orders(row: readonly number[]): number {
  const seen = new Map<number, number>()
  let count = 1
  row.forEach((rank, i) => {
    const times = (seen.get(rank) ?? 0) + 1
    seen.set(rank, times)
    count = (count * (i + 1)) / times
  })
  return Math.round(count)
}

/** Adds one listener at a time to the distribution of sorted rank sums. */
function enumerated(rows: readonly number[][], observed: number): number {
  let states = new Map<string, { sums: number[]; chance: number }>()
  const first = [...rows[0]!].sort((a, b) => a - b)
  states.set(first.join(), { sums: first, chance: 1 })
  for (const row of rows.slice(1)) {
    const each = 1 / orders(row)
    const next = new Map<string, { sums: number[]; chance: number }>()
    for (const { sums, chance } of states.values()) {
      forEachOrder(row, (order) => {
        const added = sums.map((sum, i) => sum + order[i]!).sort((a, b) => a - b)
        const key = added.join()
        const known = next.get(key)
        if (known) known.chance += chance * each
        else next.set(key, { sums: added, chance: chance * each })
      })
    }
    states = next
  }
  let tail = 0
  for (const { sums, chance } of states.values()) if (squares(sums) >= observed) tail += chance
  return Math.min(1, tail)
}

/** Every different order of a row, in lexicographic order; the array is reused. */
function forEachOrder(row: readonly number[], visit: (order: readonly number[]) => void): void {
  const order = [...row].sort((a, b) => a - b)
  for (;;) {
    visit(order)
    let i = order.length - 2
    while (i >= 0 && order[i]! >= order[i + 1]!) i--
    if (i < 0) return
    let j = order.length - 1
    while (order[j]! <= order[i]!) j--
    swap(order, i, j)
    for (let a = i + 1, b = order.length - 1; a < b; a++, b--) swap(order, a, b)
  }
}

function swap(items: number[], i: number, j: number): void {
  const kept = items[i]!
  items[i] = items[j]!
  items[j] = kept
}

function drawn(rows: readonly number[][], observed: number, draws: number, random: () => number): number {
  const n = rows[0]!.length
  const working = rows.map((row) => Float64Array.from(row))
  const sums = new Float64Array(n)
  let atLeast = 0
  for (let draw = 0; draw < draws; draw++) {
    sums.fill(0)
    for (const row of working) {
      shuffle(row, random)
      for (let i = 0; i < n; i++) sums[i]! += row[i]!
    }
    if (squares(sums) >= observed) atLeast++
  }
  return (1 + atLeast) / (1 + draws)
}
