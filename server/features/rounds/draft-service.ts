import type { EveningDraft } from '#shared/contracts/evening-draft.ts'
import { lexiconEntry, liking } from '#shared/domain/lexicon.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { ApiError, fieldError } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { Descriptor } from '#server/models/descriptor.ts'
import { Member } from '#server/models/member.ts'
import { RoundRole } from '#server/models/round-role.ts'
import { RoundUnit } from '#server/models/round-unit.ts'
import { Round } from '#server/models/round.ts'
import { Scorecard } from '#server/models/scorecard.ts'
import { Unit } from '#server/models/unit.ts'
import { blindingOf, rolesOf } from './plan.ts'

/** Drafts an evening for the panel; the person who drafts it organises it. */
export async function draftEvening(
  context: Context,
  at: { panelId: string; member: Member },
  draft: EveningDraft,
): Promise<Round> {
  const scorecardId = await writeScorecard(context, at.panelId, draft)
  const newest = await Round.max<number, Round>('number', { where: { panelId: at.panelId } })
  const round = await Round.create({
    panelId: at.panelId,
    id: context.deps.random.id(),
    number: (newest ?? 0) + 1,
    title: draft.title,
    question: draft.question,
    status: 'draft',
    origin: 'live',
    blinding: blindingOf(draft),
    mode: 'evening',
    scorecardId,
    primaryDescriptor: draft.primaryDescriptor,
    plan: draft,
    publishesRows: draft.publishesRows,
    createdAt: context.now,
    changedAt: context.now,
  })
  await fill(context, round, at.member, draft)
  await putOnRecord(context, 'round drafted', { roundId: round.id })
  return round
}

/** Writes a draft anew; the version has been compared already. */
export async function redraftEvening(
  context: Context,
  round: Round,
  member: Member,
  draft: EveningDraft,
): Promise<void> {
  const scorecardId = await writeScorecard(context, round.panelId, draft)
  await RoundUnit.destroy({ where: { roundId: round.id } })
  await RoundRole.destroy({ where: { roundId: round.id } })
  await round.update({
    title: draft.title,
    question: draft.question,
    blinding: blindingOf(draft),
    scorecardId,
    primaryDescriptor: draft.primaryDescriptor,
    plan: draft,
    publishesRows: draft.publishesRows,
    changedAt: context.now,
    version: round.version + 1,
  })
  await fill(context, round, member, draft)
}

async function writeScorecard(context: Context, panelId: string, draft: EveningDraft): Promise<string> {
  const id = context.deps.random.id()
  await Scorecard.create({ panelId, id, name: 'Evening', createdAt: context.now })
  const entries = [
    liking,
    ...draft.scorecard.map((key) => lexiconEntry(key)).filter((entry) => entry !== undefined),
  ]
  await Descriptor.bulkCreate(
    entries.map((entry, place) => ({
      panelId,
      id: context.deps.random.id(),
      scorecardId: id,
      place,
      key: entry.key,
      name: entry.name,
      sentence: entry.sentence,
      family: entry.family,
      scaleLow: 0,
      scaleHigh: 100,
      step: 1,
      sided: entry.sided,
      lowWords: entry.low,
      middleWords: entry.middle,
      highWords: entry.high,
    })),
  )
  return id
}

async function fill(context: Context, round: Round, member: Member, draft: EveningDraft): Promise<void> {
  const unitIds = await unitsByName(context, round.panelId, draft.units)
  await RoundUnit.bulkCreate(unitIds.map((unitId) => ({ panelId: round.panelId, roundId: round.id, unitId })))
  const yous = draft.people.filter((one) => one.you)
  if (yous.length > 1) throw fieldError('people', 'Only one of these people is you.')
  const held = new Map<string, Set<string>>()
  const hold = (memberId: string, roles: readonly string[]): void => {
    const set = held.get(memberId) ?? new Set()
    roles.forEach((role) => set.add(role))
    held.set(memberId, set)
  }
  hold(member.id, ['organiser'])
  for (const person of draft.people) {
    const memberId = person.you
      ? member.id
      : await memberByName(context, round.panelId, person.name, member.id)
    hold(memberId, rolesOf(person))
  }
  await RoundRole.bulkCreate(
    [...held].flatMap(([memberId, roles]) =>
      [...roles].map((role) => ({
        panelId: round.panelId,
        id: context.deps.random.id(),
        roundId: round.id,
        memberId,
        role: role as RoundRole['role'],
      })),
    ),
  )
}

const same = (a: string, b: string): boolean => a.toLocaleLowerCase('en') === b.toLocaleLowerCase('en')

/** A unit named before in this panel is the same specimen; two specimens of a model carry different names. */
async function unitsByName(
  context: Context,
  panelId: string,
  wanted: EveningDraft['units'],
): Promise<string[]> {
  const known = await Unit.findAll({ where: { panelId } })
  const ids: string[] = []
  for (const { maker, name } of wanted) {
    const found = known.find((unit) => same(unit.maker, maker) && same(unit.name, name))
    const unit =
      found ??
      (await Unit.create({ panelId, id: context.deps.random.id(), maker, name, createdAt: context.now }))
    ids.push(unit.id)
  }
  return ids
}

async function memberByName(
  context: Context,
  panelId: string,
  name: string,
  besides: string,
): Promise<string> {
  const members = await Member.findAll({ where: { panelId, removedAt: null } })
  const found = members.find(
    (one) => one.id !== besides && !one.roles.includes('imported') && same(one.displayName, name),
  )
  if (found) return found.id
  const made = await Member.create({
    panelId,
    id: context.deps.random.id(),
    displayName: name,
    roles: ['panelist'],
    createdAt: context.now,
  })
  return made.id
}

/** Refuses a change to anything but a draft. */
export function mustBeDraft(round: Round): void {
  if (round.status !== 'draft')
    throw new ApiError('conflict', 'The plan froze when the round opened. It cannot change any more.')
}
