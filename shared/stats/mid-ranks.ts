/**
 * Ranks from 1, ties sharing the mean of their places, and Σ(t³ − t) over groups of ties.
 *
 * @param values numbers, any order
 * @example
 * midRanks([10, 20, 20, 30]) // => { ranks: [1, 2.5, 2.5, 4], ties: 6 }
 */
export function midRanks(values: readonly number[]): { ranks: number[]; ties: number } {
  const order = values.map((_, i) => i).sort((i, j) => (values[i] ?? 0) - (values[j] ?? 0))
  const ranks = new Array<number>(values.length).fill(0)
  let ties = 0
  for (let start = 0; start < order.length;) {
    let end = start
    while (end + 1 < order.length && values[order[end + 1] ?? 0] === values[order[start] ?? 0]) end++
    for (let i = start; i <= end; i++) ranks[order[i] ?? 0] = (start + end) / 2 + 1
    const size = end - start + 1
    ties += size ** 3 - size
    start = end + 1
  }
  return { ranks, ties }
}

/**
 * Twelve significant digits: means of repeats that are equal on paper stay equal before they are ranked.
 *
 * @example
 * rounded((0.1 + 0.2) / 3) // => 0.1
 */
export const rounded = (value: number): number =>
  Number.isInteger(value * 64) ? value : Number(value.toPrecision(12))
