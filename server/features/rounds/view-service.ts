import type { PublicRound, Round as RoundView } from '#shared/contracts/rounds.ts'
import { minutesPerTurn, eveningMinutes } from '#shared/domain/timing.ts'
import { isRevealed } from '#shared/domain/round-status.ts'
import { createStream } from '#shared/allocation/stream.ts'
import { drawTurns } from '#shared/allocation/turns.ts'
import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { Panel } from '#server/models/panel.ts'
import { Round } from '#server/models/round.ts'
import { Seat } from '#server/models/seat.ts'
import { Sitting } from '#server/models/sitting.ts'
import { Verdict } from '#server/models/verdict.ts'
import * as may from '#server/policies/round.ts'
import type { RoundAccess } from './access-service.ts'
import { keyIsPublic } from './cancelled-service.ts'
import { descriptorsOf, peopleOf, turnsBySeat, unitCountOf, unitsOf } from './facts-service.ts'
import { readPlan } from './plan.ts'
import { presentPublicRound, presentRound, type PlanFacts } from './presenter.ts'

export const verdictSlugOf = async (roundId: string): Promise<string | null> =>
  (await Verdict.findOne({ where: { roundId }, attributes: ['slug'] }))?.slug ?? null

/** What an imported round says of how it was done: it does not know. */
const unknownPlan: PlanFacts = {
  tracks: [],
  sourceChain: '',
  levelMatching: 'not-matched',
  hiding: 'Not known: brought from a file',
}

const planOf = (round: Round): PlanFacts => (round.origin === 'imported' ? unknownPlan : readPlan(round.plan))

/** The evening in turns and minutes, and in which turns each listener hears something. */
async function turnsOf(context: Context, round: Round, descriptors: number): Promise<RoundView['plan']> {
  const minutes = (turns: number) => ({
    turns,
    minutesPerTurn: minutesPerTurn(descriptors),
    minutes: eveningMinutes(turns, descriptors).total,
  })
  if (round.origin === 'imported') return { ...minutes(0), rows: [] }
  const sitting = await Sitting.findOne({ where: { roundId: round.id } })
  if (sitting)
    return {
      ...minutes(sitting.turns),
      rows: (await turnsBySeat(context, round.id)).map((turns) => ({ turns })),
    }
  // Before opening: rows like the ones that will be drawn, from a stream that everybody may know.
  const draft = readPlan(round.plan)
  const listeners = draft.people.filter((one) => one.listens).length
  const like = drawTurns({
    units: draft.units.length,
    listeners,
    spares: 0,
    stream: createStream('0'.repeat(64), 'preview'),
  })
  return {
    ...minutes(like.turns),
    rows: like.rows.map((row) => ({ turns: row.places.map((place) => place.turn) })),
  }
}

/** The round as this actor may see it. */
export async function viewRound(context: Context, access: RoundAccess): Promise<RoundView> {
  const { round, facts } = access
  const scorecard = await descriptorsOf(round)
  const units = may.maySeeUnits(facts) ? await unitsOf(round) : null
  const sitting = await Sitting.findOne({ where: { roundId: round.id } })
  const isDraft = round.status === 'draft' || round.status === 'cancelled'
  return presentRound(plainRound(round), {
    units,
    unitCount: await unitCountOf(round),
    people: await peopleOf(round),
    scorecard,
    plan: planOf(round),
    turns: await turnsOf(context, round, scorecard.length),
    sittingId: sitting?.id ?? null,
    verdictSlug: await verdictSlugOf(round.id),
    draft: isDraft && may.mayOrganise(facts) && round.origin === 'live' ? readPlan(round.plan) : null,
    lacks: [],
    you: { roles: access.roles, seatId: access.seat?.id ?? null },
    can: {
      edit: may.mayEdit(facts),
      open: may.mayOpen(facts),
      cancel: may.mayCancel(facts),
      close: may.mayClose(facts),
      handOutLinks: may.mayHandOutLinks(facts),
      steward: may.maySteward(facts),
      tag: may.mayTag(facts),
      seeAgreement: may.maySeeAgreement(facts),
      publish: may.mayPublish(facts),
    },
  })
}

/** @throws not_found for a draft and for a round that never opened */
export async function viewPublicRound(context: Context, id: string): Promise<PublicRound> {
  const round = await Round.findOne({ where: { id, origin: 'live' } })
  if (!round || round.openedAt === null) throw notFound('No round was opened under this address.')
  const panel = await Panel.findByPk(round.panelId)
  context.panelId = round.panelId
  const sitting = await Sitting.findOne({ where: { roundId: id } })
  return presentPublicRound(plainRound(round), {
    panelName: panel?.name ?? '',
    unitCount: await unitCountOf(round),
    listeners: await Seat.count({ where: { roundId: id } }),
    turns: sitting?.turns ?? 0,
    scorecard: await descriptorsOf(round),
    plan: planOf(round),
    verdictSlug: isRevealed(round.status) ? await verdictSlugOf(id) : null,
    keyIsPublic: await keyIsPublic(context, round),
  })
}

const plainRound = (round: Round) => {
  const { planFingerprint, keyFingerprint, openedAt, closedAt, cancelledAt, cancelReason, ...rest } =
    round.get({ plain: true })
  return {
    ...rest,
    planFingerprint: planFingerprint ?? null,
    keyFingerprint: keyFingerprint ?? null,
    openedAt: openedAt ?? null,
    closedAt: closedAt ?? null,
    cancelledAt: cancelledAt ?? null,
    cancelReason: cancelReason ?? null,
  }
}
