import { queryOptions } from '@tanstack/react-query'
import { getAgreement } from '#shared/contracts/analysis.ts'
import { getVerdict, getVerdictDraft, listVerdicts } from '#shared/contracts/verdicts.ts'
import { call } from '#src/lib/call.ts'

export interface AtRound {
  panel: string
  round: string
}

export const verdictsQuery = queryOptions({
  queryKey: ['verdicts'],
  queryFn: ({ signal }) => call(listVerdicts, { signal }),
})

/** A published verdict; without a version, the present one. */
export const verdictQuery = (slug: string, version?: number) =>
  queryOptions({
    queryKey: ['verdicts', slug, version ?? 'present'],
    queryFn: ({ signal }) =>
      call(getVerdict, { params: { slug }, query: version === undefined ? {} : { version }, signal }),
  })

/** The key of the organiser's desk, which every save answers with its new state. */
export const draftKey = (at: AtRound) => ['verdict-draft', at.panel, at.round] as const

export const draftQuery = (at: AtRound) =>
  queryOptions({
    queryKey: draftKey(at),
    queryFn: ({ signal }) => call(getVerdictDraft, { params: at, signal }),
  })

/** The figures that the preview shows below the organiser's words. */
export const figuresQuery = (at: AtRound) =>
  queryOptions({
    queryKey: ['agreement', at.panel, at.round],
    queryFn: ({ signal }) => call(getAgreement, { params: at, signal }),
  })
