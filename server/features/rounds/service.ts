import type { EveningDraft } from '#shared/contracts/evening-draft.ts'
import type { Handover, Progress, Round as RoundView } from '#shared/contracts/rounds.ts'
import { enterPanel } from '#server/features/panels/access-service.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { ApiError, staleEdit } from '#server/http/api-error.ts'
import { announce, type Change } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import type { Member } from '#server/models/member.ts'
import { mayStartRound } from '#server/policies/panel.ts'
import * as may from '#server/policies/round.ts'
import { enterRound, type RoundAccess } from './access-service.ts'
import { draftEvening, mustBeDraft, redraftEvening } from './draft-service.ts'
import { handoversOf, renew } from './links-service.ts'
import { openDraft } from './open-service.ts'
import { readPlan } from './plan.ts'
import { progressOf } from './progress-service.ts'
import { viewRound } from './view-service.ts'

interface At {
  panel: string
  round: string
}

export async function createEvening(
  context: Context,
  panelSlug: string,
  draft: EveningDraft,
): Promise<RoundView> {
  const { panel, member } = await enterPanel(context, panelSlug)
  permit(mayStartRound({ roles: member.roles }))
  const round = await draftEvening(context, { panelId: panel.id, member }, draft)
  return viewRound(context, await enterRound(context, panelSlug, round.id))
}

export const showRound = async (context: Context, at: At): Promise<RoundView> =>
  viewRound(context, await enterRound(context, at.panel, at.round))

/** Locks the round, so that two people who press at once act one after the other, and compares versions. */
export async function enterToChange(
  context: Context,
  at: At,
  may: (access: RoundAccess) => boolean,
): Promise<RoundAccess> {
  const access = await enterRound(context, at.panel, at.round)
  await access.round.reload({ lock: true })
  const facts = { ...access.facts, status: access.round.status }
  if (context.version !== undefined && context.version !== access.round.version)
    throw staleEdit(await viewRound(context, { ...access, facts }))
  permit(may({ ...access, facts }))
  return { ...access, facts }
}

const memberOf = (access: RoundAccess): Member => {
  if (!access.member) throw new ApiError('forbidden', 'Sign in to organise.')
  return access.member
}

const again = async (context: Context, at: At): Promise<RoundView> => showRound(context, at)

export async function changeEvening(context: Context, at: At, draft: EveningDraft): Promise<RoundView> {
  const access = await enterToChange(context, at, ({ facts }) => may.mayOrganise(facts))
  mustBeDraft(access.round)
  await redraftEvening(context, access.round, memberOf(access), draft)
  return again(context, at)
}

export async function openRound(context: Context, at: At): Promise<RoundView> {
  const access = await enterToChange(context, at, ({ facts }) => may.mayOrganise(facts))
  mustBeDraft(access.round)
  await openDraft(context, access.round)
  return again(context, at)
}

export async function cancelRound(context: Context, at: At, reason: string): Promise<RoundView> {
  const { round } = await enterToChange(context, at, ({ facts }) => may.mayCancel(facts))
  await round.update({
    status: 'cancelled',
    cancelReason: reason,
    cancelledAt: context.now,
    changedAt: context.now,
    version: round.version + 1,
  })
  await putOnRecord(context, 'round cancelled', { roundId: round.id, facts: { reason } })
  await announce(context, { round: round.id })
  return again(context, at)
}

export async function draftAgain(context: Context, at: At): Promise<RoundView> {
  const access = await enterRound(context, at.panel, at.round)
  permit(may.mayDraftAgain(access.facts))
  const made = await draftEvening(
    context,
    { panelId: access.panel.id, member: memberOf(access) },
    readPlan(access.round.plan),
  )
  return showRound(context, { panel: at.panel, round: made.id })
}

export async function showProgress(context: Context, at: At): Promise<Progress> {
  const access = await enterRound(context, at.panel, at.round)
  permit(may.maySeeProgress(access.facts))
  return progressOf(context, access.round.id)
}

/** Links of duties are for the organiser to hand over: a steward gives out seats only. */
export async function showHandovers(context: Context, at: At): Promise<Handover[]> {
  const access = await enterRound(context, at.panel, at.round)
  permit(may.mayHandOutLinks(access.facts))
  return handoversOf(context, access.round.id, may.mayOrganise(access.facts))
}

export async function renewLink(context: Context, at: At & { link: string }): Promise<Handover> {
  const access = await enterRound(context, at.panel, at.round)
  permit(may.mayHandOutLinks(access.facts))
  return renew(context, access.round.id, at.link, may.mayOrganise(access.facts))
}

/** What a change is called on the screens of the round: the number of the seat, and nothing else. */
export async function hearRound(context: Context, at: At): Promise<(change: Change) => string | null> {
  const access = await enterRound(context, at.panel, at.round)
  permit(may.maySeeProgress(access.facts))
  const roundId = access.round.id
  return (change) =>
    change.round !== roundId ? null : change.seat ? `seat ${change.seat.number} changed` : 'the round changed'
}
