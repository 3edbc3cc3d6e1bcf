import type { RoundRole as Role } from '#shared/domain/round-status.ts'
import { enterScope } from '#server/features/panels/access-service.ts'
import { enterRound } from '#server/features/rounds/access-service.ts'
import { linkHash } from '#server/features/rounds/link-service.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { ApiError, notFound } from '#server/http/api-error.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { Panel } from '#server/models/panel.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { Round } from '#server/models/round.ts'
import { Seat } from '#server/models/seat.ts'
import { Sitting } from '#server/models/sitting.ts'
import { mayOpenLink } from '#server/policies/seat.ts'

const unknownLink = 'This link does not work any more. Ask for a new one.'

/** What this browser already holds in the round, by links and by signing in. */
async function heldHere(context: Context, panel: Panel, round: Round): Promise<readonly Role[]> {
  try {
    return (await enterRound(context, panel.slug, round.id)).roles
  } catch (error) {
    if (error instanceof ApiError && error.code === 'not_found') return []
    throw error
  }
}

/** Opens a seat or a duty in this browser and says where to go. */
export async function openLink(context: Context, token: string): Promise<string> {
  const hash = linkHash(token)
  const seat = await Seat.findOne({ where: { linkHash: hash } })
  const duty = seat ? null : await RoundRole.findOne({ where: { linkHash: hash }, lock: true })
  const link = seat ?? duty
  const panel = link ? await Panel.findByPk(link.panelId) : null
  const round = link ? await Round.findByPk(link.roundId) : null
  if (!link || !panel || !round || round.status === 'draft' || round.status === 'cancelled')
    throw notFound(unknownLink)
  const held = await heldHere(context, panel, round)
  await enterScope(context, panel.id)
  const role: Role = duty?.role ?? 'panelist'
  if (!mayOpenLink(role, held, round.blinding))
    throw new ApiError(
      'forbidden',
      'This phone already holds another part of the round. Whoever knows what a code hides may not listen: use another phone.',
    )
  return duty ? openDuty(context, panel, round, duty) : openSeat(context, round, seat as Seat)
}

async function openSeat(context: Context, round: Round, seat: Seat): Promise<string> {
  context.session.openSeat(seat.id)
  if (!seat.openedAt) {
    await seat.update({ openedAt: context.now })
    await announce(context, { round: round.id, seat: { id: seat.id, number: seat.number } })
  }
  return `/seat/${seat.id}`
}

/** The key and its halves open once: a second opening shows that somebody else was there first. */
async function openDuty(context: Context, panel: Panel, round: Round, duty: RoundRole): Promise<string> {
  const mine = context.actor.dutyVersions?.[duty.id] === duty.linkVersion
  if (duty.openedAt && duty.role !== 'steward' && !mine)
    throw new ApiError(
      'forbidden',
      'This link was opened already, on another phone. If that was not you, tell the organiser before anybody listens; a new link replaces it.',
    )
  context.session.openDuty(duty.id, duty.linkVersion)
  if (!duty.openedAt) {
    await duty.update({ openedAt: context.now })
    await putOnRecord(context, 'duty opened', { roundId: round.id, facts: { role: duty.role } })
    await announce(context, { round: round.id })
  }
  const sitting = await Sitting.findOne({ where: { roundId: round.id } })
  return `/p/${panel.slug}/rounds/${round.id}/${duty.role === 'steward' ? 'table' : 'tags'}/${sitting?.id ?? ''}`
}
