import { turnsNeeded } from '#shared/allocation/turns.ts'
import type { Round } from '#shared/contracts/rounds.ts'
import { eveningMinutes, minutesPerTurn, timing } from '#shared/domain/timing.ts'
import { counted, sentenceCase, spokenMinutes } from '#src/lib/counts.ts'

/** What an evening of this size comes to; minutes as `timing` has them. */
export function eveningSize(units: number, listeners: number, descriptors: number) {
  const turns = turnsNeeded(units, listeners)
  return { turns, each: minutesPerTurn(descriptors + 1), ...eveningMinutes(turns, descriptors + 1) }
}

/** "Four units, six listeners: six turns of 7 minutes, about an hour with one break." */
export function eveningSentence(units: number, listeners: number, descriptors: number): string {
  const { turns, each, breaks, total } = eveningSize(units, listeners, descriptors)
  const pause = breaks === 0 ? '' : ` with ${counted(breaks / timing.breakMinutes, 'break')}`
  const size = `${counted(units, 'unit')}, ${counted(listeners, 'listener')}`
  return `${sentenceCase(size)}: ${counted(turns, 'turn')} of about ${each} minutes, ${spokenMinutes(total)}${pause}.`
}

/** Why there is a turn more than anyone would expect; null where there is not. */
export const extraTurnWords = (units: number, listeners: number): string | null =>
  units <= 6 && listeners === units + 1 && turnsNeeded(units, listeners) > listeners
    ? 'One turn more than listeners: with exactly one listener more than units, whoever knew who rests when could otherwise tell which codes are one unit.'
    : null

/** What so few listeners may say in public; null where nothing special holds. */
export function panelSizeWords(listeners: number): string | null {
  if (listeners < 5)
    return 'Fewer than five listeners: the result is informal, for those who took part, and no figures are published.'
  if (listeners < 6)
    return 'Fewer than six listeners: the result is informal, shown to those who took part, without a verdict sentence.'
  return null
}

export const levelWords: Record<Round['levelMatching'], string> = {
  measured: 'matched by measurement',
  'by-ear': 'matched by ear',
  'not-matched': 'not matched',
}

export const blindingSentence: Record<Round['blinding'], string> = {
  double: 'A code keeper tags the pouches and neither listens nor stewards: double-blind.',
  single: 'One person tags the pouches and stewards: single-blind, and the verdict says so.',
  split: 'A split key: one person sees units and letters, another letters and codes; the verdict says so.',
  imported: 'Ratings brought from elsewhere: Scrim cannot vouch for the blind.',
}

/** Each rating line once, "overall liking and five lines". */
export const scorecardWords = (descriptors: number): string =>
  `overall liking and ${counted(descriptors, 'line')}`
