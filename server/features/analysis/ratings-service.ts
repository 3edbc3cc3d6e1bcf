import { QueryTypes } from 'sequelize'
import { openedKey } from '#server/features/key/opened-service.ts'
import type { Context } from '#server/http/context.ts'
import type { Round } from '#server/models/round.ts'

/** One counted answer after closing, with what its code hid. `listener` is the number of the public file. */
export interface CountedRating {
  listener: number
  memberId: string | null
  seatId: string | null
  unitId: string
  code: string
  descriptor: string
  replicate: string
  position: number | null
  value: number | null
  cantTell: boolean
}

/** Every counted answer of a closed round. @throws while the round is open (B2). */
export function countedRatings(context: Context, round: Round): Promise<CountedRating[]> {
  return round.origin === 'imported' ? importedRatings(context, round) : liveRatings(context, round)
}

async function liveRatings(context: Context, round: Round): Promise<CountedRating[]> {
  const key = await openedKey(context, round)
  const unitOf = new Map(key.places.map((place) => [place.placeId, place.unitId]))
  const rows = await context.deps.sequelize.query<{
    seatId: string
    memberId: string | null
    rowId: string
    codeSet: string
    placeId: string
    code: string
    position: number
    descriptor: string
    value: number | null
    cantTell: boolean
  }>(
    `select s.id as "seatId", s.member_id as "memberId", s.row_id as "rowId", s.code_set as "codeSet", p.id as "placeId", p.code,
            p.position, d.key as descriptor, r.value, r.cant_tell as "cantTell"
       from seats s
       join servings v on v.seat_id = s.id and v.state = 'submitted'
       join row_places p on p.id = v.row_place_id
       join lateral (select id from submissions b where b.serving_id = v.id and b.outcome = 'taken' order by revision desc limit 1) b on true
       join ratings r on r.submission_id = b.id
       join descriptors d on d.id = r.descriptor_id
      where s.panel_id = $1 and s.round_id = $2`,
    { bind: [round.panelId, round.id], type: QueryTypes.SELECT },
  )
  return rows.map(({ rowId, codeSet, placeId, ...row }) => ({
    ...row,
    listener: key.listenerNumbers.get(`${rowId} ${codeSet}`) as number,
    unitId: unitOf.get(placeId) as string,
    replicate: '1',
  }))
}

function importedRatings(context: Context, round: Round): Promise<CountedRating[]> {
  return context.deps.sequelize.query<CountedRating>(
    `select i.listener, i.member_id as "memberId", null as "seatId", i.unit_id as "unitId", '' as code, d.key as descriptor,
            i.replicate, i.position, i.value, i.cant_tell as "cantTell"
       from imported_ratings i join descriptors d on d.id = i.descriptor_id
      where i.panel_id = $1 and i.round_id = $2`,
    { bind: [round.panelId, round.id], type: QueryTypes.SELECT },
  )
}
