import type { Tags } from '#shared/contracts/tags.ts'
import { codesHalf, keeperPouches, keeperReserves, lettersHalf } from '#server/features/key/tags-service.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { enterRound, type RoundAccess } from '#server/features/rounds/access-service.ts'
import { notFound, fieldError } from '#server/http/api-error.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { Seat } from '#server/models/seat.ts'
import { Serving } from '#server/models/serving.ts'
import { Sitting } from '#server/models/sitting.ts'
import { TagMark } from '#server/models/tag-mark.ts'
import { mayTag } from '#server/policies/round.ts'
import { presentCodes, presentKeeper, presentLetters } from './presenter.ts'

interface At {
  panel: string
  round: string
  sitting: string
}

async function enterTags(context: Context, at: At): Promise<RoundAccess & { sitting: Sitting }> {
  const access = await enterRound(context, at.panel, at.round)
  permit(mayTag(access.facts), {
    detail: 'Only whoever tags the pouches sees this page, while the round is open.',
  })
  const sitting = await Sitting.findOne({ where: { id: at.sitting, roundId: access.round.id } })
  if (!sitting) throw notFound()
  return { ...access, sitting }
}

const marksOf = async (roundId: string, part: 'letters' | 'codes'): Promise<Set<string>> =>
  new Set((await TagMark.findAll({ where: { roundId, part } })).map((one) => one.letter))

/** The keeper's whole key, or one half of a split key; nobody gets both halves (B6). */
export async function showTags(context: Context, at: At): Promise<Tags> {
  const { round, sitting, roles } = await enterTags(context, at)
  if (roles.includes('keeper')) {
    const [pouches, reserves] = [
      await keeperPouches(context, sitting),
      await keeperReserves(context, sitting),
    ]
    return presentKeeper(sitting, pouches, reserves)
  }
  if (roles.includes('letters'))
    return presentLetters(await lettersHalf(context, round), await marksOf(round.id, 'letters'))
  return presentCodes(await codesHalf(context, round), await marksOf(round.id, 'codes'))
}

/** "Tagged": pressing it twice is the same as once. */
export async function markTagged(
  context: Context,
  at: At,
  what: { serving?: string | undefined; letter?: string | undefined },
): Promise<void> {
  const { round, sitting, roles } = await enterTags(context, at)
  if (roles.includes('keeper')) await tagServing(context, round.id, sitting.id, what.serving)
  else await markLetter(context, round, roles.includes('letters') ? 'letters' : 'codes', what.letter)
}

async function tagServing(
  context: Context,
  roundId: string,
  sittingId: string,
  id: string | undefined,
): Promise<void> {
  const serving = id ? await Serving.findByPk(id, { lock: true }) : null
  const seat = serving && (await Seat.findOne({ where: { id: serving.seatId, sittingId } }))
  if (!serving || !seat) throw fieldError('serving', 'This pouch is not of this sitting.')
  if (serving.state !== 'waiting') return
  await serving.update({ state: 'tagged', version: serving.version + 1 })
  await announce(context, { round: roundId })
}

async function markLetter(
  context: Context,
  round: { panelId: string; id: string },
  part: 'letters' | 'codes',
  letter: string | undefined,
): Promise<void> {
  const known = part === 'letters' ? await lettersHalf(context, round) : await codesHalf(context, round)
  if (!letter || !known.some((one) => one.letter === letter))
    throw fieldError('letter', 'There is no pouch with this letter.')
  await TagMark.findOrCreate({
    where: { roundId: round.id, part, letter },
    defaults: { panelId: round.panelId, roundId: round.id, part, letter, markedAt: context.now },
  })
  await putOnRecord(context, 'pouch marked', { roundId: round.id, facts: { part, letter } })
  await announce(context, { round: round.id })
}
