import type { QueryClient } from '@tanstack/react-query'
import { getAgreement } from '#shared/contracts/analysis.ts'
import { getRound } from '#shared/contracts/rounds.ts'
import { getVerdict, getVerdictDraft, listVerdicts, type VerdictDraft } from '#shared/contracts/verdicts.ts'
import { ask } from '#src/lib/ask.ts'

export interface AtRound {
  panel: string
  round: string
}

export const verdictsQuery = ask(listVerdicts)

/** A published verdict; without a version, the present one. */
export const verdictQuery = (slug: string, version?: number) =>
  ask(getVerdict, { params: { slug }, query: version === undefined ? {} : { version } })

export const roundQuery = (at: AtRound) => ask(getRound, { params: at })

/** The organiser's desk. */
export const draftQuery = (at: AtRound) => ask(getVerdictDraft, { params: at })

/** The figures that the preview shows below the organiser's words. */
export const figuresQuery = (at: AtRound) => ask(getAgreement, { params: at })

/** Every save answers with the desk's new state: it takes the place of the old one. */
export const keepDraft = (client: QueryClient, at: AtRound, draft: VerdictDraft): void => {
  client.setQueryData(draftQuery(at).queryKey, draft)
}
