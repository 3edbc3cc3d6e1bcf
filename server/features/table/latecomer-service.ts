import type { StewardTable } from '#shared/contracts/table.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { addSeat } from '#server/features/rounds/open-service.ts'
import { ApiError, fieldError } from '#server/http/api-error.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { Member } from '#server/models/member.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { RowPlace } from '#server/models/row-place.ts'
import { Row } from '#server/models/row.ts'
import { Seat } from '#server/models/seat.ts'
import { Serving } from '#server/models/serving.ts'
import { enterTable, seatOf, viewTable, type At, type TableAccess } from './service.ts'

interface FreeRow {
  rowId: string
  codeSet: 'served' | 'takeover'
  afterTurn: number
  shift: number
}

async function rowOfLeaver(access: TableAccess, seatId: string): Promise<FreeRow> {
  const leaver = await seatOf(access, seatId)
  if (!leaver.leftAt) throw fieldError('insteadOf', 'This listener has not left.')
  if (
    leaver.codeSet === 'takeover' ||
    (await Seat.count({ where: { rowId: leaver.rowId, codeSet: 'takeover' } })) > 0
  )
    throw fieldError('insteadOf', 'Somebody took this row over already.')
  return { rowId: leaver.rowId, codeSet: 'takeover', afterTurn: access.sitting.turn, shift: 0 }
}

async function spareRow(access: TableAccess): Promise<FreeRow> {
  const spares = await Row.findAll({
    where: { roundId: access.round.id, spare: true },
    order: [['id', 'asc']],
    lock: true,
  })
  const taken = new Set(
    (await Seat.findAll({ where: { rowId: spares.map((one) => one.id) } })).map((one) => one.rowId),
  )
  const free = spares.find((one) => !taken.has(one.id))
  if (!free)
    throw new ApiError(
      'conflict',
      'No spare row is left. Somebody new can take the row of a listener who left.',
    )
  return {
    rowId: free.id,
    codeSet: 'served',
    afterTurn: access.sitting.turn,
    shift: await shiftOf(access, free.id),
  }
}

/**
 * A spare row drawn to run after the listeners' own turns starts when every turn already given out is over: in a turn
 * shared with a void serving two pouches could need one specimen, and the keeper's face would tell (B1).
 */
async function shiftOf(access: TableAccess, rowId: string): Promise<number> {
  const listeners = await Row.findAll({
    where: { roundId: access.round.id, spare: false },
    attributes: ['id'],
  })
  const drawn = await RowPlace.max<number, RowPlace>('turn', {
    where: { rowId: listeners.map((one) => one.id) },
  })
  const first = await RowPlace.min<number, RowPlace>('turn', { where: { rowId } })
  return first > drawn && first <= access.sitting.turns ? access.sitting.turns + 1 - first : 0
}

/** The member of this name, or a new one. @throws where they know the key */
async function personNamed(context: Context, access: TableAccess, name: string): Promise<Member> {
  const { panel, round } = access
  const known = (await Member.findAll({ where: { panelId: panel.id, removedAt: null } })).find(
    (one) =>
      !one.roles.includes('imported') &&
      one.displayName.toLocaleLowerCase('en') === name.toLocaleLowerCase('en'),
  )
  if (!known)
    return Member.create({
      panelId: panel.id,
      id: context.deps.random.id(),
      displayName: name,
      roles: ['panelist'],
      createdAt: context.now,
    })
  if (await RoundRole.count({ where: { roundId: round.id, memberId: known.id, role: 'keeper' } }))
    throw fieldError('name', 'Whoever tags the pouches knows the key and cannot listen.')
  if (await Seat.count({ where: { roundId: round.id, memberId: known.id } }))
    throw fieldError('name', 'Somebody of this name sits at the table already. Add an initial.')
  return known
}

/** Someone came late: they start at the next turn, on a spare row or on the row of someone who left, under its own codes. */
export async function addListener(
  context: Context,
  at: At,
  input: { name: string; insteadOf?: string | undefined },
): Promise<StewardTable> {
  const access = await enterTable(context, at, true)
  const { sitting, panel, round } = access
  if (sitting.endedAt) throw new ApiError('conflict', 'The sitting has ended.')
  const row = input.insteadOf ? await rowOfLeaver(access, input.insteadOf) : await spareRow(access)
  const member = await personNamed(context, access, input.name)
  await RoundRole.findOrCreate({
    where: { roundId: round.id, memberId: member.id, role: 'panelist' },
    defaults: {
      panelId: panel.id,
      id: context.deps.random.id(),
      roundId: round.id,
      memberId: member.id,
      role: 'panelist',
    },
  })
  const highest = await Seat.max<number, Seat>('number', { where: { sittingId: sitting.id } })
  const seat = await addSeat(context, sitting, {
    id: context.deps.random.id(),
    memberId: member.id,
    label: member.displayName,
    number: (highest ?? 0) + 1,
    ...row,
  })
  const last = await Serving.max<number, Serving>('turn', { where: { seatId: seat.id } })
  if ((last ?? 0) > sitting.turns) await sitting.update({ turns: last, version: sitting.version + 1 })
  await putOnRecord(context, 'listener came late', {
    roundId: round.id,
    facts: { seat: seat.number, takesOver: row.codeSet === 'takeover' },
  })
  await announce(context, { round: round.id })
  return viewTable(context, access)
}
