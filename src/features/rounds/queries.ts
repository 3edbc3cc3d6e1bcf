import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { BodyOf } from '#shared/contracts/endpoint.ts'
import { getPanel, listMembers, listRounds, listUnits } from '#shared/contracts/panels.ts'
import {
  cancelRound,
  changeEvening,
  closeRound,
  createEvening,
  draftAgain,
  getProgress,
  getPublicRound,
  getRound,
  listHandovers,
  openRound,
  renewLink,
  type Round,
} from '#shared/contracts/rounds.ts'
import { ask } from '#src/lib/ask.ts'
import { call } from '#src/lib/call.ts'

export interface At {
  panel: string
  round: string
}

export const panelQuery = (panel: string) => ask(getPanel, { params: { panel } })
export const unitsQuery = (panel: string) => ask(listUnits, { params: { panel } })
export const membersQuery = (panel: string) => ask(listMembers, { params: { panel } })
export const roundQuery = (params: At) => ask(getRound, { params })
export const progressQuery = (params: At) => ask(getProgress, { params })
export const handoversQuery = (params: At) => ask(listHandovers, { params })
export const publicRoundQuery = (round: string) => ask(getPublicRound, { params: { round } })

/** Keeps the round that a write answered with, and lets lists and counts that depend on it be asked for again. */
function useKeep(panel: string): (round: Round) => Promise<void> {
  const client = useQueryClient()
  return async (round) => {
    const at = { panel, round: round.id }
    client.setQueryData(roundQuery(at).queryKey, round)
    await Promise.all([
      client.invalidateQueries({ queryKey: [listRounds.id] }),
      client.invalidateQueries({ queryKey: progressQuery(at).queryKey }),
      client.invalidateQueries({ queryKey: handoversQuery(at).queryKey }),
    ])
  }
}

export function useCreateEvening(panel: string) {
  const onSuccess = useKeep(panel)
  return useMutation({
    mutationFn: ({ body, key }: { body: BodyOf<typeof createEvening>; key: string }) =>
      call(createEvening, { params: { panel }, body, idempotencyKey: key }),
    onSuccess,
  })
}

export function useChangeEvening(params: At) {
  const onSuccess = useKeep(params.panel)
  return useMutation({
    mutationFn: ({ body, version }: { body: BodyOf<typeof changeEvening>; version: number }) =>
      call(changeEvening, { params, body, version }),
    onSuccess,
  })
}

export function useOpenRound(params: At, version: number) {
  const onSuccess = useKeep(params.panel)
  return useMutation({ mutationFn: () => call(openRound, { params, version }), onSuccess })
}

export function useCancelRound(params: At, version: number) {
  const onSuccess = useKeep(params.panel)
  return useMutation({
    mutationFn: (body: BodyOf<typeof cancelRound>) => call(cancelRound, { params, body, version }),
    onSuccess,
  })
}

export function useCloseRound(params: At, version: number) {
  const onSuccess = useKeep(params.panel)
  return useMutation({
    mutationFn: (body: BodyOf<typeof closeRound>) => call(closeRound, { params, body, version }),
    onSuccess,
  })
}

export function useDraftAgain(params: At) {
  const onSuccess = useKeep(params.panel)
  return useMutation({
    mutationFn: (key: string) => call(draftAgain, { params, idempotencyKey: key }),
    onSuccess,
  })
}

export function useRenewLink(params: At) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (link: string) => call(renewLink, { params: { ...params, link } }),
    onSuccess: () => client.invalidateQueries({ queryKey: handoversQuery(params).queryKey }),
  })
}
