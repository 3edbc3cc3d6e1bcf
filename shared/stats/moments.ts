/** Sum with Kahan's correction: the order of a long list does not move the last digits. */
export function sum(values: readonly number[]): number {
  let total = 0
  let lost = 0
  for (const value of values) {
    const next = value - lost
    const grown = total + next
    lost = grown - total - next
    total = grown
  }
  return total
}

/**
 * Arithmetic mean.
 *
 * @param values at least one number
 * @throws RangeError on an empty list
 * @example
 * mean([2, 4, 9]) // => 5
 */
export function mean(values: readonly number[]): number {
  if (values.length === 0) throw new RangeError('mean of nothing')
  return sum(values) / values.length
}

/** Sum of squared distances from the mean (two passes, so that a large constant costs no digits). */
export function sumOfSquares(values: readonly number[]): number {
  if (values.length === 0) return 0
  const centre = mean(values)
  return sum(values.map((value) => (value - centre) ** 2))
}

/**
 * Standard deviation with divisor n − 1, in the unit of the values.
 *
 * @param values at least two numbers
 * @throws RangeError on fewer than two
 * @example
 * standardDeviation([2, 4, 9]) // => 3.605551
 */
export function standardDeviation(values: readonly number[]): number {
  if (values.length < 2) throw new RangeError('a standard deviation needs two numbers')
  return Math.sqrt(sumOfSquares(values) / (values.length - 1))
}

/**
 * Pearson's correlation, or null where one side does not vary (compared with its own size, so that rounding noise
 * is not taken for variation).
 *
 * @param a numbers
 * @param b as many numbers, pair by pair
 * @throws RangeError when the lengths differ
 * @example
 * correlation([1, 2, 3], [2, 4, 7]) // => 0.993399
 */
export function correlation(a: readonly number[], b: readonly number[]): number | null {
  if (a.length !== b.length) throw new RangeError('correlation of unequal lists')
  if (a.length < 2 || !varies(a) || !varies(b)) return null
  const ma = mean(a)
  const mb = mean(b)
  const cross = sum(a.map((value, i) => (value - ma) * ((b[i] ?? mb) - mb)))
  return Math.max(-1, Math.min(1, cross / Math.sqrt(sumOfSquares(a) * sumOfSquares(b))))
}

/** Whether numbers differ by more than rounding. */
export function varies(values: readonly number[]): boolean {
  let low = Infinity
  let high = -Infinity
  for (const value of values) {
    if (value < low) low = value
    if (value > high) high = value
  }
  return high - low > 1e-10 * Math.max(Math.abs(low), Math.abs(high))
}
