import { eveningMinutes } from '#shared/domain/timing.ts'
import { turnsNeeded } from '#shared/allocation/turns.ts'
import type { Json, KeyUnit } from '#shared/allocation/types.ts'
import type { EveningDraft } from '#shared/contracts/evening-draft.ts'
import { drawAndSeal } from '#server/features/key/draw-service.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { Descriptor } from '#server/models/descriptor.ts'
import { enqueueMail } from '#server/jobs/queue.ts'
import { roundOpened } from '#server/mail/templates/round-opened.ts'
import { Member } from '#server/models/member.ts'
import { Panel } from '#server/models/panel.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { RoundUnit } from '#server/models/round-unit.ts'
import type { Round } from '#server/models/round.ts'
import { RowPlace } from '#server/models/row-place.ts'
import { Seat } from '#server/models/seat.ts'
import { Serving } from '#server/models/serving.ts'
import { Sitting } from '#server/models/sitting.ts'
import { Unit } from '#server/models/unit.ts'
import { User } from '#server/models/user.ts'
import { linkHash, linkToken } from './link-service.ts'
import { readPlan } from './plan.ts'

/** Part of every plan and key: whoever repeats the draw must know which rules made it. */
const versions = { plan: 'scrim-plan-1', key: 'scrim-key-1', draw: 'scrim-draw-1' }

/** Draws rows and codes, freezes the plan, makes sitting, seats and servings. All in the caller's transaction. */
export async function openDraft(context: Context, round: Round): Promise<void> {
  const draft = readPlan(round.plan)
  const panelists = await RoundRole.findAll({ where: { roundId: round.id, role: 'panelist' } })
  const members = await Member.findAll({ where: { id: panelists.map((one) => one.memberId) } })
  // Seats are numbered in the order of names, which says nothing of the draw.
  members.sort((a, b) => a.displayName.localeCompare(b.displayName, 'en'))
  const seats = members.map((member, index) => ({ id: context.deps.random.id(), member, number: index + 1 }))
  const drawn = await drawAndSeal(context, {
    panelId: round.panelId,
    roundId: round.id,
    units: await keyUnits(round),
    seats: seats.map((seat) => ({ seatRef: seat.id, memberId: seat.member.id })),
    split: round.blinding === 'split',
    versions,
    plan: await frozenPlan(round, draft),
  })
  const sitting = await Sitting.create({
    panelId: round.panelId,
    id: context.deps.random.id(),
    roundId: round.id,
    name: 'Tonight',
    turns: drawn.turns,
  })
  const rowOf = new Map(drawn.seats.map((one) => [one.seatRef, one.rowId]))
  for (const seat of seats) {
    await addSeat(context, sitting, {
      id: seat.id,
      memberId: seat.member.id,
      label: seat.member.displayName,
      number: seat.number,
      rowId: rowOf.get(seat.id) as string,
      codeSet: 'served',
    })
  }
  await linkDuties(context, round)
  await round.update({
    status: 'open',
    planFile: drawn.planText,
    planFingerprint: drawn.planFingerprint,
    keyFingerprint: drawn.keyFingerprint,
    openedAt: context.now,
    changedAt: context.now,
    version: round.version + 1,
  })
  await putOnRecord(context, 'round opened', {
    roundId: round.id,
    facts: { plan: drawn.planFingerprint, key: drawn.keyFingerprint },
  })
  await mailFingerprints(context, round)
  await announce(context, { round: round.id })
}

async function keyUnits(round: Round): Promise<KeyUnit[]> {
  const links = await RoundUnit.findAll({ where: { roundId: round.id } })
  const units = await Unit.findAll({ where: { id: links.map((one) => one.unitId) }, order: [['id', 'asc']] })
  return units.map(({ id, maker, name, serial, firmware }) => ({ id, maker, name, serial, firmware }))
}

