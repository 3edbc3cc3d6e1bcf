import { QueryTypes } from 'sequelize'
import { isRevealed } from '#shared/domain/round-status.ts'
import type { Context } from '#server/http/context.ts'
import { RoundSecret } from '#server/models/round-secret.ts'
import type { Round } from '#server/models/round.ts'
import { disclose } from './cipher.ts'
import { withKey } from './with-key.ts'

export interface OpenedPlace {
  placeId: string
  unitId: string
  code: string
  position: number
  rowId: string
  codeSet: 'served' | 'takeover' | 'reserve'
}

export interface OpenedKey {
  places: OpenedPlace[]
  /** Number in the public file by `${rowId} ${served|takeover}`; a reserve place belongs to its seat's own set. */
  listenerNumbers: Map<string, number>
}

/** What the codes hid. @throws while the round is open: no path may open the key before closing (B1). */
export async function openedKey(context: Context, round: Round): Promise<OpenedKey> {
  if (!isRevealed(round.status) || round.origin !== 'live')
    throw new Error('The key opens when the round closes.')
  const { sequelize } = context.deps
  return withKey(context, async () => {
    const places = await sequelize.query<OpenedPlace>(
      `select p.id as "placeId", k.unit_id as "unitId", p.code, p.position, p.row_id as "rowId", p.code_set as "codeSet"
         from key_entries k join row_places p on p.id = k.row_place_id join rows w on w.id = p.row_id
        where w.panel_id = $1 and w.round_id = $2`,
      { bind: [round.panelId, round.id], type: QueryTypes.SELECT },
    )
    const numbers = await sequelize.query<{ rowId: string; codeSet: string; number: number }>(
      `select row_id as "rowId", code_set as "codeSet", number from key_listeners where panel_id = $1 and round_id = $2`,
      { bind: [round.panelId, round.id], type: QueryTypes.SELECT },
    )
    return {
      places,
      listenerNumbers: new Map(numbers.map((one) => [`${one.rowId} ${one.codeSet}`, one.number])),
    }
  })
}

/**
 * The key file's exact text. @throws before closing; for a cancelled round only where `cancelledMayOpen` says that no
 * open round uses its units.
 */
export async function keyFileText(context: Context, round: Round, cancelledMayOpen = false): Promise<string> {
  if (!isRevealed(round.status) && !(round.status === 'cancelled' && cancelledMayOpen))
    throw new Error('The key opens when the round closes.')
  const secret = await withKey(context, () =>
    RoundSecret.findOne({ where: { panelId: round.panelId, roundId: round.id } }),
  )
  if (!secret) throw new Error('This round has no key.')
  return disclose(context.deps, `key ${round.id}`, secret.keyCipher)
}
