import { Transaction } from 'sequelize'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { timing } from '#shared/domain/timing.ts'
import { describeRound } from '#server/features/rounds/listener-service.ts'
import { ApiError } from '#server/http/api-error.ts'
import { announce } from '#server/http/changes.ts'
import type { Context } from '#server/http/context.ts'
import { Descriptor } from '#server/models/descriptor.ts'
import { Rating } from '#server/models/rating.ts'
import type { Serving } from '#server/models/serving.ts'
import { Submission } from '#server/models/submission.ts'
import { enterSeat, type SeatAccess } from './access-service.ts'
import { lockServing, viewSeat } from './service.ts'

interface Answer {
  descriptor: string
  value: number | null
  cantTell: boolean
}
type Outcome = 'taken' | 'late' | 'void'

/** Every line of the scorecard once, each a step of its own scale or "can't tell". */
async function checkAnswers(access: SeatAccess, answers: readonly Answer[]): Promise<void> {
  const { scorecard } = await describeRound(access.round)
  const fields: Record<string, string> = {}
  answers.forEach((answer, index) => {
    const descriptor = scorecard.find((one) => one.key === answer.descriptor)
    if (!descriptor) fields[`answers.${index}`] = 'Not on this scorecard.'
    else if (answers.findIndex((one) => one.descriptor === answer.descriptor) !== index)
      fields[`answers.${index}`] = 'Answered twice.'
    else if (answer.value !== null) {
      const { low, high, step } = descriptor.scale
      const steps = (answer.value - low) / step
      if (answer.value < low || answer.value > high || Math.abs(steps - Math.round(steps)) > 1e-9)
        fields[`answers.${index}`] = `Between ${low} and ${high}.`
    }
  })
  const open = scorecard.filter((one) => !answers.some((answer) => answer.descriptor === one.key))
  if (open.length > 0) fields['answers'] = `Not answered yet: ${open.map((one) => one.name).join(', ')}.`
  if (Object.keys(fields).length > 0)
    throw new ApiError('invalid', 'Every line needs an answer; “I can’t tell” is one.', { fields })
}

/** What happens to a submission that arrives now. It is kept in every case; only `taken` counts. */
function outcomeOf(access: SeatAccess, serving: Serving): Outcome {
  if (serving.state === 'void') return 'void'
  if (access.round.status !== 'open') return 'late'
  // A turn that went on without this phone: the pouch was confirmed then, so what was rated then still counts.
  if (serving.state === 'confirmed' || (serving.state === 'missed' && serving.confirmedAt)) return 'taken'
  throw new ApiError('conflict', 'Type the digits on the pouch first.')
}

/**
 * Takes one serving's ratings. The same key again is the same submission; another one after it is refused: a submitted
 * serving never changes silently (B5).
 */
export async function submit(
  context: Context,
  at: { seat: string; serving: string },
  body: { answers: readonly Answer[]; remark: string },
): Promise<{ outcome: Outcome; seat: PanelistSeat }> {
  const access = await enterSeat(context, at.seat)
  const key = context.idempotencyKey
  if (!key) throw new ApiError('malformed', 'A submission carries an Idempotency-Key.')
  const serving = await lockServing(access.seat.id, at.serving)
  await access.round.reload({ lock: Transaction.LOCK.SHARE }) // closing waits for this, or this sees that it closed
  const before = await Submission.findOne({ where: { servingId: serving.id }, order: [['revision', 'desc']] })
  if (before) {
    if (before.idempotencyKey !== key)
      throw new ApiError(
        'conflict',
        'This serving was sent already, from this or another phone. The first one counts.',
      )
    return { outcome: before.outcome, seat: await viewSeat(context, access) }
  }
  await checkAnswers(access, body.answers)
  const outcome = outcomeOf(access, serving)
  await store(context, access, serving, key, outcome, body)
  if (outcome === 'taken') {
    const restUntil = new Date(context.now.getTime() + timing.restSeconds * 1000)
    await serving.update({
      state: 'submitted',
      submittedAt: context.now,
      restUntil,
      version: serving.version + 1,
    })
    await announce(context, {
      round: access.round.id,
      seat: { id: access.seat.id, number: access.seat.number },
    })
  }
  return { outcome, seat: await viewSeat(context, access) }
}

async function store(
  context: Context,
  access: SeatAccess,
  serving: Serving,
  key: string,
  outcome: Outcome,
  body: { answers: readonly Answer[]; remark: string },
): Promise<void> {
  const { panelId } = access.seat
  const submission = await Submission.create({
    panelId,
    id: context.deps.random.id(),
    servingId: serving.id,
    revision: 1,
    idempotencyKey: key,
    receivedAt: context.now,
    outcome,
    remark: body.remark,
  })
  const descriptors = await Descriptor.findAll({ where: { scorecardId: access.round.scorecardId } })
  const idOf = new Map(descriptors.map((one) => [one.key, one.id]))
  await Rating.bulkCreate(
    body.answers.map((answer) => ({
      panelId,
      submissionId: submission.id,
      descriptorId: idOf.get(answer.descriptor) as string,
      value: answer.value,
      cantTell: answer.cantTell,
    })),
  )
}
