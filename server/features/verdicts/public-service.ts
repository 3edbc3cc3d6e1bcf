import { Op } from 'sequelize'
import type { PublicVerdict, VerdictLine } from '#shared/contracts/verdicts.ts'
import { FEWEST_FOR_FIGURES, panelLabel } from '#shared/domain/panel-label.ts'
import { keyFileText } from '#server/features/key/opened-service.ts'
import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import type { FileAnswer } from '#server/http/mount.ts'
import { Member } from '#server/models/member.ts'
import { Photo } from '#server/models/photo.ts'
import { RoundUnit } from '#server/models/round-unit.ts'
import { Round } from '#server/models/round.ts'
import { Unit } from '#server/models/unit.ts'
import { Verdict } from '#server/models/verdict.ts'
import { mayRunPanel } from '#server/policies/panel.ts'
import { dictionary } from './data-dictionary.ts'
import { presentLine } from './presenter.ts'

/** Like a journal's contents, newest first; informal rounds are reached by their link alone. */
export async function listVerdicts(context: Context): Promise<VerdictLine[]> {
  const all = await Verdict.findAll({
    order: [
      ['number', 'desc'],
      ['version', 'desc'],
    ],
    limit: 400,
  })
  context.panelId = undefined
  const newest = all.filter((one, index) => all.findIndex((other) => other.number === one.number) === index)
  return newest
    .map((one) => one.content as PublicVerdict)
    .filter((content) => panelLabel([content.label.fewest]).verdictSentence)
    .map(presentLine)
}

async function newest(slug: string, version?: number): Promise<Verdict> {
  const found = await Verdict.findOne({
    where: { slug, ...(version === undefined ? {} : { version }) },
    order: [['version', 'desc']],
  })
  if (!found) throw notFound('There is no verdict at this address.')
  return found
}

/** The verdict as it was published; an older version carries the corrections that came after it. */
export async function showVerdict(slug: string, version?: number): Promise<PublicVerdict> {
  const shown = await newest(slug, version)
  const latest = version === undefined ? shown : await newest(slug)
  return { ...(shown.content as PublicVerdict), corrections: (latest.content as PublicVerdict).corrections }
}

export async function verdictFile(context: Context, slug: string, file: string): Promise<FileAnswer> {
  const verdict = await newest(slug)
  const content = verdict.content as PublicVerdict
  const round = await Round.findByPk(verdict.roundId)
  if (!round || !content.files.some((one) => one.name === file))
    throw notFound('This verdict has no such file.')
  context.panelId = round.panelId
  if (file === 'plan.json')
    return { mediaType: 'application/json; charset=utf-8', bytes: round.planFile ?? '', name: file }
  if (file === 'key.json')
    return {
      mediaType: 'application/json; charset=utf-8',
      bytes: await keyFileText(context, round),
      name: file,
    }
  if (content.label.fewest < FEWEST_FOR_FIGURES) throw notFound()
  if (file === 'ratings.csv')
    return { mediaType: 'text/csv; charset=utf-8', bytes: round.ratingsFile ?? '', name: file }
  return { mediaType: 'text/plain; charset=utf-8', bytes: dictionary(content), name: file }
}

/** A photograph: for everybody once a verdict with its unit is out; before, only for who runs the panel. */
export async function photoFile(context: Context, id: string): Promise<FileAnswer> {
  const photo = await Photo.findByPk(id)
  const unit = photo && (await Unit.findOne({ where: { photoId: id } }))
  if (!photo || !unit) throw notFound()
  const rounds = (await RoundUnit.findAll({ where: { unitId: unit.id } })).map((one) => one.roundId)
  const published = await Round.count({ where: { id: rounds, status: 'published' } })
  const open = await Round.count({ where: { id: { [Op.in]: rounds }, status: 'open' } })
  const member =
    context.actor.userId === null
      ? null
      : await Member.findOne({
          where: { panelId: photo.panelId, userId: context.actor.userId, removedAt: null },
        })
  const runs = member !== null && mayRunPanel({ roles: member.roles })
  if (published === 0 && (!runs || open > 0)) throw notFound()
  return { mediaType: photo.mediaType, bytes: photo.bytes, immutable: published > 0 }
}
