/** Criterion and its slope in variance ratios γ ≥ 0; null where the data cannot carry them. */
export interface Criterion {
  readonly value: number
  /** ∂ value / ∂ γ. */
  readonly slope: readonly number[]
}

export type CriterionOf = (ratios: readonly number[]) => Criterion | null

/** Roots of ratios from which the search begins. */
const GRID = [0.2, 0.6, 1.8]
const TOLERANCE = 1e-7

/**
 * Smallest value of a REML criterion over variance ratios γ ≥ 0.
 *
 * The search runs in θ = √γ, in which the criterion is smooth and even, so that a component at zero is an ordinary
 * minimum: Newton's method on the exact slope, its second derivatives by central differences, steps halved until the
 * criterion falls, from the best point of a coarse grid. A ratio that ends at zero is exactly zero.
 *
 * @returns null where the criterion is nowhere defined or the search does not settle
 */
export function searchRatios(
  criterion: CriterionOf,
  dimensions: number,
  start?: readonly number[],
): number[] | null {
  const inTheta = inRoots(criterion)
  const first = start
    ? start.map((ratio) => Math.sqrt(Math.max(ratio, 1e-4)))
    : bestOfGrid(inTheta, dimensions)
  const theta = first && newton(inTheta, first)
  if (!theta) return null
  return settleAtZero(
    criterion,
    theta.map((value) => value * value),
  )
}

/** The same criterion as a function of θ = √γ. */
export const inRoots =
  (criterion: CriterionOf): CriterionOf =>
  (theta) => {
    const found = criterion(theta.map((value) => value * value))
    return found && { value: found.value, slope: found.slope.map((s, i) => 2 * theta[i]! * s) }
  }

function bestOfGrid(criterion: CriterionOf, dimensions: number): number[] | null {
  let best: number[] | null = null
  let lowest = Infinity
  for (let code = 0; code < GRID.length ** dimensions; code++) {
    const theta = Array.from(
      { length: dimensions },
      (_, i) => GRID[Math.floor(code / GRID.length ** i) % GRID.length]!,
    )
    const found = criterion(theta)
    if (found && found.value < lowest) {
      lowest = found.value
      best = theta
    }
  }
  return best
}

function newton(criterion: CriterionOf, start: number[]): number[] | null {
  let theta = start
  let here = criterion(theta)
  if (!here) return null
  for (let round = 0; round < 100; round++) {
    const steepness = steepest(here, theta)
    if (steepness < TOLERANCE) return theta
    const step = newtonStep(criterion, theta, here)
    const noise = 1e-12 * Math.max(1, Math.abs(here.value))
    let accepted = false
    for (let length = 1; !accepted && length > 1e-9; length /= 2) {
      const tried = theta.map((value, i) => value - length * step[i]!)
      const there = criterion(tried)
      if (!there) continue
      const lower = there.value < here.value - noise
      if (!lower && !(there.value <= here.value + noise && steepest(there, tried) < steepness)) continue
      theta = tried
      here = there
      accepted = true
    }
    if (!accepted) break
  }
  return steepest(here, theta) < 1e-3 ? theta : null
}

const steepest = (at: Criterion, theta: readonly number[]): number =>
  Math.max(...at.slope.map((s, i) => Math.abs(s) * Math.max(1, Math.abs(theta[i]!))))

/** H⁻¹g with H made positive by flooring its pivots (at most three dimensions). */
function newtonStep(criterion: CriterionOf, theta: number[], here: Criterion): number[] {
  return downhill(curvature(criterion, theta), here.slope)
}

/** Second derivatives by central differences of the slope. */
export function curvature(criterion: CriterionOf, theta: readonly number[]): number[][] {
  const hessian = theta.map((value, i) => {
    const width = 1e-4 * Math.max(1, Math.abs(value))
    const shifted = (by: number): readonly number[] | undefined =>
      criterion(theta.map((other, j) => (i === j ? other + by : other)))?.slope
    const up = shifted(width)
    const down = shifted(-width)
    return theta.map((_, j) => (up && down ? (up[j]! - down[j]!) / (2 * width) : i === j ? 1 : 0))
  })
  return hessian.map((row, i) => row.map((value, j) => (value + hessian[j]![i]!) / 2))
}

/** Step H⁻¹g, with as much added to H's diagonal as makes it point downhill. */
export function downhill(hessian: readonly (readonly number[])[], slope: readonly number[]): number[] {
  for (let ridge = 0, tries = 0; tries < 60; tries++) {
    const step = solvePositive(hessian, ridge, slope)
    if (step) return step
    ridge = ridge === 0 ? 1e-3 * Math.max(1e-6, ...hessian.map((row, i) => Math.abs(row[i]!))) : ridge * 4
  }
  return [...slope]
}

function solvePositive(
  hessian: readonly (readonly number[])[],
  ridge: number,
  slope: readonly number[],
): number[] | null {
  const size = slope.length
  const a = hessian.map((row, i) => [...row.map((value, j) => value + (i === j ? ridge : 0)), slope[i]!])
  for (let i = 0; i < size; i++) {
    if (!(a[i]![i]! > 1e-12)) return null
    for (let j = i + 1; j < size; j++) {
      const factor = a[j]![i]! / a[i]![i]!
      for (let k = i; k <= size; k++) a[j]![k]! -= factor * a[i]![k]!
    }
  }
  const step = new Array<number>(size).fill(0)
  for (let i = size - 1; i >= 0; i--) {
    let total = a[i]![size]!
    for (let k = i + 1; k < size; k++) total -= a[i]![k]! * step[k]!
    step[i] = total / a[i]![i]!
  }
  return step
}

/** Ratios that are small and do no better than zero become zero. */
function settleAtZero(criterion: CriterionOf, ratios: number[]): number[] {
  let settled = ratios
  ratios.forEach((ratio, i) => {
    if (ratio > 1e-3) return
    const without = settled.map((value, j) => (i === j ? 0 : value))
    const there = criterion(without)
    const here = criterion(settled)
    if (there && here && there.value <= here.value + 1e-9) settled = without
  })
  return settled
}
