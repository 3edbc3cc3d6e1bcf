import type { ImportPreview } from '#shared/contracts/imports.ts'
import { parseRatingsFile, type RatingsFile } from '#shared/domain/ratings-file.ts'
import { fixRatingsFile } from '#server/features/analysis/ratings-file-service.ts'
import { enterPanel } from '#server/features/panels/access-service.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { ApiError, fieldError } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { ImportedRating } from '#server/models/imported-rating.ts'
import { Member } from '#server/models/member.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { RoundUnit } from '#server/models/round-unit.ts'
import { Round } from '#server/models/round.ts'
import { Unit } from '#server/models/unit.ts'
import { mayStartRound } from '#server/policies/panel.ts'
import { importScorecard } from './scorecard-service.ts'

const mostFaultsShown = 200

export async function previewImport(
  context: Context,
  panelSlug: string,
  text: string,
): Promise<ImportPreview> {
  const { member } = await enterPanel(context, panelSlug)
  permit(mayStartRound({ roles: member.roles }))
  const file = parseRatingsFile(text)
  return {
    rows: file.rows.length,
    panelists: file.panelists.length,
    units: [...file.units],
    descriptors: file.ranges.map(({ name, low, high }) => ({ name, low, high })),
    missing: file.rows.filter((row) => row.score === null).length,
    faults: file.problems
      .slice(0, mostFaultsShown)
      .map(({ line, column, reason, text: told }) => ({ line, column, reason, text: told })),
    faultCount: file.problems.length,
  }
}

/** Nothing is stored unless every row is well or the person says to leave the others out. */
function readAll(text: string, leaveOutFaults: boolean): RatingsFile {
  const file = parseRatingsFile(text)
  const count = file.problems.length
  if (count > 0 && !leaveOutFaults)
    throw fieldError(
      'text',
      `${count === 1 ? 'One row is' : `${count} rows are`} not as they should be, first in line ${file.problems[0]?.line}. Mend them, or leave them out.`,
    )
  if (file.rows.length === 0) throw fieldError('text', file.problems[0]?.text ?? 'No row could be read.')
  if (file.units.length < 2) throw fieldError('text', 'A comparison needs at least two units.')
  if (file.units.length > 60) throw fieldError('text', 'More than 60 units in one round cannot be shown.')
  if (file.descriptors.length > 40)
    throw fieldError('text', 'More than 40 descriptors in one round cannot be shown.')
  return file
}

/** Stores a ratings file as a closed round without a key; it keeps its label for good. */
export async function storeImport(
  context: Context,
  panelSlug: string,
  body: {
    title: string
    question: string
    text: string
    leaveOutFaults: boolean
    primaryDescriptor?: string | undefined
  },
): Promise<string> {
  const { panel, member } = await enterPanel(context, panelSlug)
  permit(mayStartRound({ roles: member.roles }))
  const file = readAll(body.text, body.leaveOutFaults)
  const primary = body.primaryDescriptor ?? file.descriptors[0] ?? ''
  if (!file.descriptors.includes(primary))
    throw new ApiError('invalid', 'The primary descriptor is not in the file.', {
      fields: { primaryDescriptor: 'Choose one of the file’s descriptors.' },
    })
  const { scorecardId, idOf, keyOf } = await importScorecard(context, panel.id, file)
  const newest = await Round.max<number, Round>('number', { where: { panelId: panel.id } })
  const round = await Round.create({
    panelId: panel.id,
    id: context.deps.random.id(),
    number: (newest ?? 0) + 1,
    title: body.title,
    question: body.question,
    status: 'closed',
    origin: 'imported',
    blinding: 'imported',
    mode: 'full',
    scorecardId,
    primaryDescriptor: keyOf.get(primary) ?? '',
    plan: {},
    createdAt: context.now,
    changedAt: context.now,
    closedAt: context.now,
  })
  await RoundRole.create({
    panelId: panel.id,
    id: context.deps.random.id(),
    roundId: round.id,
    memberId: member.id,
    role: 'organiser',
  })
  await storeRatings(context, round, file, idOf)
  await fixRatingsFile(context, round)
  await putOnRecord(context, 'ratings imported', {
    roundId: round.id,
    facts: { rows: file.rows.length, leftOut: file.problems.length },
  })
  return round.id
}

async function storeRatings(
  context: Context,
  round: Round,
  file: RatingsFile,
  descriptorId: Map<string, string>,
): Promise<void> {
  const { panelId } = round
  const newId = (): string => context.deps.random.id()
  const units = file.units.map((name) => ({ panelId, id: newId(), maker: '', name, createdAt: context.now }))
  const members = file.panelists.map((name) => ({
    panelId,
    id: newId(),
    displayName: name,
    roles: ['imported'],
    createdAt: context.now,
  }))
  await Unit.bulkCreate(units)
  await Member.bulkCreate(members)
  await RoundUnit.bulkCreate(units.map(({ id }) => ({ panelId, roundId: round.id, unitId: id })))
  const unitId = new Map(units.map(({ name, id }) => [name, id]))
  const memberId = new Map(members.map(({ displayName, id }) => [displayName, id]))
  const numbers = drawnNumbers(context, file.panelists)
  const rows = file.rows.map((row) => ({
    panelId,
    id: newId(),
    roundId: round.id,
    memberId: memberId.get(row.panelist) as string,
    listener: numbers.get(row.panelist) as number,
    unitId: unitId.get(row.unit) as string,
    descriptorId: descriptorId.get(row.descriptor) as string,
    replicate: row.replicate,
    position: row.position,
    value: row.score,
    cantTell: row.cantTell,
  }))
  for (let from = 0; from < rows.length; from += 2000)
    await ImportedRating.bulkCreate(rows.slice(from, from + 2000))
}

/** Listener numbers in an order of chance: names stay in the panel. */
function drawnNumbers(context: Context, panelists: readonly string[]): Map<string, number> {
  const shuffled = panelists
    .map((name) => ({ name, at: context.deps.random.bytes(8).toString('hex') }))
    .sort((a, b) => (a.at < b.at ? -1 : 1))
  return new Map(shuffled.map(({ name }, index) => [name, index + 1]))
}
