import { QueryTypes } from 'sequelize'
import type { Context } from '#server/http/context.ts'
import { Descriptor } from '#server/models/descriptor.ts'
import { Member } from '#server/models/member.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { RoundUnit } from '#server/models/round-unit.ts'
import type { Round } from '#server/models/round.ts'
import { Sitting } from '#server/models/sitting.ts'
import { Unit } from '#server/models/unit.ts'

export const descriptorsOf = (round: Pick<Round, 'scorecardId'>): Promise<Descriptor[]> =>
  Descriptor.findAll({ where: { scorecardId: round.scorecardId }, order: [['place', 'asc']] })

/** Units in the order of their names: an order that tells nothing. */
export async function unitsOf(round: Pick<Round, 'id'>): Promise<Unit[]> {
  const links = await RoundUnit.findAll({ where: { roundId: round.id } })
  return Unit.findAll({
    where: { id: links.map((one) => one.unitId) },
    order: [
      ['maker', 'asc'],
      ['name', 'asc'],
    ],
  })
}

export const unitCountOf = (round: Pick<Round, 'id'>): Promise<number> =>
  RoundUnit.count({ where: { roundId: round.id } })

export interface PersonInRound {
  memberId: string
  name: string
  roles: RoundRole['role'][]
}

export async function peopleOf(round: Pick<Round, 'id'>): Promise<PersonInRound[]> {
  const held = await RoundRole.findAll({ where: { roundId: round.id } })
  const members = await Member.findAll({ where: { id: [...new Set(held.map((one) => one.memberId))] } })
  return members
    .map((member) => ({
      memberId: member.id,
      name: member.displayName,
      roles: held.filter((one) => one.memberId === member.id).map((one) => one.role),
    }))
    .sort((a, b) => a.name.localeCompare(b.name, 'en'))
}

/** In which turns each listener's row has something to hear; by seat number, no code and no unit. */
export async function turnsBySeat(context: Context, roundId: string): Promise<number[][]> {
  const rows = await context.deps.sequelize.query<{ turns: number[] }>(
    `select array_agg(v.turn order by v.turn) as turns from seats s join servings v on v.seat_id = s.id
      where s.round_id = $1 group by s.number order by s.number`,
    { bind: [roundId], type: QueryTypes.SELECT },
  )
  return rows.map((row) => row.turns)
}

/** Turns that the sitting took; null for an imported round. */
export async function turnsOfRound(round: Pick<Round, 'id' | 'origin'>): Promise<number | null> {
  const sitting = round.origin === 'imported' ? null : await Sitting.findOne({ where: { roundId: round.id } })
  return sitting?.turns ?? null
}
