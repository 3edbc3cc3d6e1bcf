/**
 * Median and hinges: the middle of the scores and the middle of each half, the median counted in both halves when
 * n is odd (Tukey 1977; the quartiles of ITU-R BS.1534-3). "The middle half" lies between the hinges.
 *
 * Use for every set of scores; robust to single far scores. Cost: one sort.
 *
 * @param values at least one number, any order
 * @returns q1, median and q3 in the unit of the values
 * @throws RangeError on an empty list
 * @example
 * hinges([12, 35, 41, 44, 47, 50, 53, 58, 97]) // => { q1: 41, median: 47, q3: 53 }
 */
export function hinges(values: readonly number[]): { q1: number; median: number; q3: number } {
  if (values.length === 0) throw new RangeError('hinges of nothing')
  const sorted = Float64Array.from(values).sort()
  const half = Math.ceil(sorted.length / 2)
  return {
    q1: middle(sorted.subarray(0, half)),
    median: middle(sorted),
    q3: middle(sorted.subarray(sorted.length - half)),
  }
}

/**
 * The middle value, or the mean of the two middle ones.
 *
 * @param values at least one number, any order
 * @throws RangeError on an empty list
 * @example
 * median([3, 1, 4, 2]) // => 2.5
 */
export const median = (values: readonly number[]): number => hinges(values).median

function middle(sorted: Float64Array): number {
  const at = (sorted.length - 1) / 2
  return ((sorted[Math.floor(at)] ?? 0) + (sorted[Math.ceil(at)] ?? 0)) / 2
}
