import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { BodyOf } from '#shared/contracts/endpoint.ts'
import { getMe } from '#shared/contracts/account.ts'
import { changePanel, getPanel, listMembers, listRounds, listUnits } from '#shared/contracts/panels.ts'
import { ask, keyOf } from '#src/lib/ask.ts'
import { call } from '#src/lib/call.ts'

export const panelQuery = (panel: string) => ask(getPanel, { params: { panel } })
export const roundsQuery = (panel: string) => ask(listRounds, { params: { panel } })
export const unitsQuery = (panel: string) => ask(listUnits, { params: { panel } })
export const membersQuery = (panel: string) => ask(listMembers, { params: { panel } })

export function useChangePanel(panel: string, version: number) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (body: BodyOf<typeof changePanel>) => call(changePanel, { params: { panel }, body, version }),
    onSuccess: async (changed) => {
      client.setQueryData(panelQuery(panel).queryKey, changed)
      await client.invalidateQueries({ queryKey: keyOf(getMe) })
    },
  })
}
