import { getAgreement, getReveal } from '#shared/contracts/analysis.ts'
import { getRound } from '#shared/contracts/rounds.ts'
import { ask } from '#src/lib/ask.ts'

interface AtRound {
  panel: string
  round: string
}

export const roundQuery = (at: AtRound) => ask(getRound, { params: at })

/** What a closed round says. */
export const agreementQuery = (at: AtRound) => ask(getAgreement, { params: at })

/** For the room; it does not change while it is shown. */
export const revealQuery = (at: AtRound) => ({ ...ask(getReveal, { params: at }), staleTime: Infinity })