/** The plan that freezes: everything but units and names of people. */
async function frozenPlan(round: Round, draft: EveningDraft) {
  const descriptors = await Descriptor.findAll({
    where: { scorecardId: round.scorecardId },
    order: [['place', 'asc']],
  })
  const scorecard: Json = descriptors.map((one) => ({
    key: one.key,
    name: one.name,
    sentence: one.sentence,
    family: one.family,
    scale: { low: one.scaleLow, high: one.scaleHigh, step: one.step },
    sided: one.sided,
    words: { low: one.lowWords, middle: one.middleWords, high: one.highWords },
  }))
  return {
    question: round.question,
    title: round.title,
    scorecard,
    primaryDescriptor: round.primaryDescriptor,
    rules: { fewerThanHalf: true, adjustForPosition: false } as Json,
    tracks: draft.tracks,
    sourceChain: draft.sourceChain,
    levelMatching: draft.levelMatching,
    hiding: draft.hiding,
    blinding: round.blinding,
    publishesRows: round.publishesRows,
    minutes: eveningMinutes(
      turnsNeeded(draft.units.length, draft.people.filter((one) => one.listens).length),
      scorecard.length,
    ).total,
  }
}

/** A seat with its link and one waiting serving for each place of its row. */
export async function addSeat(
  context: Context,
  sitting: { panelId: string; id: string; roundId: string },
  seat: {
    id: string
    memberId: string
    label: string
    number: number
    rowId: string
    codeSet: 'served' | 'takeover'
    afterTurn?: number
    /** Turns by which the row runs later than it was drawn. */
    shift?: number
  },
): Promise<Seat> {
  const token = linkToken(context.deps, 'seat', seat.id, 1)
  const { panelId } = sitting
  const made = await Seat.create({
    panelId,
    id: seat.id,
    roundId: sitting.roundId,
    sittingId: sitting.id,
    memberId: seat.memberId,
    rowId: seat.rowId,
    codeSet: seat.codeSet,
    number: seat.number,
    label: seat.label,
    linkHash: linkHash(token),
  })
  const places = await RowPlace.findAll({
    where: { rowId: seat.rowId, codeSet: seat.codeSet },
    order: [['position', 'asc']],
  })
  await Serving.bulkCreate(
    places
      .map((place) => ({ id: place.id, position: place.position, turn: place.turn + (seat.shift ?? 0) }))
      .filter((place) => place.turn > (seat.afterTurn ?? 0))
      .map((place) => ({
        panelId,
        id: context.deps.random.id(),
        seatId: seat.id,
        rowPlaceId: place.id,
        turn: place.turn,
        position: place.position,
        state: 'waiting' as const,
      })),
  )
  return made
}

/** Duties get a link of their own, for people without an account. */
async function linkDuties(context: Context, round: Round): Promise<void> {
  const duties = await RoundRole.findAll({
    where: { roundId: round.id, role: ['keeper', 'letters', 'codes', 'steward'] },
  })
  for (const duty of duties)
    await duty.update({ linkHash: linkHash(linkToken(context.deps, 'duty', duty.id, duty.linkVersion)) })
}

/** Both fingerprints go to everybody with a role in the round who can be written to; no unit is named. */
async function mailFingerprints(context: Context, round: Round): Promise<void> {
  const panel = await Panel.findByPk(round.panelId)
  const held = await RoundRole.findAll({ where: { roundId: round.id } })
  const members = await Member.findAll({ where: { id: [...new Set(held.map((one) => one.memberId))] } })
  const users = await User.findAll({
    where: { id: members.flatMap((one) => (one.userId ? [one.userId] : [])) },
  })
  for (const member of members) {
    const to = users.find((one) => one.id === member.userId)?.email ?? member.email
    if (!to) continue
    await enqueueMail(
      context,
      roundOpened({
        to,
        name: member.displayName,
        panelName: panel?.name ?? '',
        roundTitle: round.title,
        url: `${context.deps.env.address}/rounds/${round.id}`,
        planFingerprint: round.planFingerprint ?? '',
        keyFingerprint: round.keyFingerprint ?? '',
      }),
    )
  }
}
