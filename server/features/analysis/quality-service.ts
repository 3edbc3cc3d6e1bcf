import { QueryTypes } from 'sequelize'
import type { Agreement } from '#shared/contracts/analysis.ts'
import { unitNames } from '#shared/domain/unit-names.ts'
import { unitsOf } from '#server/features/rounds/facts-service.ts'
import type { Context } from '#server/http/context.ts'
import { AuditEvent } from '#server/models/audit-event.ts'
import { EndAnswer } from '#server/models/end-answer.ts'
import { Member } from '#server/models/member.ts'
import { RoundRole } from '#server/models/round-role.ts'
import type { Round } from '#server/models/round.ts'
import { Seat } from '#server/models/seat.ts'
import { countedRatings } from './ratings-service.ts'

/** Listener numbers, with names only for whoever may know them. */
export async function listenersOf(
  context: Context,
  round: Round,
  withNames: boolean,
): Promise<Agreement['listeners']> {
  const memberOf = new Map((await countedRatings(context, round)).map((one) => [one.listener, one.memberId]))
  const ids = [...memberOf.values()].filter((id) => id !== null)
  const names = new Map(
    (withNames ? await Member.findAll({ where: { id: ids } }) : []).map((one) => [one.id, one.displayName]),
  )
  return [...memberOf]
    .sort(([a], [b]) => a - b)
    .map(([number, memberId]) => ({
      listener: String(number),
      name: memberId === null ? null : (names.get(memberId) ?? null),
    }))
}

/** Servings as they turned out. An imported round knows only what it counted. */
export async function servingCounts(context: Context, round: Round): Promise<Agreement['servings']> {
  if (round.origin === 'imported') {
    const ratings = await countedRatings(context, round)
    const counted = new Set(ratings.map((one) => `${one.listener} ${one.unitId} ${one.replicate}`)).size
    return { planned: counted, counted, void: 0, missing: 0, late: 0 }
  }
  const [row] = await context.deps.sequelize.query<Agreement['servings']>(
    `select count(*) filter (where v.state <> 'void')::int as planned,
            count(*) filter (where v.state = 'submitted')::int as counted,
            count(*) filter (where v.state = 'void')::int as void,
            count(*) filter (where v.state not in ('void', 'submitted'))::int as missing,
            (select count(*) from submissions b join servings w on w.id = b.serving_id join seats t on t.id = w.seat_id
              where t.round_id = $1 and b.outcome = 'late')::int as late
       from servings v join seats s on s.id = v.seat_id where s.round_id = $1`,
    { bind: [round.id], type: QueryTypes.SELECT },
  )
  return row ?? { planned: 0, counted: 0, void: 0, missing: 0, late: 0 }
}

/** What listeners thought they recognised, beside what the code hid. Free text: for the organiser only. */
export async function recognisedIn(context: Context, round: Round): Promise<Agreement['recognised']> {
  if (round.origin === 'imported') return []
  const names = unitNames(await unitsOf(round))
  const ratings = await countedRatings(context, round)
  const seats = await Seat.findAll({ where: { roundId: round.id }, attributes: ['id'] })
  const answers = await EndAnswer.findAll({ where: { seatId: seats.map((one) => one.id) } })
  return answers.flatMap((answer) =>
    (answer.recognitions as { code: string; text: string; sure: string }[]).flatMap((one) => {
      const rated = ratings.find((rating) => rating.seatId === answer.seatId && rating.code === one.code)
      return rated
        ? [
            {
              listener: String(rated.listener),
              code: one.code,
              text: one.text,
              sure: one.sure,
              unit: names.get(rated.unitId) ?? '',
            },
          ]
        : []
    }),
  )
}

export async function stewardListened(round: Round): Promise<boolean> {
  const roles = await RoundRole.findAll({ where: { roundId: round.id, role: ['steward', 'panelist'] } })
  const stewards = new Set(roles.filter((one) => one.role === 'steward').map((one) => one.memberId))
  return roles.some((one) => one.role === 'panelist' && stewards.has(one.memberId))
}

/** Whether a link to the key was opened and then renewed: whoever opened it first has seen what it shows. */
export async function keyLinkRenewed(round: Round): Promise<boolean> {
  const renewals = await AuditEvent.findAll({ where: { roundId: round.id, action: 'link renewed' } })
  return renewals.some(({ facts }) => {
    const { role, wasOpened } = facts as { role?: string; wasOpened?: boolean }
    return wasOpened === true && ['keeper', 'letters', 'codes'].includes(role ?? '')
  })
}
