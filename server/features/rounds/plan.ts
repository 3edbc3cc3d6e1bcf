import { eveningDraft, type EveningDraft } from '#shared/contracts/evening-draft.ts'
import type { Blinding, RoundRole } from '#shared/domain/round-status.ts'

/** What `rounds.plan` holds: the evening as it was typed, read by its own contract. */
export const readPlan = (plan: unknown): EveningDraft => eveningDraft.parse(plan)

export const blindingOf = (draft: Pick<EveningDraft, 'tagging'>): Blinding =>
  ({ keeper: 'double', split: 'split', single: 'single' })[draft.tagging] as Blinding

/** The roles that one line of "who is there" holds in the round. */
export function rolesOf(person: EveningDraft['people'][number]): RoundRole[] {
  const roles: RoundRole[] = []
  if (person.you) roles.push('organiser')
  if (person.duty !== 'none') roles.push(person.duty)
  if (person.steward) roles.push('steward')
  if (person.listens) roles.push('panelist')
  return roles
}
