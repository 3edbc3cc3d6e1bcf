import { timing } from '#shared/domain/timing.ts'
import { Descriptor } from '#server/models/descriptor.ts'
import { Rating } from '#server/models/rating.ts'
import { Round } from '#server/models/round.ts'
import { Serving } from '#server/models/serving.ts'
import { Submission } from '#server/models/submission.ts'
import { answersOf, remarkOf } from './hearing.ts'
import type { Evening, Held } from './playing.ts'
import { later } from './world.ts'

export interface Sent extends Held {
  at: Date
}

/** A whole turn confirmed and sent, as the seat's services leave it. */
export async function markSent(held: readonly Held[], turnBegan: Date): Promise<void> {
  const sentAt = later(turnBegan, 6)
  await Serving.update(
    {
      state: 'submitted',
      confirmedAt: later(turnBegan, 1),
      submittedAt: sentAt,
      restUntil: new Date(sentAt.getTime() + timing.restSeconds * 1000),
      version: 3,
    },
    { where: { id: held.map((one) => one.serving) } },
  )
}

/** Everybody's answers of a whole evening, by what their codes hid. */
export async function keepRatings(evening: Evening, sent: readonly Sent[]): Promise<void> {
  const round = await Round.findByPk(evening.at.round, { rejectOnEmpty: true })
  const descriptors = await Descriptor.findAll({ where: { scorecardId: round.scorecardId } })
  const idOf = new Map(descriptors.map(({ key, id }) => [key, id]))
  const { panelId } = round
  const kept = sent.map((one) => ({ ...one, id: evening.world.deps.random.id() }))
  await Submission.bulkCreate(
    kept.map(({ id, serving, seat, code, at }) => ({
      panelId,
      id,
      servingId: serving,
      revision: 1,
      idempotencyKey: `seeded-${serving}`,
      receivedAt: at,
      outcome: 'taken' as const,
      remark: remarkOf(evening.title, seat.name, evening.unitOf(code)),
    })),
  )
  await Rating.bulkCreate(
    kept.flatMap(({ id, seat, code }) =>
      answersOf(evening.title, seat.name, evening.unitOf(code), evening.scorecard).map((answer) => ({
        panelId,
        submissionId: id,
        descriptorId: idOf.get(answer.descriptor) as string,
        value: answer.value,
        cantTell: answer.cantTell,
      })),
    ),
  )
}
