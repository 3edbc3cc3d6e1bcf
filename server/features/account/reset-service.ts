import { hashPassword } from '#server/auth/passwords.ts'
import { tokenDigest } from '#server/auth/tokens.ts'
import { endSessions } from '#server/auth/user-sessions.ts'
import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { enqueue } from '#server/jobs/queue.ts'
import { User } from '#server/models/user.ts'
import { UserToken } from '#server/models/user-token.ts'

/** Whether the address has an account is found out by the job: the answer is the same, and as fast, for each. */
export const askResetLink = (context: Context, email: string): Promise<void> =>
  enqueue(context, 'send-reset-link', { email })

/** Sets a new password by a mailed link; all links and sessions of the person end with it. */
export async function resetByLink(context: Context, token: string, password: string): Promise<void> {
  const link = await UserToken.findOne({
    where: { kind: 'reset', tokenHash: tokenDigest(token), usedAt: null },
    lock: true,
  })
  if (!link || link.expiresAt <= context.now)
    throw notFound('This link was used already, or it is too old. Ask for another.')
  await User.update({ passwordHash: await hashPassword(password) }, { where: { id: link.userId } })
  await UserToken.update({ usedAt: context.now }, { where: { userId: link.userId, usedAt: null } })
  await endSessions(context.deps.sequelize, link.userId)
}
