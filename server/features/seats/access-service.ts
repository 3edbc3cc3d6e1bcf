import { Op } from 'sequelize'
import { enterScope } from '#server/features/panels/access-service.ts'
import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { Member } from '#server/models/member.ts'
import { Panel } from '#server/models/panel.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { Round } from '#server/models/round.ts'
import { Seat } from '#server/models/seat.ts'
import { Sitting } from '#server/models/sitting.ts'
import type { SeatFacts } from '#server/policies/seat.ts'

export interface SeatAccess {
  seat: Seat
  round: Round
  sitting: Sitting
  panel: Panel
  facts: SeatFacts
}

/** The seat, for the phone that opened it or the member it belongs to. @throws not_found for anybody else */
export async function enterSeat(context: Context, id: string): Promise<SeatAccess> {
  const seat = await Seat.findByPk(id)
  if (!seat || !(await isTheirs(context, seat)))
    throw notFound('This seat is not open on this phone. Scan its code again.')
  const round = await Round.findByPk(seat.roundId)
  const sitting = await Sitting.findByPk(seat.sittingId)
  const panel = await Panel.findByPk(seat.panelId)
  if (!round || !sitting || !panel) throw notFound()
  await enterScope(context, seat.panelId)
  return {
    seat,
    round,
    sitting,
    panel,
    facts: {
      status: round.status,
      consented: Boolean(seat.consentedAt),
      left: Boolean(seat.leftAt),
      knowsKey: await knowsKey(context, round),
    },
  }
}

/** Whether this browser holds the keeper's duty in the round, however it came by it. */
async function knowsKey(context: Context, round: Round): Promise<boolean> {
  const keepers = await RoundRole.findAll({ where: { roundId: round.id, role: 'keeper' } })
  if (keepers.some((one) => context.actor.dutyIds.includes(one.id))) return true
  if (context.actor.userId === null) return false
  const members = keepers.map((one) => one.memberId)
  return (await Member.count({ where: { id: members, userId: context.actor.userId } })) > 0
}

async function isTheirs(context: Context, seat: Seat): Promise<boolean> {
  if (context.actor.seatIds.includes(seat.id)) return true
  if (context.actor.userId === null || !seat.memberId) return false
  return (await Member.count({ where: { id: seat.memberId, userId: context.actor.userId } })) > 0
}

/** Other seats of open rounds that this browser opened: two people may share one phone. */
export async function otherSeats(context: Context, seat: Seat): Promise<{ id: string; label: string }[]> {
  const ids = context.actor.seatIds.filter((one) => one !== seat.id)
  if (ids.length === 0) return []
  const seats = await Seat.findAll({
    where: { id: ids, roundId: seat.roundId, leftAt: { [Op.is]: null } },
    order: [['number', 'asc']],
  })
  return seats.map(({ id, label }) => ({ id, label }))
}
