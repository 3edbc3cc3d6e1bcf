import { followerCounts } from './balance.ts'
import type { LatinSquare } from './latin.ts'
import type { Stream } from './stream.ts'

/** Least sum of squares of `cells` counts with this total: reached only when all lie within one. */
function leastSquares(total: number, cells: number): number {
  const low = Math.floor(total / cells)
  const above = total % cells
  return (cells - above) * low ** 2 + above * (low + 1) ** 2
}

const POSITION_WEIGHT = 6
const WAIT_WEIGHT = 2
const WARMEST = 6

/**
 * A square read as an evening: rows are people, columns turns, symbols below `units` are units and the others rests.
 * Costs are 0 when even; the rows from `listeners` on are spare and do not count.
 */
class Exchange {
  positionCost: number
  followerCost: number
  waitCost = 0
  private readonly order: number
  private readonly patience: number
  /** [row][column] → symbol; [row][symbol] → column; [column][symbol] → row. */
  private readonly symbols: Int16Array
  private readonly columns: Int16Array
  private readonly holders: Int16Array
  private readonly positions: Int16Array
  private readonly followers: Int16Array

  private readonly units: number
  private readonly listeners: number

  constructor(start: LatinSquare, units: number, listeners: number, beside: readonly (readonly number[])[]) {
    this.units = units
    this.listeners = listeners
    const order = start.length
    this.order = order
    this.patience = 2 * Math.ceil(order / units)
    this.symbols = Int16Array.from(start.flat())
    this.columns = new Int16Array(order * order)
    this.holders = new Int16Array(order * order)
    this.positions = new Int16Array(units * units)
    this.followers = Int16Array.from(followerCounts(beside, units).flat())
    this.positionCost = -leastSquares(listeners * units, units * units)
    this.followerCost = -leastSquares((listeners + beside.length) * (units - 1), units * (units - 1))
    for (const count of this.followers) this.followerCost += count * count
    this.symbols.forEach((symbol, cell) => {
      const row = Math.floor(cell / order)
      const column = cell % order
      this.columns[row * order + symbol] = column
      this.holders[column * order + symbol] = row
    })
    for (let row = 0; row < order; row += 1) this.count(row, 1)
  }

  get cost(): number {
    return POSITION_WEIGHT * this.positionCost + this.followerCost + WAIT_WEIGHT * this.waitCost
  }

  get square(): number[][] {
    return Array.from({ length: this.order }, (_, row) =>
      Array.from(this.symbols.subarray(row * this.order, (row + 1) * this.order)),
    )
  }

  /**
   * Exchanges two symbols in the row and in every row that must follow so that no column has one twice: where one
   * has `a`, the next has `b` in the same column, until the chain closes. Doing it again undoes it.
   */
  exchange(first: number, a: number, b: number): void {
    const { order, symbols, columns, holders } = this
    let row = first
    do {
      this.count(row, -1)
      const columnA = columns[row * order + a]!
      const columnB = columns[row * order + b]!
      const next = holders[columnA * order + b]!
      symbols[row * order + columnA] = b
      symbols[row * order + columnB] = a
      columns[row * order + a] = columnB
      columns[row * order + b] = columnA
      holders[columnB * order + a] = row
      holders[columnA * order + b] = row
      this.count(row, 1)
      row = next
    } while (row !== first)
  }

  private count(row: number, step: 1 | -1): void {
    if (row >= this.listeners) return
    const { order, units, symbols, positions, followers } = this
    let place = 0
    let before = -1
    let last = -1
    for (let column = 0; column < order; column += 1) {
      const unit = symbols[row * order + column]!
      if (unit >= units) continue
      this.waitCost += step * Math.max(0, column - last - this.patience)
      const at = unit * units + place
      this.positionCost += 2 * step * positions[at]! + 1
      positions[at]! += step
      if (before >= 0) {
        const pair = before * units + unit
        this.followerCost += 2 * step * followers[pair]! + 1
        followers[pair]! += step
      }
      place += 1
      before = unit
      last = column
    }
  }
}

export type Found = { square: LatinSquare; followerCost: number; waitCost: number }

/**
 * Seeks, by a bounded number of exchanges, a square whose first `listeners` rows have positions within one, followers
 * as even as possible (together with the complete orders `beside`) and no long waits. Threshold accepting on whole numbers, so that every machine takes the same
 * path from the same stream. Returns the best square with positions within one, or null when none was met.
 */
export function evenOut(input: {
  start: LatinSquare
  units: number
  listeners: number
  beside: readonly (readonly number[])[]
  steps: number
  stream: Stream
}): Found | null {
  const { start, units, listeners, beside, steps, stream } = input
  const state = new Exchange(start, units, listeners, beside)
  const order = start.length
  let best: Found | null = null
  for (let i = 0; i < steps; i += 1) {
    const threshold = Math.floor((WARMEST * (steps - i)) / steps)
    const choice = stream.integer(order * units * (order - 1))
    const row = choice % order
    const a = Math.floor(choice / order) % units
    const b = (a + 1 + Math.floor(choice / (order * units))) % order
    const before = state.cost
    state.exchange(row, a, b)
    if (state.cost - before > threshold) {
      state.exchange(row, a, b)
    } else if (state.positionCost === 0) {
      const { followerCost, waitCost } = state
      const better = followerCost - (best?.followerCost ?? Infinity)
      if (better < 0 || (better === 0 && waitCost < best!.waitCost)) {
        best = { square: state.square, followerCost, waitCost }
        if (followerCost === 0 && waitCost === 0) return best
      }
    }
  }
  return best
}
