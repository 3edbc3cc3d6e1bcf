import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import type { Descriptor } from '#shared/contracts/scorecard.ts'
import type { HeardRow, HeardScale } from '../charts/geometry/heard-line.ts'
import type { ThreadUnit } from '../charts/geometry/threads.ts'
import { fromTheTop, standing } from './by-family.ts'

type UnitResult = DescriptorResult['units'][number]

/** A descriptor's own scale with its end words, as the pictures take it. */
export const heardScale = ({ scale, sided, words }: Descriptor): HeardScale => ({
  low: scale.low,
  high: scale.high,
  sided,
  lowWord: words.low,
  ...(words.middle === null ? {} : { midWord: words.middle }),
  highWord: words.high,
})

/** Rows of a heard line, the highest unit first. A unit that nobody rated keeps its row, without a picture. */
export const heardRows = (result: DescriptorResult): HeardRow[] =>
  fromTheTop(result.units).map((unit) => ({
    name: unit.unit,
    scores: unit.scores.map((score) => score.value),
    q1: unit.q1 ?? 0,
    median: unit.median ?? 0,
    q3: unit.q3 ?? 0,
    ...(unit.adjusted === null
      ? {}
      : { adjusted: { mean: unit.adjusted.mean, low: unit.adjusted.low, high: unit.adjusted.high } }),
    ...(unit.adjusted === null || unit.adjusted.comparisonHalf === null
      ? {}
      : { comparisonHalf: unit.adjusted.comparisonHalf }),
    n: unit.scores.length,
    cantTell: unit.cantTell,
  }))

const meanOf = (values: readonly number[]): number | null =>
  values.length === 0 ? null : values.reduce((sum, value) => sum + value, 0) / values.length

/** Everybody who rated anything on this descriptor, numbers in the order of numbers. */
export const listenersOf = (result: DescriptorResult): string[] =>
  [...new Set(result.units.flatMap((unit) => unit.scores.map((score) => score.listener)))].sort(
    (one, other) => one.localeCompare(other, 'en', { numeric: true }),
  )

/** Units as threads run through them; where a listener heard a unit twice, the thread takes the mean of the two. */
export const threadUnits = (result: DescriptorResult, listeners: readonly string[]): ThreadUnit[] =>
  result.units.flatMap((unit: UnitResult) => {
    const mean = standing(unit)
    if (mean === null) return []
    const scores = listeners.map((listener) =>
      meanOf(unit.scores.filter((score) => score.listener === listener).map((score) => score.value)),
    )
    return { name: unit.unit, mean, scores }
  })
