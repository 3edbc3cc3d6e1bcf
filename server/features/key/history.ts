import { QueryTypes } from 'sequelize'
import type { History } from '#shared/allocation/types.ts'
import type { Context } from '#server/http/context.ts'
import { withKey } from './with-key.ts'

const rememberedRounds = 10
const rememberedSittings = 3

/**
 * What the panel's earlier rounds forbid the new codes: a (code, unit) pair of its last ten rounds never returns, and
 * no member meets a code of their last three. Where an earlier key is still sealed its codes are left out as a whole,
 * since naming a pair would open it; only rounds that share a unit with this one can repeat a pair.
 */
export async function codeHistory(
  context: Context,
  round: { panelId: string; id: string; unitIds: readonly string[] },
  seats: readonly { seatRef: string; memberId: string | null }[],
): Promise<History> {
  const { sequelize } = context.deps
  const earlier = await sequelize.query<{ id: string; sealed: boolean }>(
    `select r.id, r.published_at is null as sealed from rounds r
      where r.panel_id = $1 and r.id <> $2 and r.opened_at is not null and r.origin = 'live'
      order by r.opened_at desc limit ${rememberedRounds}`,
    { bind: [round.panelId, round.id], type: QueryTypes.SELECT },
  )
  const ids = (sealed: boolean): string[] =>
    earlier.filter((one) => one.sealed === sealed).map((one) => one.id)
  const pairs = await withKey(context, () =>
    sequelize.query<{ code: number; unit: string }>(
      `select distinct p.code::int as code, k.unit_id as unit
         from key_entries k
         join row_places p on p.id = k.row_place_id
         join rows w on w.id = p.row_id
        where w.panel_id = $1 and w.round_id = any($2::uuid[]) and k.unit_id = any($3::uuid[])`,
      { bind: [round.panelId, ids(false), [...round.unitIds]], type: QueryTypes.SELECT },
    ),
  )
  // All codes of a sealed round, never those of one unit: the list is published with this round's key.
  const codes = await sequelize.query<{ code: number }>(
    `select distinct p.code::int as code from row_places p join rows w on w.id = p.row_id
      where w.panel_id = $1 and w.round_id = any($2::uuid[])
        and exists (select 1 from round_units u where u.round_id = w.round_id and u.unit_id = any($3::uuid[]))`,
    { bind: [round.panelId, ids(true), [...round.unitIds]], type: QueryTypes.SELECT },
  )
  const memberIds = seats.flatMap((seat) => (seat.memberId === null ? [] : [seat.memberId]))
  const met = await sequelize.query<{ member: string; code: number }>(
    `select s.member_id as member, p.code::int as code
       from (select *, dense_rank() over (partition by member_id order by round_opened desc) as back
               from (select seats.*, rounds.opened_at as round_opened from seats join rounds on rounds.id = seats.round_id
                      where seats.panel_id = $1 and seats.round_id <> $2 and seats.member_id = any($3::uuid[])) dated) s
       join row_places p on p.row_id = s.row_id and p.code_set = s.code_set
      where s.back <= ${rememberedSittings}`,
    { bind: [round.panelId, round.id, memberIds], type: QueryTypes.SELECT },
  )
  return {
    pairs,
    codes: codes.map((one) => one.code),
    seats: seats.map(({ seatRef, memberId }) => ({
      seatRef,
      codes: met.filter((one) => one.member === memberId).map((one) => one.code),
    })),
  }
}
