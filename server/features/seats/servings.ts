import { QueryTypes } from 'sequelize'
import type { Context } from '#server/http/context.ts'

export interface SeatServing {
  id: string
  turn: number
  state: 'waiting' | 'tagged' | 'handed' | 'confirmed' | 'submitted' | 'void' | 'missed'
  code: string
  sealed: 'yes' | 'unsure' | 'no' | null
  confirmed: boolean
  restUntil: Date | null
}

/** A seat's servings in the order of their turns; by code, never by unit. */
export function servingsOf(context: Context, seatId: string): Promise<SeatServing[]> {
  return context.deps.sequelize.query<SeatServing>(
    `select v.id, v.turn, v.state, p.code, v.sealed, v.confirmed_at is not null as confirmed, v.rest_until as "restUntil"
       from servings v join row_places p on p.id = v.row_place_id where v.seat_id = $1 order by v.turn`,
    { bind: [seatId], type: QueryTypes.SELECT },
  )
}
