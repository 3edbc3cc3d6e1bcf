import { isCannot, sentenceFor } from './result.ts'
import type { Cannot } from './result.ts'

export const agreementBands = ['hardly', 'a little', 'fairly', 'well', 'as one'] as const
export type AgreementBand = (typeof agreementBands)[number]

/**
 * The word for one value of the one-serving ICC: below .25 hardly, to .5 a little, to .75 fairly, to .9 well, above as
 * one. Our bands, after Koo & Li 2016. A verdict uses the interval, never one value alone: see `agreementWords`.
 *
 * @example
 * bandOf(0.62) // => 'fairly'
 */
export function bandOf(icc: number): AgreementBand {
  if (icc < 0.25) return 'hardly'
  if (icc <= 0.5) return 'a little'
  if (icc <= 0.75) return 'fairly'
  return icc <= 0.9 ? 'well' : 'as one'
}

type Figure = number | Cannot

export interface AgreementInput {
  /** The one-serving ICC (absolute agreement) and its interval. */
  readonly single: Figure
  readonly low: Figure
  readonly high: Figure
  readonly units: number
  readonly listeners: number
}

export interface AgreementWords {
  /** The bands that the interval touches, lowest first; none where nothing can be said. */
  readonly bands: readonly AgreementBand[]
  readonly cannotSay: boolean
  /** Whether the interval holds 0. */
  readonly maybeChance: boolean
  /** Without a full stop. */
  readonly sentence: string
}

/**
 * How far listeners agree, in words, from the interval: within one band its word, two "between … and …", three or more
 * "this panel cannot say". Where the interval holds 0, chance is named.
 *
 * @example
 * agreementWords({ single: 0.6, low: 0.3, high: 0.7, units: 6, listeners: 14 }).sentence
 * // => 'Listeners agree between a little and fairly'
 */
export function agreementWords({ single, low, high, units, listeners }: AgreementInput): AgreementWords {
  if (isCannot(single)) return unsaid(`This panel cannot say: ${lowerFirst(sentenceFor(single.reason))}`)
  if (isCannot(low) || isCannot(high)) return unsaid(`This panel cannot say: ${only(units, listeners)}`)
  const from = agreementBands.indexOf(bandOf(low))
  const to = agreementBands.indexOf(bandOf(high))
  const bands = agreementBands.slice(from, to + 1)
  const maybeChance = low <= 0 && high >= 0
  const chance = maybeChance ? '; no better than chance is not ruled out' : ''
  const cannotSay = bands.length > 2
  const [first = 'hardly', second] = bands
  const words = cannotSay
    ? `This panel cannot say: ${only(units, listeners)}`
    : second
      ? `Listeners agree between ${first} and ${second}`
      : first === 'hardly'
        ? 'Listeners hardly agree'
        : `Listeners agree ${first}`
  return { bands, cannotSay, maybeChance, sentence: words + chance }
}

const unsaid = (sentence: string): AgreementWords => ({
  bands: [],
  cannotSay: true,
  maybeChance: false,
  sentence: sentence.replace(/\.$/, ''),
})

const lowerFirst = (text: string): string => text.slice(0, 1).toLowerCase() + text.slice(1)

/** What makes the interval wide: units, unless there are many of them. */
const only = (units: number, listeners: number): string =>
  units <= 12 || listeners > 12 ? `only ${counted(units, 'unit')}` : `only ${counted(listeners, 'listener')}`

const SMALL = 'no one two three four five six seven eight nine ten eleven twelve'.split(' ')

const counted = (count: number, noun: string): string =>
  `${SMALL[count] ?? String(count)} ${noun}${count === 1 ? '' : 's'}`

/** At or above this the panel's mean counts as steady (the lower end of "good" in Koo & Li 2016). */
export const STEADY_FROM = 0.75

/**
 * Whether the panel's mean is steady, from the average-measure ICC and its interval. It rises with panel size alone, so
 * it never stands without the sentence on agreement.
 *
 * @example
 * steadinessSentence({ average: 0.93, low: 0.8, high: 0.99 })
 * // => 'The panel’s mean is steady: other listeners like these would put the units much the same'
 */
export function steadinessSentence({
  average,
  low,
  high,
}: Record<'average' | 'low' | 'high', Figure>): string {
  if (isCannot(average)) return 'Whether the panel’s mean is steady cannot be said'
  if (!isCannot(low) && low >= STEADY_FROM) {
    return 'The panel’s mean is steady: other listeners like these would put the units much the same'
  }
  if (!isCannot(high) && high < STEADY_FROM) {
    return 'The panel’s mean is not steady: other listeners like these could put the units elsewhere'
  }
  return 'The panel’s mean may or may not be steady: the interval is too wide to say'
}
