import { rangeQuantile, rangeUpperTail } from '../studentized-range.ts'
import { tQuantile } from '../student-t.ts'
import { fUpperTail } from '../fisher-f.ts'
import { cannot } from '../cannot.ts'
import type { PairDifference, UnitTest, Cannot } from '../analysis-types.ts'
import { contrast, unitF } from './contrasts.ts'
import type { MixedFit } from './fit.ts'

export interface AdjustedMean {
  readonly adjustedMean: number
  readonly standardError: number
  readonly df: number
  readonly low: number
  readonly high: number
}

/**
 * Mean of each unit adjusted for who rated it (and for position, all positions counting alike), with its 95 % interval
 * on Kenward–Roger's degrees of freedom: where other listeners like these would put it. In points.
 */
export function adjustedMeans(fit: MixedFit): AdjustedMean[] {
  const { data } = fit
  const extra = data.columns - data.units
  return Array.from({ length: data.units }, (_, unit) => {
    const terms: (readonly [number, number])[] = [[unit, 1]]
    for (let e = 0; e < extra; e++) terms.push([data.units + e, 1 / (extra + 1)])
    const found = contrast(fit.kenwardRoger, terms)
    const adjustedMean = data.centre[unit]! + data.scale * found.estimate
    const standardError = data.scale * found.standardError
    const half = tQuantile(0.05, found.df) * standardError
    return { adjustedMean, standardError, df: found.df, low: adjustedMean - half, high: adjustedMean + half }
  })
}

/**
 * Every pair of units once: difference of adjusted means with simultaneous 95 % Tukey–Kramer limits, difference ±
 * q(.95; t, df)/√2 · SE, and Tukey's p, each on the pair's own degrees of freedom. In points.
 *
 * @param names of the units, in the order of their columns
 */
export function pairDifferences(fit: MixedFit, names: readonly string[]): PairDifference[] {
  const { data } = fit
  const pairs: PairDifference[] = []
  const quantiles = new Map<number, number>()
  const tails = new Map<string, number>()
  for (let a = 0; a < data.units; a++) {
    for (let b = a + 1; b < data.units; b++) {
      const found = contrast(fit.kenwardRoger, [
        [a, 1],
        [b, -1],
      ])
      const df = Number(found.df.toPrecision(10))
      const difference = data.centre[a]! - data.centre[b]! + data.scale * found.estimate
      const standardError = data.scale * found.standardError
      const quantile = quantiles.get(df) ?? rangeQuantile(0.05, data.units, df)
      quantiles.set(df, quantile)
      const half = (quantile / Math.SQRT2) * standardError
      const range = Number(((Math.abs(difference) / standardError) * Math.SQRT2).toPrecision(10))
      const key = `${range} ${df}`
      const pTukey = tails.get(key) ?? rangeUpperTail(range, data.units, df)
      tails.set(key, pTukey)
      const low = difference - half
      pairs.push({
        a: names[a]!,
        b: names[b]!,
        difference,
        standardError,
        df: found.df,
        low,
        high: difference + half,
        pTukey,
      })
    }
  }
  return pairs
}

/**
 * Half-length of each unit's comparison bar: q(.95; t, df)·SE/(2√2) with the largest standard error and the smallest
 * df over the unit's pairs. Two bars that do not touch differ; where they touch, the pair itself decides.
 */
export function comparisonBars(
  pairs: readonly PairDifference[],
  names: readonly string[],
): Map<string, number> {
  const bars = new Map<string, number>()
  for (const name of names) {
    const own = pairs.filter((pair) => pair.a === name || pair.b === name)
    if (own.length === 0) continue
    const error = Math.max(...own.map((pair) => pair.standardError))
    const df = Number(Math.min(...own.map((pair) => pair.df)).toPrecision(10))
    bars.set(name, (rangeQuantile(0.05, names.length, df) * error) / (2 * Math.SQRT2))
  }
  return bars
}

/** Kenward–Roger's scaled F for "all units alike". */
export function unitTest(fit: MixedFit): UnitTest | Cannot {
  const { centre, scale } = fit.data
  const found = unitF(
    fit.kenwardRoger,
    centre.map((mean, unit) => mean / scale + fit.kenwardRoger.effects[unit]!),
  )
  if (!found) return cannot('not-estimable')
  return { ...found, p: fUpperTail(found.f, found.df1, found.df2) }
}
