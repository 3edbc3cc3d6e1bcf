import type { IccEstimate, IccForm } from './analysis-types.ts'
import { cannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { fQuantile, fUpperTail } from './fisher-f.ts'

/**
 * Intraclass correlations of Shrout & Fleiss, six forms, with F, p and 95 % intervals, from a complete table.
 *
 * (1,·) listeners nested, (2,·) listeners random and absolute agreement, (3,·) consistency: level shifts between
 * listeners do not count; (·,1) one listener, (·,k) the mean of the panel. Say the form beside the number. On cell means
 * it is the reliability of a listener's mean over his servings. Assumes a two-way layout with normal effects and equal
 * variances. Negative values are kept. Not for tables with holes: take the model's. Cost: one pass.
 *
 * Sources: Shrout & Fleiss 1979, Psychol. Bull. 86:420; McGraw & Wong 1996, Psychol. Methods 1:30 (interval of
 * ICC(2,1) on Satterthwaite's df; average forms by Spearman–Brown of the limits, refused where that has a pole).
 *
 * @param table units × listeners, complete, at least 2 × 2
 * @throws RangeError on a ragged table
 * @example
 * intraclass([[9, 2, 5, 8], [6, 1, 3, 2], [8, 4, 6, 8], [7, 1, 2, 6], [10, 5, 6, 9], [6, 2, 4, 7]])['ICC(2,1)'].estimate
 * // => 0.289764
 */
export function intraclass(table: readonly (readonly number[])[]): Record<IccForm, IccEstimate | Cannot> {
  const n = table.length
  const k = table[0]?.length ?? 0
  if (table.some((row) => row.length !== k))
    throw new RangeError('intraclass: every unit needs every listener')
  if (k < 2) return every(cannot('fewer-than-two-complete-listeners'))
  if (n < 2) return every(cannot('fewer-than-two-units'))
  const squares = meanSquares(table, n, k)
  if (!squares) return every(cannot('no-variation'))
  const { between: r, listeners: c, within: w, error: e } = squares
  const one = oneWay(r, w, n - 1, n * (k - 1), k)
  const three = oneWay(r, e, n - 1, (n - 1) * (k - 1), k)
  const absolute = r + (k - 1) * e + (k * (c - e)) / n
  const averageAbsolute = r + (c - e) / n
  const test = fTest(r, e, n - 1, (n - 1) * (k - 1))
  const two: IccEstimate | Cannot =
    absolute > 0
      ? { estimate: (r - e) / absolute, ...agreementLimits(squares, n, k, (r - e) / absolute), ...test }
      : cannot('not-estimable')
  return {
    'ICC(1,1)': one.single,
    'ICC(2,1)': two,
    'ICC(3,1)': three.single,
    'ICC(1,k)': one.average,
    'ICC(2,k)':
      averageAbsolute > 0 && 'estimate' in two
        ? { estimate: (r - e) / averageAbsolute, ...stepUp(two, k), ...test }
        : cannot('not-estimable'),
    'ICC(3,k)': three.average,
  }
}

interface MeanSquares {
  readonly between: number
  readonly listeners: number
  readonly within: number
  readonly error: number
}

/** Two-way mean squares; null where no two values differ, rounding noise set to zero. */
function meanSquares(table: readonly (readonly number[])[], n: number, k: number): MeanSquares | null {
  const all = table.flat()
  const grand = all.reduce((total, value) => total + value, 0) / all.length
  const unit = table.map((row) => row.reduce((total, value) => total + value - grand, 0) / k)
  const listener = Array.from(
    { length: k },
    (_, j) => table.reduce((total, row) => total + row[j]! - grand, 0) / n,
  )
  const total = all.reduce((sum, value) => sum + (value - grand) ** 2, 0)
  if (!(total > 1e-20 * all.length * Math.max(1e-280, grand * grand))) return null
  let error = 0
  let within = 0
  table.forEach((row, i) =>
    row.forEach((value, j) => {
      error += (value - grand - unit[i]! - listener[j]!) ** 2
      within += (value - grand - unit[i]!) ** 2
    }),
  )
  const clean = (squares: number): number => (squares > 1e-24 * total ? squares : 0)
  return {
    between: clean(k * unit.reduce((sum, value) => sum + value * value, 0)) / (n - 1),
    listeners: clean(n * listener.reduce((sum, value) => sum + value * value, 0)) / (k - 1),
    within: clean(within) / (n * (k - 1)),
    error: clean(error) / ((n - 1) * (k - 1)),
  }
}

type Test = Pick<IccEstimate, 'f' | 'df1' | 'df2' | 'p'>

function fTest(above: number, below: number, df1: number, df2: number): Test {
  if (below === 0) return { f: cannot('no-variation-left'), df1, df2, p: cannot('no-variation-left') }
  return { f: above / below, df1, df2, p: fUpperTail(above / below, df1, df2) }
}

/** Forms whose interval is that of an F ratio: (1,·) with the within, (3,·) with the error mean square. */
function oneWay(
  above: number,
  below: number,
  df1: number,
  df2: number,
  k: number,
): { single: IccEstimate | Cannot; average: IccEstimate | Cannot } {
  const test = fTest(above, below, df1, df2)
  const single = (above - below) / (above + (k - 1) * below)
  if (typeof test.f !== 'number') {
    const bare = { lowReason: 'no-variation-left', highReason: 'no-variation-left', ...test }
    return { single: { estimate: single, ...bare }, average: { estimate: 1, ...bare } }
  }
  const fLow = test.f / fQuantile(0.025, df1, df2)
  const fHigh = test.f * fQuantile(0.025, df2, df1)
  const limits = { low: (fLow - 1) / (fLow + k - 1), high: (fHigh - 1) / (fHigh + k - 1) }
  return {
    single: { estimate: single, ...limits, ...test },
    average:
      above === 0
        ? cannot('not-estimable')
        : { estimate: (above - below) / above, low: 1 - 1 / fLow, high: 1 - 1 / fHigh, ...test },
  }
}

type Limits = Pick<IccEstimate, 'low' | 'high' | 'lowReason' | 'highReason'>

/** Limits of ICC(2,1): Shrout & Fleiss 1979, df v by Satterthwaite. */
function agreementLimits(
  { between, listeners, error }: MeanSquares,
  n: number,
  k: number,
  rho: number,
): Limits {
  if (error === 0) return { lowReason: 'no-variation-left', highReason: 'no-variation-left' }
  const fj = listeners / error
  const part = n * (1 + (k - 1) * rho) - k * rho
  const v =
    ((k - 1) * (n - 1) * (k * rho * fj + part) ** 2) / ((n - 1) * k * k * rho * rho * fj * fj + part * part)
  if (!(v > 0)) return { lowReason: 'not-estimable', highReason: 'not-estimable' }
  const upper = fQuantile(0.025, n - 1, v)
  const lower = fQuantile(0.025, v, n - 1)
  const mixed = k * listeners + (k * n - k - n) * error
  return {
    low: (n * (between - upper * error)) / (upper * mixed + n * between),
    high: (n * (lower * between - error)) / (mixed + n * lower * between),
  }
}

/** Spearman–Brown of the limits; one at or below the pole is left out. */
function stepUp(single: IccEstimate, k: number): Limits {
  const step = (limit: number | undefined): number | undefined =>
    limit === undefined || 1 + (k - 1) * limit <= 0 ? undefined : (k * limit) / (1 + (k - 1) * limit)
  const low = step(single.low)
  const high = step(single.high)
  return {
    ...(low === undefined ? { lowReason: single.lowReason ?? 'not estimable' } : { low }),
    ...(high === undefined ? { highReason: single.highReason ?? 'not estimable' } : { high }),
  }
}

function every(reason: Cannot): Record<IccForm, Cannot> {
  return {
    'ICC(1,1)': reason,
    'ICC(2,1)': reason,
    'ICC(3,1)': reason,
    'ICC(1,k)': reason,
    'ICC(2,k)': reason,
    'ICC(3,k)': reason,
  }
}
