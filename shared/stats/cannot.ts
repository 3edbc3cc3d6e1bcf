/** Why a figure cannot be said. `shared/domain/result.ts` holds the sentence for each. */
export const REASONS = [
  'no-ratings',
  'no-variation',
  'no-variation-left',
  'fewer-than-two-listeners',
  'fewer-than-two-complete-listeners',
  'fewer-than-three-listeners',
  'fewer-than-two-units',
  'fewer-than-three-units',
  'fewer-than-four-units',
  'fewer-than-two-scores',
  'no-pair-of-scores',
  'no-repeats',
  'too-few-repeats',
  'constant-listener',
  'others-do-not-differ',
  'no-ratings-by-this-listener',
  'not-a-balanced-design',
  'not-a-rank-design',
  'not-connected',
  'not-estimable',
  'all-constant',
  'draws-switched-off',
  'too-few-draws',
  'not-a-ratio-scale',
  'did-not-converge',
] as const

export type Reason = (typeof REASONS)[number]

/** Data too thin is not an error: the figure is missing and says why. */
export interface Cannot {
  readonly ok: false
  readonly reason: Reason
}

/**
 * A figure that cannot be said.
 *
 * @example
 * cannot('no-ratings') // => { ok: false, reason: 'no-ratings' }
 */
export const cannot = (reason: Reason): Cannot => ({ ok: false, reason })

/**
 * True where a figure, or a group of figures, could not be said.
 *
 * @example
 * isCannot(cannot('no-ratings')) // => true
 */
export const isCannot = (value: unknown): value is Cannot =>
  typeof value === 'object' && value !== null && (value as { ok?: unknown }).ok === false
