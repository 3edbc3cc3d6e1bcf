import { REASONS, cannot, isCannot } from '#shared/stats/cannot.ts'
import type { Cannot, Reason } from '#shared/stats/cannot.ts'

export { REASONS, cannot, isCannot }
export type { Cannot, Reason }

/** What a person reads in the place of a figure that cannot be said. */
export const reasonSentences: Record<Reason, string> = {
  'no-ratings': 'Nobody gave a number here.',
  'no-variation': 'Every rating is the same number, so there is nothing to compare.',
  'no-variation-left':
    'Listeners left no difference at all between themselves, so there is nothing to measure it by.',
  'fewer-than-two-listeners': 'It takes at least two listeners.',
  'fewer-than-two-complete-listeners': 'It takes at least two listeners who rated every unit.',
  'fewer-than-three-listeners': 'It takes at least three listeners.',
  'fewer-than-two-units': 'It takes at least two units.',
  'fewer-than-three-units': 'It takes at least three units that this listener and the others rated.',
  'fewer-than-four-units': 'It takes at least four units that this listener and the others rated.',
  'fewer-than-two-scores': 'It takes at least two ratings.',
  'no-pair-of-scores': 'No unit was rated by two listeners.',
  'no-repeats': 'No unit came back a second time.',
  'too-few-repeats': 'Too few units came back to judge one listener on one descriptor.',
  'constant-listener': 'This listener gave the same rating throughout.',
  'others-do-not-differ': 'The other listeners put all these units in the same place.',
  'no-ratings-by-this-listener': 'This listener gave no number here.',
  'not-a-balanced-design':
    'This test is for balanced designs; listeners here did not all rate equally many units that met equally often.',
  'not-a-rank-design': 'There are no ranks to test here.',
  'not-connected': 'Some units share no listeners, not even in a chain, so they cannot be compared.',
  'not-estimable': 'There are too few ratings to work it out.',
  'all-constant': 'Every listener gave the same rating throughout.',
  'draws-switched-off': 'Random draws were switched off for this analysis.',
  'too-few-draws': 'Too few random draws were asked for.',
  'not-a-ratio-scale': 'This measure needs a scale that begins at zero.',
  'did-not-converge': 'The calculation did not settle.',
}

/**
 * The sentence for a reason, as a screen shows it; a reason from elsewhere, such as "not estimable", is shown as it is.
 *
 * @example
 * sentenceFor('no-repeats') // => 'No unit came back a second time.'
 */
export function sentenceFor(reason: string): string {
  const known = (reasonSentences as Record<string, string | undefined>)[reason]
  return known ?? `${reason.slice(0, 1).toUpperCase()}${reason.slice(1).replaceAll('-', ' ')}.`
}
