import { range } from './balance.ts'
import type { Stream } from './stream.ts'

/** `square[row][column]`: each symbol 0…order−1 once in every row and once in every column. */
export type LatinSquare = readonly (readonly number[])[]

/**
 * A Latin square by random matchings, row after row: an unfinished Latin rectangle can always be carried on (Hall's
 * theorem), so no row fails. Not uniform over all squares, but free of the cycles of an addition table, which
 * leave exchanges nowhere to go when the order is prime.
 */
export function randomSquare(order: number, stream: Stream): number[][] {
  const left = range(order).map(() => new Set(range(order)))
  return range(order).map(() => {
    const columnOf = new Array<number>(order).fill(-1)
    const place = (column: number, seen: Set<number>): boolean => {
      for (const symbol of stream.shuffle([...left[column]!])) {
        if (seen.has(symbol)) continue
        seen.add(symbol)
        if (columnOf[symbol]! < 0 || place(columnOf[symbol]!, seen)) {
          columnOf[symbol] = column
          return true
        }
      }
      return false
    }
    for (const column of stream.shuffle(range(order))) place(column, new Set())
    const row = new Array<number>(order).fill(-1)
    columnOf.forEach((column, symbol) => {
      row[column] = symbol
      left[column]!.delete(symbol)
    })
    return row
  })
}
