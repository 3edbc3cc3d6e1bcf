import { QueryTypes } from 'sequelize'
import { IdempotentAnswer } from '../models/idempotent-answer.ts'
import { ApiError } from './api-error.ts'
import type { Context } from './context.ts'

const scopeOf = (context: Context, endpointId: string): string =>
  `${endpointId} ${context.actor.userId ?? context.session.id()}`

/**
 * The answer that this key got before, or undefined. Two requests with one key at the same time wait for each other.
 */
export async function answeredBefore(context: Context, endpointId: string, digest: string): Promise<unknown> {
  const scope = scopeOf(context, endpointId)
  const key = context.idempotencyKey ?? ''
  await context.deps.sequelize.query('select pg_advisory_xact_lock(hashtextextended($1, 0))', {
    bind: [`${scope} ${key}`],
    type: QueryTypes.SELECT,
  })
  const kept = await IdempotentAnswer.findOne({ where: { scope, key } })
  if (kept && kept.requestDigest !== digest)
    throw new ApiError('conflict', 'This Idempotency-Key was used for another request.')
  return kept?.body
}

export async function keepAnswer(
  context: Context,
  endpointId: string,
  digest: string,
  body: unknown,
): Promise<void> {
  if (context.panelId === undefined) return
  await IdempotentAnswer.create({
    panelId: context.panelId,
    scope: scopeOf(context, endpointId),
    key: context.idempotencyKey ?? '',
    requestDigest: digest,
    body,
    createdAt: context.now,
  })
}
