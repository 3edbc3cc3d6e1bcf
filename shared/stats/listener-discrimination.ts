import { cannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { fUpperTail } from './fisher-f.ts'
import { mean, sumOfSquares, varies } from './moments.ts'

/** Under this many error df no F of a single descriptor is shown or used. */
export const FEWEST_ERROR_DF = 6

export interface Discrimination {
  /** Mean square between units over mean square between repeats. */
  readonly f: number | Cannot
  readonly p: number | Cannot
  readonly df1: number
  readonly df2: number
  /** Mean square between repeats of a unit, in points². */
  readonly repeatability: number | Cannot
}

/**
 * How well one listener tells units apart on one descriptor, and how closely he repeats himself: one-way analysis of
 * his own scores by unit, with partial repeats as they are.
 *
 * Needs a unit scored twice. A listener who gives one rating throughout has repeatability 0 and no F. A large p is no
 * ground to leave anyone out: with two of six units back most sound listeners have one.
 *
 * Source: ITU-R BS.1534-3 and ISO 11132 use the same F. Cost: linear.
 *
 * @param byUnit the listener's scores of each unit he scored
 * @param fewestErrorDf smallest error df for which F is given
 * @example
 * discrimination([[20, 24], [35, 31], [50, 54], [62, 66], [80, 78]]).repeatability // => 6.8
 */
export function discrimination(byUnit: readonly (readonly number[])[], fewestErrorDf = 1): Discrimination {
  const rated = byUnit.filter((scores) => scores.length > 0)
  const all = rated.flat()
  const df1 = Math.max(0, rated.length - 1)
  const df2 = all.length - rated.length
  const refuse = (reason: Cannot, repeatability: number | Cannot): Discrimination => ({
    f: reason,
    p: reason,
    df1,
    df2,
    repeatability,
  })
  if (all.length === 0) return refuse(cannot('no-ratings'), cannot('no-ratings'))
  if (df2 === 0) return refuse(cannot('no-repeats'), cannot('no-repeats'))
  if (!varies(all)) return refuse(cannot('constant-listener'), 0)
  const within = rated.reduce((total, scores) => total + sumOfSquares(scores), 0)
  const repeatability = within / df2
  if (rated.length < 2) return refuse(cannot('fewer-than-two-units'), repeatability)
  if (df2 < fewestErrorDf) return refuse(cannot('too-few-repeats'), repeatability)
  if (within === 0) return refuse(cannot('no-variation-left'), 0)
  const grand = mean(all)
  const between = rated.reduce((total, scores) => total + scores.length * (mean(scores) - grand) ** 2, 0)
  const f = between / df1 / repeatability
  return { f, p: fUpperTail(f, df1, df2), df1, df2, repeatability }
}
