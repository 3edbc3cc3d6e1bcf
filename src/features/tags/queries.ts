import { getTags } from '#shared/contracts/tags.ts'
import { ask } from '#src/lib/ask.ts'

export interface AtTags {
  panel: string
  round: string
  sitting: string
}

/** Pouches to tag: the keeper's, or one half of a split key. */
export const tagsQuery = (params: AtTags) => ask(getTags, { params })
