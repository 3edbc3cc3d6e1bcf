import { QueryTypes } from 'sequelize'
import type { PublicVerdict, VerdictDraft } from '#shared/contracts/verdicts.ts'
import { resultsOf } from '#server/features/analysis/service.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { enterRound, type RoundAccess } from '#server/features/rounds/access-service.ts'
import { ApiError, staleEdit } from '#server/http/api-error.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { VerdictDraft as StoredDraft } from '#server/models/verdict-draft.ts'
import { Verdict } from '#server/models/verdict.ts'
import { mayPublish } from '#server/policies/round.ts'
import { composeVerdict, sentencesOf } from './content-service.ts'
import { missingOf, presentUnit } from './presenter.ts'
import { dropPhoto, unitRows, writeFacts, writePhoto } from './units-service.ts'

interface At {
  panel: string
  round: string
}

async function enterDesk(context: Context, at: At): Promise<RoundAccess & { words: StoredDraft }> {
  const access = await enterRound(context, at.panel, at.round)
  permit(mayPublish(access.facts), { detail: 'A verdict is written once the round is closed.' })
  const { round } = access
  const [words] = await StoredDraft.findOrCreate({
    where: { roundId: round.id },
    defaults: { panelId: round.panelId, roundId: round.id },
  })
  return { ...access, words }
}

const newestOf = (roundId: string): Promise<Verdict | null> =>
  Verdict.findOne({ where: { roundId }, order: [['version', 'desc']] })

async function viewDesk(
  context: Context,
  { round, words }: { round: RoundAccess['round']; words: StoredDraft },
): Promise<VerdictDraft> {
  const done = await resultsOf(context, round)
  const units = await unitRows(round)
  const missing = missingOf(words, units)
  const newest = await newestOf(round.id)
  return {
    round: { id: round.id, title: round.title, status: round.status, version: round.version },
    label: done.label,
    labels: done.labels,
    headline: words.headline,
    summary: words.summary,
    sentences: sentencesOf(done),
    units: units.map(presentUnit),
    missing,
    published: newest
      ? { slug: newest.slug, version: newest.version, at: newest.publishedAt.toISOString() }
      : null,
    version: words.version,
    can: { publish: missing.length === 0 },
  }
}

export async function showDesk(context: Context, at: At): Promise<VerdictDraft> {
  return viewDesk(context, await enterDesk(context, at))
}

export async function saveWords(
  context: Context,
  at: At,
  body: { headline: string; summary: string },
): Promise<VerdictDraft> {
  const desk = await enterDesk(context, at)
  await desk.words.reload({ lock: true })
  if (context.version !== desk.words.version) throw staleEdit(await viewDesk(context, desk))
  await desk.words.update({ ...body, version: desk.words.version + 1 })
  return viewDesk(context, desk)
}

type Facts = Parameters<typeof writeFacts>[3]
export async function saveFacts(
  context: Context,
  at: At & { unit: string },
  facts: Facts,
): Promise<VerdictDraft> {
  const desk = await enterDesk(context, at)
  await writeFacts(context, desk.round, at.unit, facts)
  return viewDesk(context, desk)
}

export async function savePhoto(context: Context, at: At & { unit: string }): Promise<VerdictDraft> {
  const desk = await enterDesk(context, at)
  await writePhoto(context, desk.round, at.unit)
  return viewDesk(context, desk)
}

export async function removePhoto(context: Context, at: At & { unit: string }): Promise<VerdictDraft> {
  const desk = await enterDesk(context, at)
  await dropPhoto(desk.round, at.unit)
  return viewDesk(context, desk)
}

const slugOf = (title: string, number: number): string => {
  const plain = title
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60)
    .replace(/-+$/, '')
  return plain === '' ? `verdict-${number}` : `${plain}-${number}`
}

/** Publishes, or publishes a corrected version; earlier versions stay as they were. */
export async function publish(
  context: Context,
  at: At,
  correction: string,
): Promise<{ slug: string; version: number }> {
  const { panel, round, words } = await enterDesk(context, at)
  await round.reload({ lock: true })
  const missing = missingOf(words, await unitRows(round))
  if (missing.length > 0)
    throw new ApiError(
      'invalid',
      `Still asked: ${missing.map((one) => one.what.toLocaleLowerCase('en')).join(', ')}.`,
      { fields: Object.fromEntries(missing.map((one) => [one.field, 'Still asked before publishing.'])) },
    )
  const newest = await newestOf(round.id)
  if (newest && correction === '')
    throw new ApiError('invalid', 'Say what was wrong and what is right.', {
      fields: { correction: 'Say what was wrong and what is right.' },
    })
  const number = newest?.number ?? (await nextNumber(context))
  const version = (newest?.version ?? 0) + 1
  const slug = newest?.slug ?? slugOf(round.title, number)
  const before = newest ? (newest.content as PublicVerdict).corrections : []
  const corrections = newest
    ? [...before, { version, at: context.now.toISOString(), note: correction }]
    : before
  const content = await composeVerdict(context, panel, round, words, {
    slug,
    number,
    version,
    publishedAt: context.now,
    corrections,
  })
  await Verdict.create({
    panelId: panel.id,
    id: context.deps.random.id(),
    roundId: round.id,
    slug,
    number,
    version,
    content,
    correction,
    publishedAt: context.now,
  })
  await round.update({
    status: 'published',
    publishedAt: round.publishedAt ?? context.now,
    changedAt: context.now,
    version: round.version + 1,
  })
  await putOnRecord(context, 'verdict published', { roundId: round.id, facts: { version } })
  await announce(context, { round: round.id })
  return { slug, version }
}

async function nextNumber(context: Context): Promise<number> {
  const [row] = await context.deps.sequelize.query<{ number: string }>(
    `select nextval('verdict_numbers') as number`,
    { type: QueryTypes.SELECT },
  )
  return Number(row?.number)
}
