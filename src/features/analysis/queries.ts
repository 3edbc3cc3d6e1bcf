import { queryOptions } from '@tanstack/react-query'
import { getAgreement, getReveal } from '#shared/contracts/analysis.ts'
import { call } from '#src/lib/call.ts'

interface AtRound {
  panel: string
  round: string
}

/** What a closed round says; it changes only when exclusions do. */
export const agreementQuery = (at: AtRound) =>
  queryOptions({
    queryKey: ['agreement', at.panel, at.round],
    queryFn: ({ signal }) => call(getAgreement, { params: at, signal }),
  })

export const revealQuery = (at: AtRound) =>
  queryOptions({
    queryKey: ['reveal', at.panel, at.round],
    queryFn: ({ signal }) => call(getReveal, { params: at, signal }),
    staleTime: Infinity,
  })
