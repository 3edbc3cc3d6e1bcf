import { Op } from 'sequelize'
import { inTransaction } from '#server/db/transaction.ts'
import type { Deps } from '#server/deps.ts'
import { IdempotentAnswer } from '#server/models/idempotent-answer.ts'
import { UserToken } from '#server/models/user-token.ts'

const day = 24 * 3600 * 1000

/** Removes what has served its time: spent links, and answers kept for writes that were sent twice. */
export async function sweep(deps: Pick<Deps, 'sequelize' | 'clock'>): Promise<void> {
  const now = deps.clock.now().getTime()
  await inTransaction(deps.sequelize, {}, async () => {
    await UserToken.destroy({ where: { expiresAt: { [Op.lt]: new Date(now - day) } } })
    await IdempotentAnswer.destroy({ where: { createdAt: { [Op.lt]: new Date(now - 7 * day) } } })
  })
}
