import { useMutation, useQueryClient } from '@tanstack/react-query'
import { markTagged } from '#shared/contracts/tags.ts'
import type { BodyOf } from '#shared/contracts/endpoint.ts'
import { call } from '#src/lib/call.ts'
import { tagsQuery, type AtTags } from './queries.ts'

/** Marks one pouch; the list is read again before the next one shows. */
export function useMark(at: AtTags) {
  const client = useQueryClient()
  const { queryKey } = tagsQuery(at)
  return useMutation({
    mutationFn: (body: BodyOf<typeof markTagged>) => call(markTagged, { params: at, body }),
    onSettled: () => client.invalidateQueries({ queryKey }),
  })
}
