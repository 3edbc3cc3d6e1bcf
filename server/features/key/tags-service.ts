import { QueryTypes } from 'sequelize'
import type { Context } from '#server/http/context.ts'
import { withKey } from './with-key.ts'

export interface KeptPouch {
  servingId: string
  seatLabel: string
  seatNumber: number
  turn: number
  code: string
  state: string
  maker: string
  unit: string
}

/** Every pouch of a sitting with what it hides: for the keeper's eyes alone. Ask the policy first. */
export async function keeperPouches(
  context: Context,
  sitting: { panelId: string; id: string },
): Promise<KeptPouch[]> {
  const { sequelize } = context.deps
  const servings = await sequelize.query<Omit<KeptPouch, 'maker' | 'unit'> & { placeId: string }>(
    `select v.id as "servingId", s.label as "seatLabel", s.number as "seatNumber", v.turn, p.code, v.state, p.id as "placeId"
       from servings v join seats s on s.id = v.seat_id join row_places p on p.id = v.row_place_id
      where s.panel_id = $1 and s.sitting_id = $2 and s.left_at is null
      order by v.turn, s.number`,
    { bind: [sitting.panelId, sitting.id], type: QueryTypes.SELECT },
  )
  const units = await unitsOf(
    context,
    sitting.panelId,
    servings.map((one) => one.placeId),
  )
  return servings.map(({ placeId, ...rest }) => ({
    ...rest,
    ...(units.get(placeId) as { maker: string; unit: string }),
  }))
}

/** The reserve codes of the seats, for repeats after a void. */
export async function keeperReserves(
  context: Context,
  sitting: { panelId: string; id: string },
): Promise<Omit<KeptPouch, 'servingId' | 'state'>[]> {
  const { sequelize } = context.deps
  const places = await sequelize.query<{
    seatLabel: string
    seatNumber: number
    turn: number
    code: string
    placeId: string
  }>(
    `select s.label as "seatLabel", s.number as "seatNumber", p.turn, p.code, p.id as "placeId"
       from seats s join row_places p on p.row_id = s.row_id and p.code_set = 'reserve'
      where s.panel_id = $1 and s.sitting_id = $2 and s.left_at is null order by s.number, p.turn`,
    { bind: [sitting.panelId, sitting.id], type: QueryTypes.SELECT },
  )
  const units = await unitsOf(
    context,
    sitting.panelId,
    places.map((one) => one.placeId),
  )
  return places.map(({ placeId, ...rest }) => ({
    ...rest,
    ...(units.get(placeId) as { maker: string; unit: string }),
  }))
}

async function unitsOf(
  context: Context,
  panelId: string,
  placeIds: string[],
): Promise<Map<string, { maker: string; unit: string }>> {
  const found = await withKey(context, () =>
    context.deps.sequelize.query<{ placeId: string; maker: string; unit: string }>(
      `select k.row_place_id as "placeId", u.maker, u.name as unit from key_entries k join units u on u.id = k.unit_id
        where k.panel_id = $1 and k.row_place_id = any($2::uuid[])`,
      { bind: [panelId, placeIds], type: QueryTypes.SELECT },
    ),
  )
  return new Map(found.map(({ placeId, maker, unit }) => [placeId, { maker, unit }]))
}

/** The first half of a split key: units into lettered pouches. No code is read. */
export function lettersHalf(
  context: Context,
  round: { panelId: string; id: string },
): Promise<{ letter: string; maker: string; unit: string }[]> {
  return withKey(context, () =>
    context.deps.sequelize.query(
      `select l.letter, u.maker, u.name as unit from key_letters l join units u on u.id = l.unit_id
        where l.panel_id = $1 and l.round_id = $2 order by l.letter`,
      { bind: [round.panelId, round.id], type: QueryTypes.SELECT },
    ),
  )
}

/** The second half: codes over the letters. No unit is read. */
export function codesHalf(
  context: Context,
  round: { panelId: string; id: string },
): Promise<{ letter: string; code: string; reserve: string }[]> {
  return withKey(context, () =>
    context.deps.sequelize.query(
      `select letter, served as code, reserve from key_letters where panel_id = $1 and round_id = $2 order by letter`,
      { bind: [round.panelId, round.id], type: QueryTypes.SELECT },
    ),
  )
}
