/**
 * Holm's step-down adjustment: p-values that hold their level over a whole family of tests.
 *
 * Use over a scorecard's descriptors; start from the unadjusted p. Assumes nothing about dependence. Cost: one sort.
 * Source: Holm 1979, Scand. J. Statist. 6:65.
 *
 * @param p values in [0, 1], any order
 * @returns adjusted values, in the same order
 * @throws RangeError when a value is not a probability
 * @example
 * holm([0.005, 0.011, 0.02, 0.03, 0.04]) // => [0.025, 0.044, 0.06, 0.06, 0.06]
 */
export function holm(p: readonly number[]): number[] {
  if (p.some((value) => !(value >= 0 && value <= 1))) throw new RangeError('holm: not a probability')
  const order = p.map((_, i) => i).sort((i, j) => p[i]! - p[j]!)
  const adjusted = new Array<number>(p.length).fill(0)
  let highest = 0
  order.forEach((at, step) => {
    highest = Math.max(highest, Math.min(1, (p.length - step) * p[at]!))
    adjusted[at] = highest
  })
  return adjusted
}
