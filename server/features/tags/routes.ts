import * as contract from '#shared/contracts/tags.ts'
import type { Feature } from '#server/http/feature.ts'
import { markTagged, showTags } from './service.ts'

export const tags: Feature = (mount) => {
  mount(contract.getTags, ({ params }, context) => showTags(context, params))
  mount(contract.markTagged, async ({ params, body }, context) => {
    await markTagged(context, params, body)
    return { done: true as const }
  })
}
