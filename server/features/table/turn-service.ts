import { Op } from 'sequelize'
import type { StewardTable } from '#shared/contracts/table.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { ApiError } from '#server/http/api-error.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { Incident } from '#server/models/incident.ts'
import { RowPlace } from '#server/models/row-place.ts'
import { Seat } from '#server/models/seat.ts'
import { Serving } from '#server/models/serving.ts'
import { enterTable, viewTable, type At } from './service.ts'

/**
 * Goes on from turn `from` to the next. A press that comes too late (another steward, a double click) changes nothing.
 * What was not sent is missed, unless a phone that was away still brings it; nothing stops.
 */
export async function nextTurn(context: Context, at: At, from: number): Promise<StewardTable> {
  const access = await enterTable(context, at, true)
  const { sitting } = access
  if (sitting.turn !== from || sitting.endedAt) return viewTable(context, access)
  const turn = from + 1
  const seats = await Seat.findAll({ where: { sittingId: sitting.id } })
  await Serving.update(
    { state: 'missed' },
    {
      where: {
        seatId: seats.map((seat) => seat.id),
        turn: { [Op.lt]: turn },
        state: ['handed', 'confirmed', 'waiting', 'tagged'],
      },
    },
  )
  const present = seats.filter((seat) => !seat.leftAt).map((seat) => seat.id)
  await Serving.update(
    { state: 'handed', handedAt: context.now },
    { where: { seatId: present, turn, state: ['waiting', 'tagged'] } },
  )
  const over = turn > sitting.turns
  await sitting.update({
    turn,
    version: sitting.version + 1,
    ...(from === 0 ? { startedAt: context.now } : {}),
    ...(over ? { endedAt: context.now } : {}),
  })
  await putOnRecord(context, over ? 'sitting ended' : 'next turn', {
    roundId: access.round.id,
    facts: { turn },
  })
  await announce(context, { round: access.round.id })
  return viewTable(context, access)
}

/**
 * Voids a serving. It comes back at the end under its reserve code, in a turn of its own: a shared turn would tell that
 * two void servings hid different units.
 */
export async function voidServing(
  context: Context,
  at: At,
  input: { serving: string; version: number; reason: string },
): Promise<StewardTable> {
  const access = await enterTable(context, at, true)
  const { sitting, panel } = access
  const serving = await Serving.findByPk(input.serving, { lock: true })
  const seat = serving && (await Seat.findOne({ where: { id: serving.seatId, sittingId: sitting.id } }))
  if (!serving || !seat) throw new ApiError('not_found', 'This serving is not of this table.')
  if (serving.state === 'void') return viewTable(context, access)
  if (serving.version !== input.version || (serving.state !== 'handed' && serving.state !== 'confirmed'))
    throw new ApiError('conflict', 'This serving has changed meanwhile. Look again before you void it.', {
      current: await viewTable(context, access),
    })
  await serving.update({
    state: 'void',
    voidedAt: context.now,
    voidReason: input.reason,
    version: serving.version + 1,
  })
  await Incident.create({
    panelId: panel.id,
    id: context.deps.random.id(),
    roundId: access.round.id,
    sittingId: sitting.id,
    seatId: seat.id,
    servingId: serving.id,
    kind: 'void',
    text: input.reason,
    createdAt: context.now,
  })
  const reserve = await RowPlace.findOne({
    where: { rowId: seat.rowId, codeSet: 'reserve', position: serving.position },
  })
  if (reserve && (await Serving.count({ where: { rowPlaceId: reserve.id } })) === 0) {
    const turn = sitting.turns + 1
    await Serving.create({
      panelId: panel.id,
      id: context.deps.random.id(),
      seatId: seat.id,
      rowPlaceId: reserve.id,
      turn,
      position: serving.position,
      state: 'waiting',
      repeatsServingId: serving.id,
    })
    await sitting.update({ turns: turn, version: sitting.version + 1 })
  }
  await putOnRecord(context, 'serving void', {
    roundId: access.round.id,
    facts: { seat: seat.number, turn: serving.turn },
  })
  await announce(context, { round: access.round.id })
  return viewTable(context, access)
}
