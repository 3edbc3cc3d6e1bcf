import { QueryTypes } from 'sequelize'
import type { StewardTable } from '#shared/contracts/table.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { enterRound, type RoundAccess } from '#server/features/rounds/access-service.ts'
import { ApiError, notFound } from '#server/http/api-error.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { Incident } from '#server/models/incident.ts'
import { Row } from '#server/models/row.ts'
import { Seat } from '#server/models/seat.ts'
import { Sitting } from '#server/models/sitting.ts'
import { maySteward } from '#server/policies/round.ts'
import { presentTable, type SeatRow } from './presenter.ts'

export interface At {
  panel: string
  round: string
  sitting: string
}
export type TableAccess = RoundAccess & { sitting: Sitting }

/** The sitting, locked where it is to be changed, so that two stewards act one after the other. */
export async function enterTable(context: Context, at: At, lock = false): Promise<TableAccess> {
  const access = await enterRound(context, at.panel, at.round)
  permit(maySteward(access.facts), { detail: 'Only the steward sees the table, while the round is open.' })
  const sitting = await Sitting.findOne({ where: { id: at.sitting, roundId: access.round.id }, lock })
  if (!sitting) throw notFound()
  return { ...access, sitting }
}

export async function viewTable(context: Context, access: TableAccess): Promise<StewardTable> {
  const { sitting, round } = access
  const seats = await context.deps.sequelize.query<SeatRow>(
    `select s.id, s.label, s.number, s.opened_at is not null as joined, s.left_at is not null as left,
            e.seat_id is not null as "endAnswered", v.id as "servingId", p.code, v.state, v.version as "servingVersion",
            v.wrong_codes as "wrongCodes", v.sealed as seal, v.rest_until as "restUntil"
       from seats s
       left join end_answers e on e.seat_id = s.id
       left join servings v on v.seat_id = s.id and s.left_at is null and v.turn = greatest($2::int, 1)
       left join row_places p on p.id = v.row_place_id
      where s.sitting_id = $1 order by s.number`,
    { bind: [sitting.id, sitting.turn], type: QueryTypes.SELECT },
  )
  const spares = await Row.findAll({ where: { roundId: round.id, spare: true }, attributes: ['id'] })
  const taken = await Seat.count({ where: { rowId: spares.map((one) => one.id) } })
  return presentTable({
    round,
    sitting: { ...sitting.get({ plain: true }), endedAt: sitting.endedAt ?? null },
    seats,
    spareRows: spares.length - taken,
    now: context.now,
    youListen: access.seat !== null,
  })
}

export const showTable = async (context: Context, at: At): Promise<StewardTable> =>
  viewTable(context, await enterTable(context, at))

/** The seat of this sitting. @throws not_found */
export async function seatOf(access: TableAccess, id: string): Promise<Seat> {
  const seat = await Seat.findOne({ where: { id, sittingId: access.sitting.id }, lock: true })
  if (!seat) throw notFound()
  return seat
}

export async function setLeft(
  context: Context,
  at: At,
  seatId: string,
  left: boolean,
): Promise<StewardTable> {
  const access = await enterTable(context, at, true)
  const seat = await seatOf(access, seatId)
  // Two seats on one row would show two codes of one unit in each turn.
  if (
    !left &&
    seat.codeSet === 'served' &&
    (await Seat.count({ where: { rowId: seat.rowId, codeSet: 'takeover' } })) > 0
  )
    throw new ApiError('conflict', 'Somebody took this row over. Seat them anew as someone who came late.')
  if (Boolean(seat.leftAt) !== left) {
    await seat.update({ leftAt: left ? context.now : null })
    await putOnRecord(context, left ? 'listener left' : 'listener returned', {
      roundId: access.round.id,
      facts: { seat: seat.number },
    })
    await announce(context, { round: access.round.id, seat: { id: seat.id, number: seat.number } })
  }
  return viewTable(context, access)
}

export async function reportIncident(
  context: Context,
  at: At,
  incident: { kind: Incident['kind']; seat?: string | undefined; text: string },
): Promise<void> {
  const access = await enterTable(context, at)
  const seat = incident.seat ? await seatOf(access, incident.seat) : null
  await Incident.create({
    panelId: access.panel.id,
    id: context.deps.random.id(),
    roundId: access.round.id,
    sittingId: access.sitting.id,
    seatId: seat?.id ?? null,
    kind: incident.kind,
    text: incident.text,
    createdAt: context.now,
  })
}
