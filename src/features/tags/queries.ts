import { getPublicRound } from '#shared/contracts/rounds.ts'
import { getTags } from '#shared/contracts/tags.ts'
import { ask } from '#src/lib/ask.ts'

export interface AtTags {
  panel: string
  round: string
  sitting: string
}

/** Pouches to tag: the keeper's, or one half of a split key. */
export const tagsQuery = (params: AtTags) => ask(getTags, { params })

/** The round's public page carries both fingerprints: the printed sheet repeats them. */
export const fingerprintsQuery = (round: string) => ask(getPublicRound, { params: { round } })
