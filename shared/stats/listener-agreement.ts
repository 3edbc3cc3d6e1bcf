import { cannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { correlation, mean, sum, varies } from './moments.ts'

export interface ListenerAgreement {
  /** Correlation of his unit means with those of the others. */
  readonly agreement: number | Cannot
  /** Slope of his means on theirs: 1 the same spread, below 1 narrower. */
  readonly slope: number | Cannot
  /** Points that he rates above (+) or below (−) the others, over his own units. */
  readonly bias: number | Cannot
}

/**
 * One listener against the panel without him: including him would flatter, badly in a small panel.
 *
 * In a complete table "the others" are the plain means of their cell means; in an incomplete one the adjusted means of
 * the model refitted without him. No rule of exclusion may rest on any of the three. Cost: linear in units.
 *
 * @param own his cell means
 * @param others the others' figures for the same units
 * @param fewestUnits units needed for correlation and slope
 * @throws RangeError when the lengths differ
 * @example
 * listenerAgreement([22, 33, 52, 64, 79], [46.3, 51.3, 52.5, 52.5, 51.1], 3).bias // => -0.74
 */
export function listenerAgreement(
  own: readonly number[],
  others: readonly number[],
  fewestUnits: number,
): ListenerAgreement {
  if (own.length !== others.length) throw new RangeError('listenerAgreement: unequal lists')
  if (own.length === 0) {
    const none = cannot('no-ratings-by-this-listener')
    return { agreement: none, slope: none, bias: none }
  }
  const bias = mean(own) - mean(others)
  const few = own.length < fewestUnits ? tooFew(fewestUnits) : null
  const constant = !varies(own)
  if (!varies(others)) {
    const flat = few ?? cannot('others-do-not-differ')
    return { agreement: constant ? cannot('constant-listener') : flat, slope: constant ? 0 : flat, bias }
  }
  if (constant) return { agreement: cannot('constant-listener'), slope: 0, bias }
  if (few) return { agreement: few, slope: few, bias }
  const centre = mean(others)
  const cross = sum(others.map((value, i) => (value - centre) * own[i]!))
  const squares = sum(others.map((value) => (value - centre) ** 2))
  return {
    agreement: correlation(own, others) ?? cannot('constant-listener'),
    slope: cross / squares,
    bias,
  }
}

const tooFew = (fewest: number): Cannot =>
  cannot(fewest > 3 ? 'fewer-than-four-units' : 'fewer-than-three-units')
