import { followerCounts, range, spread } from './balance.ts'
import type { Stream } from './stream.ts'
import { half } from './williams.ts'

/**
 * Complete orders of n units for any number of listeners; `tables[i]` is the table (0-based) of row i; `unused` are
 * the rows that nobody has at the last table.
 */
export type Rows = { rows: number[][]; tables: number[]; unused: number[][] }

const TRIES = 60

/**
 * Up to n rows out of one half of a Williams pair, so that the table can listen in step, chosen among random
 * choices for the most even followers together with the rows `beside` it. Unused rows are returned too.
 */
function drawTable(input: {
  block: readonly (readonly number[])[]
  seats: number
  beside: readonly (readonly number[])[]
  stream: Stream
}): { rows: number[][]; unused: number[][] } {
  const { block, seats, beside, stream } = input
  let best = stream.shuffle(block)
  if (seats < block.length && block.length % 2 === 1) {
    const unevenness = (rows: readonly (readonly number[])[]) =>
      spread(followerCounts([...beside, ...rows.slice(0, seats)], block.length), true)
    let least = unevenness(best)
    for (let i = 0; i < TRIES && least > 1; i += 1) {
      const other = stream.shuffle(block)
      const value = unevenness(other)
      if (value < least) [best, least] = [other, value]
    }
  }
  const rows = best.map((row) => [...row])
  return { rows: rows.slice(0, seats), unused: rows.slice(seats) }
}

/** A half square with its units renamed. */
function renamed(n: number, direction: 'forward' | 'reversed', names: readonly number[]): number[][] {
  return half(n, direction).map((row) => row.map((unit) => names[unit]!))
}

/**
 * Rows for any number of listeners, in tables of at most n: positions within one; who follows whom within one for
 * even n and two for odd n, exact at multiples of n (2n). No table needs a unit twice at one position.
 * Units and rows are renamed and shuffled by the stream.
 */
export function drawRows(input: { units: number; listeners: number; stream: Stream }): Rows {
  const { units, listeners, stream } = input
  if (!Number.isInteger(listeners) || listeners < 1) throw new RangeError('at least one listener')
  const rows: number[][] = []
  const tables: number[] = []
  let names = range(units)
  let reversed = false
  let beside: number[][] = []
  let unused: number[][] = []
  for (let table = 0; rows.length < listeners; table += 1) {
    const opensPair = units % 2 === 0 || table % 2 === 0
    if (opensPair) {
      names = stream.shuffle(range(units))
      reversed = units % 2 === 1 && stream.integer(2) === 1
      beside = []
    } else {
      reversed = !reversed
    }
    const block = renamed(units, reversed ? 'reversed' : 'forward', names)
    const seats = Math.min(units, listeners - rows.length)
    const drawn = drawTable({ block, seats, beside, stream })
    beside = drawn.rows
    unused = drawn.unused
    rows.push(...drawn.rows)
    tables.push(...drawn.rows.map(() => table))
  }
  return { rows, tables, unused }
}
