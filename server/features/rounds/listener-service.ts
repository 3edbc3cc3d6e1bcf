import type { EveningDraft } from '#shared/contracts/evening-draft.ts'
import type { Descriptor } from '#shared/contracts/scorecard.ts'
import type { Round } from '#server/models/round.ts'
import { descriptorsOf } from './facts-service.ts'
import { readPlan } from './plan.ts'
import { presentDescriptor } from './presenter.ts'

/** What a listener may know of the plan: what is rated and to which tracks. Units are not read. */
export async function describeRound(round: Round): Promise<{ scorecard: Descriptor[]; tracks: string[] }> {
  const scorecard = (await descriptorsOf(round)).map((row) =>
    presentDescriptor(row.get({ plain: true }) as Parameters<typeof presentDescriptor>[0]),
  )
  return { scorecard, tracks: round.origin === 'imported' ? [] : readPlan(round.plan).tracks }
}

/** How the round was done; null for an imported one, which does not know. */
export const planOfRound = (
  round: Round,
): Pick<EveningDraft, 'levelMatching' | 'hiding' | 'sourceChain' | 'tracks'> | null =>
  round.origin === 'imported' ? null : readPlan(round.plan)
