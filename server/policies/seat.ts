import { isRevealed, type RoundRole, type RoundStatus } from '#shared/domain/round-status.ts'

/** Roles that may not meet in one browser of a round: whoever knows what a code hides neither listens nor stewards. */
const apart: Partial<Record<RoundRole, readonly RoundRole[]>> = {
  keeper: ['panelist', 'steward', 'letters', 'codes'],
  letters: ['codes', 'keeper'],
  codes: ['letters', 'keeper'],
  steward: ['keeper'],
  panelist: ['keeper'],
}

/** Whether a link for `role` may be opened where `held` are held already. In a single-blind round the keeper stewards. */
export function mayOpenLink(role: RoundRole, held: readonly RoundRole[], blinding: string): boolean {
  const barred = apart[role] ?? []
  return held.every(
    (one) =>
      !barred.includes(one) || (blinding === 'single' && [role, one].sort().join() === 'keeper,steward'),
  )
}

export interface SeatFacts {
  status: RoundStatus
  consented: boolean
  left: boolean
  /** This browser also holds the keeper's duty in the round, by link or by signing in. */
  knowsKey: boolean
}

export const mayRate = (facts: SeatFacts): boolean =>
  facts.status === 'open' && facts.consented && !facts.left && !facts.knowsKey
export const maySeeOwnReport = (facts: Pick<SeatFacts, 'status'>): boolean => isRevealed(facts.status)
