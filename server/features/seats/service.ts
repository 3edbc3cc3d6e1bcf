import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { eveningMinutes, minutesPerTurn } from '#shared/domain/timing.ts'
import { announce, type Change } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { fieldError, notFound, ApiError } from '#server/http/api-error.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { describeRound } from '#server/features/rounds/listener-service.ts'
import { EndAnswer } from '#server/models/end-answer.ts'
import { Incident } from '#server/models/incident.ts'
import { RowPlace } from '#server/models/row-place.ts'
import { Serving } from '#server/models/serving.ts'
import { mayRate, maySeeOwnReport } from '#server/policies/seat.ts'
import { enterSeat, otherSeats, type SeatAccess } from './access-service.ts'
import { presentSeat } from './presenter.ts'
import { servingsOf } from './servings.ts'
import { servingInHand, stepOf } from './step.ts'

export async function viewSeat(context: Context, access: SeatAccess): Promise<PanelistSeat> {
  const { seat, round, sitting, panel, facts } = access
  const servings = await servingsOf(context, seat.id)
  const ended = await EndAnswer.count({ where: { seatId: seat.id } })
  const others = await otherSeats(context, seat)
  const told = await describeRound(round)
  const stepFacts = {
    ...facts,
    turn: sitting.turn,
    sittingEnded: Boolean(sitting.endedAt),
    endAnswered: ended > 0,
    servings,
    now: context.now,
  }
  const descriptors = told.scorecard.length
  return presentSeat({
    seat,
    round,
    panelName: panel.name,
    plan: {
      turns: sitting.turns,
      minutesPerTurn: minutesPerTurn(descriptors),
      minutes: eveningMinutes(sitting.turns, descriptors).total,
    },
    scorecard: told.scorecard,
    tracks: told.tracks,
    consented: facts.consented,
    left: facts.left,
    turn: sitting.turn,
    step: stepOf(stepFacts),
    servings,
    inHand: servingInHand(stepFacts),
    now: context.now,
    otherSeats: others,
    maySeeReport: maySeeOwnReport(facts),
  })
}

export const showSeat = async (context: Context, id: string): Promise<PanelistSeat> =>
  viewSeat(context, await enterSeat(context, id))

const told = async (context: Context, { seat, round }: SeatAccess): Promise<PanelistSeat> => {
  await announce(context, { round: round.id, seat: { id: seat.id, number: seat.number } })
  return showSeat(context, seat.id)
}

export async function consent(context: Context, id: string, version: string): Promise<PanelistSeat> {
  const access = await enterSeat(context, id)
  permit(access.facts.status === 'open', { detail: 'This round is not open any more.' })
  if (!access.facts.consented) {
    await access.seat.update({ consentVersion: version, consentedAt: context.now })
    await putOnRecord(context, 'consent given', { roundId: access.round.id, facts: { version } })
  }
  return told(context, access)
}

export async function leave(context: Context, id: string): Promise<PanelistSeat> {
  const access = await enterSeat(context, id)
  if (!access.facts.left && access.round.status === 'open') {
    await access.seat.update({ leftAt: context.now })
    await putOnRecord(context, 'listener left', { roundId: access.round.id })
  }
  return told(context, access)
}

/** The serving of this seat, locked; 404 for another seat's. */
export async function lockServing(seatId: string, servingId: string): Promise<Serving> {
  const serving = await Serving.findOne({ where: { id: servingId, seatId }, lock: true })
  if (!serving) throw notFound()
  return serving
}

const stopped = 'You cannot rate in this round now.'

export async function confirm(
  context: Context,
  id: string,
  servingId: string,
  code: string,
): Promise<PanelistSeat> {
  const access = await enterSeat(context, id)
  permit(mayRate(access.facts), { detail: stopped })
  const serving = await lockServing(access.seat.id, servingId)
  if (serving.state === 'confirmed' || serving.state === 'submitted') return showSeat(context, id)
  if (serving.state !== 'handed')
    throw new ApiError('conflict', 'This pouch is not in your hands now. Ask the steward.')
  const place = await RowPlace.findByPk(serving.rowPlaceId)
  if (place?.code !== code) {
    await serving.update({ wrongCodes: serving.wrongCodes + 1 })
    await announce(context, {
      round: access.round.id,
      seat: { id: access.seat.id, number: access.seat.number },
    })
    return context.refuse(
      fieldError(
        'code',
        'These are not the digits of your pouch. Nothing has changed: read them again, or ask the steward.',
      ),
    )
  }
  await serving.update({ state: 'confirmed', confirmedAt: context.now, version: serving.version + 1 })
  return told(context, access)
}

export async function noteSeal(
  context: Context,
  id: string,
  servingId: string,
  sealed: 'yes' | 'unsure' | 'no',
): Promise<PanelistSeat> {
  const access = await enterSeat(context, id)
  permit(mayRate(access.facts), { detail: stopped })
  const serving = await lockServing(access.seat.id, servingId)
  if (serving.state !== 'confirmed') throw new ApiError('conflict', 'Type the digits on the pouch first.')
  await serving.update({ sealed, version: serving.version + 1 })
  if (sealed === 'no')
    await Incident.create({
      panelId: access.seat.panelId,
      id: context.deps.random.id(),
      roundId: access.round.id,
      sittingId: access.sitting.id,
      seatId: access.seat.id,
      servingId,
      kind: 'lost-seal',
      text: 'No seal found',
      createdAt: context.now,
    })
  return told(context, access)
}

export async function answerEnd(
  context: Context,
  id: string,
  answers: {
    recognised: 'none' | 'perhaps' | 'yes'
    recognitions: { code: string; text: string; sure: string }[]
  },
): Promise<PanelistSeat> {
  const access = await enterSeat(context, id)
  permit(access.facts.status === 'open' && access.facts.consented, {
    detail: 'The end questions are closed.',
  })
  const heard = new Set((await servingsOf(context, id)).filter((one) => one.confirmed).map((one) => one.code))
  answers.recognitions.forEach(({ code }, index) => {
    if (!heard.has(code)) throw fieldError(`recognitions.${index}.code`, 'You did not have this code.')
  })
  await EndAnswer.findOrCreate({
    where: { seatId: id },
    defaults: { panelId: access.seat.panelId, seatId: id, ...answers, receivedAt: context.now },
  })
  return told(context, access)
}

/** A seat hears of itself and of the whole table's turns; never of another seat. */
export async function hearSeat(context: Context, id: string): Promise<(change: Change) => string | null> {
  const { seat, round } = await enterSeat(context, id)
  return (change) =>
    change.round === round.id && (!change.seat || change.seat.id === seat.id) ? 'this seat' : null
}
