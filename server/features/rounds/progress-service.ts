import { QueryTypes } from 'sequelize'
import type { Progress } from '#shared/contracts/rounds.ts'
import type { Context } from '#server/http/context.ts'
import { Sitting } from '#server/models/sitting.ts'

interface SeatLine {
  label: string
  joined: boolean
  left: boolean
  planned: number
  submitted: number
  void: number
  due: number
  ended: boolean
}

/** How many servings are in, and who still owes something. Counts only: no code, no unit, no rating. */
export async function progressOf(context: Context, roundId: string): Promise<Progress> {
  const sitting = await Sitting.findOne({ where: { roundId } })
  const turn = sitting?.turn ?? 0
  const seats = await context.deps.sequelize.query<SeatLine>(
    `select s.label, s.opened_at is not null as joined, s.left_at is not null as left,
            count(v.id) filter (where v.state <> 'void')::int as planned,
            count(v.id) filter (where v.state = 'submitted')::int as submitted,
            count(v.id) filter (where v.state = 'void')::int as void,
            count(v.id) filter (where v.state in ('handed', 'confirmed') and v.turn <= $2)::int as due,
            bool_or(e.seat_id is not null) as ended
       from seats s join servings v on v.seat_id = s.id left join end_answers e on e.seat_id = s.id
      where s.round_id = $1 group by s.id order by s.number`,
    { bind: [roundId, turn], type: QueryTypes.SELECT },
  )
  const sum = (of: (seat: SeatLine) => number): number => seats.reduce((total, seat) => total + of(seat), 0)
  const present = seats.filter((seat) => !seat.left)
  const over = sitting !== null && turn >= sitting.turns
  return {
    turn,
    turns: sitting?.turns ?? 0,
    seats: seats.length,
    joined: seats.filter((seat) => seat.joined).length,
    left: seats.length - present.length,
    servings: {
      planned: sum((seat) => (seat.left ? seat.submitted : seat.planned)),
      submitted: sum((seat) => seat.submitted),
      void: sum((seat) => seat.void),
      out: present.reduce((total, seat) => total + seat.due, 0),
    },
    waitingFor: present.flatMap((seat) => [
      ...(seat.due > 0
        ? [{ seat: seat.label, what: seat.due === 1 ? 'one rating' : `${seat.due} ratings` }]
        : []),
      ...(over && seat.due === 0 && !seat.ended ? [{ seat: seat.label, what: 'the end questions' }] : []),
    ]),
  }
}
