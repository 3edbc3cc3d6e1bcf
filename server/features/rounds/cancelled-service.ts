import { QueryTypes } from 'sequelize'
import { keyFileText } from '#server/features/key/opened-service.ts'
import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import type { FileAnswer } from '#server/http/mount.ts'
import { Round } from '#server/models/round.ts'

/** A cancelled round publishes its key when no open round uses its units; until then the key stays shut. */
export async function keyIsPublic(context: Context, round: Pick<Round, 'id' | 'status'>): Promise<boolean> {
  if (round.status !== 'cancelled') return false
  const [row] = await context.deps.sequelize.query<{ busy: number }>(
    `select count(*)::int as busy from round_units mine
       join round_units other on other.unit_id = mine.unit_id and other.round_id <> mine.round_id
       join rounds r on r.id = other.round_id and r.status = 'open'
      where mine.round_id = $1`,
    { bind: [round.id], type: QueryTypes.SELECT },
  )
  return row?.busy === 0
}

export async function cancelledFile(
  context: Context,
  id: string,
  file: 'plan.json' | 'key.json',
): Promise<FileAnswer> {
  const round = await Round.findOne({ where: { id, origin: 'live', status: 'cancelled' } })
  if (!round || !round.openedAt || !(await keyIsPublic(context, round)))
    throw notFound('This round’s files are not public.')
  context.panelId = round.panelId
  const bytes = file === 'plan.json' ? (round.planFile ?? '') : await keyFileText(context, round, true)
  return { mediaType: 'application/json; charset=utf-8', bytes, name: file }
}
