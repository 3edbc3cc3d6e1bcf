import { drawRound } from '#shared/allocation/draw.ts'
import { keyFile, planFile } from '#shared/allocation/key-files.ts'
import { limits } from '#shared/domain/limits.ts'
import type { Draw, KeyUnit, PlanContent } from '#shared/allocation/types.ts'
import { ApiError } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { KeyEntry } from '#server/models/key-entry.ts'
import { KeyLetter } from '#server/models/key-letter.ts'
import { KeyListener } from '#server/models/key-listener.ts'
import { RoundSecret } from '#server/models/round-secret.ts'
import { Round } from '#server/models/round.ts'
import { RowPlace } from '#server/models/row-place.ts'
import { Row } from '#server/models/row.ts'
import { conceal } from './cipher.ts'
import { codeHistory } from './history.ts'
import { withKey } from './with-key.ts'

export interface Drawn {
  planText: string
  planFingerprint: string
  keyFingerprint: string
  turns: number
  /** Which row the draw gave to each seat. */
  seats: { seatRef: string; rowId: string }[]
}

/** Shuffles with the system's randomness, so that the order of insertion tells nothing. */
function shuffled<T>(context: Context, list: readonly T[]): T[] {
  return list
    .map((item) => ({ item, at: context.deps.random.bytes(8).toString('hex') }))
    .sort((a, b) => (a.at < b.at ? -1 : 1))
    .map(({ item }) => item)
}

async function previousKey(round: { panelId: string; id: string }): Promise<string | null> {
  const before = await Round.findAll({
    where: { panelId: round.panelId, origin: 'live' },
    attributes: ['id', 'keyFingerprint', 'openedAt'],
  })
  const opened = before.filter((one) => one.id !== round.id && one.openedAt !== null && one.keyFingerprint)
  opened.sort((a, b) => (b.openedAt as Date).getTime() - (a.openedAt as Date).getTime())
  return opened[0]?.keyFingerprint ?? null
}

/**
 * Draws rows and codes from a fresh seed, writes plan and key, stores the key encrypted and returns the fingerprints.
 * @throws conflict where the panel's history leaves too few codes
 */
export async function drawAndSeal(
  context: Context,
  input: {
    panelId: string
    roundId: string
    units: readonly KeyUnit[]
    seats: readonly { seatRef: string; memberId: string | null }[]
    split: boolean
    versions: Record<string, string>
    plan: Omit<PlanContent, 'design'>
  },
): Promise<Drawn> {
  const { panelId, roundId } = input
  const seed = context.deps.random.bytes(32).toString('hex')
  const nonce = context.deps.random.bytes(32).toString('hex')
  const history = await codeHistory(
    context,
    { panelId, id: roundId, unitIds: input.units.map((unit) => unit.id) },
    input.seats,
  )
  const result = drawRound({
    seed,
    scheme: 'scrim-draw-1',
    mode: 'turns',
    units: input.units.map(({ id }) => ({ id })),
    seats: input.seats.map(({ seatRef }) => ({ seatRef })),
    spares: limits.spareRows,
    codePolicy: input.split ? 'split' : 'per-seat',
    history,
  })
  if (!result.ok)
    throw new ApiError(
      'conflict',
      `There are not enough codes left. ${result.detail} Publish or cancel earlier rounds with these units first.`,
    )
  const { draw } = result
  const time = context.now.toISOString()
  const design = {
    mode: 'turns',
    units: input.units.length,
    listeners: input.seats.length,
    spares: draw.spares,
    turns: draw.turns,
    codePolicy: draw.codePolicy,
  } as const
  const plan = planFile({
    round: roundId,
    time,
    nonce,
    versions: input.versions,
    plan: { ...input.plan, design } as PlanContent,
  })
  const key = keyFile({
    round: roundId,
    time,
    nonce,
    seed,
    versions: input.versions,
    planDigest: plan.planDigest,
    units: [...input.units],
    draw,
    history,
    previousKey: await previousKey({ panelId, id: roundId }),
  })
  const rowIds = await storeDraw(context, panelId, roundId, draw)
  await withKey(context, () =>
    RoundSecret.create({
      panelId,
      roundId,
      seedCipher: conceal(context.deps, `seed ${roundId}`, seed),
      nonceCipher: conceal(context.deps, `nonce ${roundId}`, nonce),
      keyCipher: conceal(context.deps, `key ${roundId}`, key.text),
    }),
  )
  return {
    planText: plan.text,
    planFingerprint: plan.fingerprint,
    keyFingerprint: key.fingerprint,
    turns: draw.turns,
    seats: draw.seats.map(({ seatRef, listener }) => ({ seatRef, rowId: rowIds.get(listener) as string })),
  }
}

async function storeDraw(
  context: Context,
  panelId: string,
  roundId: string,
  draw: Draw,
): Promise<Map<number, string>> {
  const rows = draw.rows.map((row) => ({ ...row, id: context.deps.random.id() }))
  const places = rows.flatMap((row) =>
    row.places.flatMap((place) =>
      (['served', 'takeover', 'reserve'] as const).map((codeSet) => ({
        id: context.deps.random.id(),
        rowId: row.id,
        codeSet,
        turn: place.turn,
        position: place.position,
        code: String(place.codes[codeSet]),
        unitId: place.unit,
      })),
    ),
  )
  await Row.bulkCreate(shuffled(context, rows).map(({ id, spare }) => ({ panelId, id, roundId, spare })))
  await RowPlace.bulkCreate(
    shuffled(context, places).map(({ unitId: _unit, ...place }) => ({ panelId, ...place })),
  )
  const numbers = rows.flatMap((row) => [
    { rowId: row.id, codeSet: 'served' as const, number: row.listener },
    { rowId: row.id, codeSet: 'takeover' as const, number: row.takeoverListener },
  ])
  await withKey(context, async () => {
    await KeyEntry.bulkCreate(
      shuffled(context, places).map(({ id, unitId }) => ({ panelId, rowPlaceId: id, unitId })),
    )
    await KeyListener.bulkCreate(shuffled(context, numbers).map((one) => ({ panelId, roundId, ...one })))
    if (draw.letters.length > 0)
      await KeyLetter.bulkCreate(
        shuffled(context, draw.letters).map(({ letter, unit, codes }) => ({
          panelId,
          roundId,
          letter,
          unitId: unit,
          served: String(codes.served),
          reserve: String(codes.reserve),
        })),
      )
  })
  return new Map(rows.map((row) => [row.listener, row.id]))
}
