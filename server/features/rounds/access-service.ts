import { Op } from 'sequelize'
import type { RoundRole as Role } from '#shared/domain/round-status.ts'
import { enterScope } from '#server/features/panels/access-service.ts'
import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { Member } from '#server/models/member.ts'
import { Panel } from '#server/models/panel.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { Round } from '#server/models/round.ts'
import { Seat } from '#server/models/seat.ts'
import type { RoundFacts } from '#server/policies/round.ts'

export interface RoundAccess {
  panel: Panel
  round: Round
  /** The signed-in member; null for whoever came by a link. */
  member: Member | null
  roles: Role[]
  /** The actor's own seat in this round, where there is one. */
  seat: Seat | null
  facts: RoundFacts
}

/**
 * The round and what the actor holds in it: by membership, by a duty's link or by a seat's link. A seat always makes a
 * panelist, and who has any second role keeps both: the blind looks at all of them together.
 * @throws not_found for another panel's round, and for anybody who holds nothing in it
 */
export async function enterRound(context: Context, slug: string, roundId: string): Promise<RoundAccess> {
  const { actor } = context
  const panel = await Panel.findOne({ where: { slug } })
  const round = panel && (await Round.findOne({ where: { panelId: panel.id, id: roundId } }))
  if (!panel || !round) throw notFound()
  const member =
    actor.userId === null
      ? null
      : await Member.findOne({ where: { panelId: panel.id, userId: actor.userId, removedAt: null } })
  const found = await RoundRole.findAll({
    where: {
      panelId: panel.id,
      roundId,
      [Op.or]: [{ id: [...actor.dutyIds] }, ...(member ? [{ memberId: member.id }] : [])],
    },
  })
  // A renewed link ends what the old one opened.
  const held = found.filter(
    (one) =>
      one.memberId === member?.id ||
      actor.dutyVersions === undefined ||
      actor.dutyVersions[one.id] === one.linkVersion,
  )
  const memberIds = [...new Set([...held.map((one) => one.memberId), ...(member ? [member.id] : [])])]
  const seat = await Seat.findOne({
    where: { panelId: panel.id, roundId, [Op.or]: [{ id: [...actor.seatIds] }, { memberId: memberIds }] },
    order: [['number', 'asc']],
  })
  // Whoever came by one link still holds what else the same person holds in this round.
  const alsoHeld =
    memberIds.length > 0 || seat?.memberId
      ? await RoundRole.findAll({
          where: {
            panelId: panel.id,
            roundId,
            memberId: [...memberIds, ...(seat?.memberId ? [seat.memberId] : [])],
          },
        })
      : []
  const roles = [
    ...new Set<Role>([...held, ...alsoHeld].map((one) => one.role).concat(seat ? ['panelist'] : [])),
  ]
  if (roles.length === 0) throw notFound()
  await enterScope(context, panel.id)
  return {
    panel,
    round,
    member,
    roles,
    seat,
    facts: { status: round.status, origin: round.origin, blinding: round.blinding, roles },
  }
}
