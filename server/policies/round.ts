import {
  isMasked,
  isRevealed,
  mayFollow,
  type RoundRole,
  type RoundStatus,
} from '#shared/domain/round-status.ts'

/** What a rule about a round may look at: its state and what the actor holds in it. */
export interface RoundFacts {
  status: RoundStatus
  origin: 'live' | 'imported'
  blinding: 'double' | 'single' | 'split' | 'imported'
  roles: readonly RoundRole[]
}

const holds = (facts: RoundFacts, ...roles: RoundRole[]): boolean =>
  roles.some((role) => facts.roles.includes(role))

/** From opening to closing whoever stewards or listens gets that role's view, even the organiser. */
export const isBlinded = (facts: RoundFacts): boolean =>
  isMasked(facts.status) && holds(facts, 'steward', 'panelist')

/** A single-blind keeper is the steward and knows the key: the round says so. */
const keeps = (facts: RoundFacts): boolean => holds(facts, 'keeper')

/** Roles that one browser may not use together, however it came by them: whoever knows the key neither listens nor stewards. */
const conflicts = (facts: RoundFacts): boolean =>
  (keeps(facts) && holds(facts, 'panelist', 'letters', 'codes')) ||
  (keeps(facts) && holds(facts, 'steward') && facts.blinding !== 'single') ||
  (holds(facts, 'letters') && holds(facts, 'codes'))

export const maySeeRound = (facts: RoundFacts): boolean => facts.roles.length > 0
export const mayOrganise = (facts: RoundFacts): boolean => holds(facts, 'organiser')
export const maySeeUnits = (facts: RoundFacts): boolean =>
  isRevealed(facts.status) || ((mayOrganise(facts) || keeps(facts)) && (!isBlinded(facts) || keeps(facts)))
export const mayEdit = (facts: RoundFacts): boolean => mayOrganise(facts) && facts.status === 'draft'
export const mayOpen = (facts: RoundFacts): boolean =>
  mayOrganise(facts) && facts.origin === 'live' && facts.status === 'draft'
export const mayCancel = (facts: RoundFacts): boolean =>
  mayOrganise(facts) && mayFollow(facts.status, 'cancelled')
export const mayClose = (facts: RoundFacts): boolean => mayOrganise(facts) && facts.status === 'open'
export const mayDraftAgain = (facts: RoundFacts): boolean =>
  mayOrganise(facts) && facts.status === 'cancelled'
export const maySeeProgress = (facts: RoundFacts): boolean =>
  holds(facts, 'organiser', 'keeper', 'letters', 'codes', 'steward')
export const mayHandOutLinks = (facts: RoundFacts): boolean =>
  facts.status === 'open' && holds(facts, 'organiser', 'steward')
export const maySteward = (facts: RoundFacts): boolean =>
  facts.status === 'open' && holds(facts, 'steward') && !conflicts(facts)
/** The key's whole is for the keeper; each half of a split key for one person. */
export const mayTag = (facts: RoundFacts): boolean =>
  facts.status === 'open' && holds(facts, 'keeper', 'letters', 'codes') && !conflicts(facts)
/** Nobody sees a rating in sum before closing (B2), and nobody ever in a cancelled round. */
export const maySeeAgreement = (facts: RoundFacts): boolean => isRevealed(facts.status) && mayOrganise(facts)
export const maySeeReveal = (facts: RoundFacts): boolean => isRevealed(facts.status) && facts.roles.length > 0
export const mayPublish = (facts: RoundFacts): boolean => isRevealed(facts.status) && mayOrganise(facts)
/** Names of listeners beside their ratings: for the organiser, after closing. */
export const maySeeListenerNames = maySeeAgreement
