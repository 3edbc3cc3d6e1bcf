export const roundStatuses = ['draft', 'open', 'closed', 'published', 'cancelled'] as const
export type RoundStatus = (typeof roundStatuses)[number]

const next: Record<RoundStatus, readonly RoundStatus[]> = {
  draft: ['open', 'cancelled'],
  open: ['closed', 'cancelled'],
  closed: ['published'],
  published: [],
  cancelled: [],
}

/** Whether a round in status `from` may step to status `to`. */
export const mayFollow = (from: RoundStatus, to: RoundStatus): boolean => next[from].includes(to)

/** From opening to closing the blind holds: nobody but the keeper may learn what a code hides. */
export const isMasked = (status: RoundStatus): boolean => status === 'open'

/** Ratings may be seen in sum once the round is closed, and never in a cancelled round. */
export const isRevealed = (status: RoundStatus): boolean => status === 'closed' || status === 'published'

export const blindings = ['double', 'single', 'split', 'imported'] as const
export type Blinding = (typeof blindings)[number]

export const roundRoles = ['organiser', 'keeper', 'letters', 'codes', 'steward', 'panelist'] as const
/** `letters` and `codes` are the two halves of a split key: units into lettered pouches, codes over the letters. */
export type RoundRole = (typeof roundRoles)[number]

export const servingStates = [
  'waiting',
  'tagged',
  'handed',
  'confirmed',
  'submitted',
  'void',
  'missed',
] as const
export type ServingState = (typeof servingStates)[number]
