import type { z } from 'zod'
import type { replacePassword } from '#shared/contracts/account.ts'
import { hashPassword, passwordMatches } from '#server/auth/passwords.ts'
import { endSessions } from '#server/auth/user-sessions.ts'
import { ApiError, fieldError } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { Member } from '#server/models/member.ts'
import { User } from '#server/models/user.ts'
import { lookAround, type Standing } from './standing-service.ts'

/** One answer for an unknown address and for a wrong password. */
export async function signIn(context: Context): Promise<Standing> {
  const userId = await context.session.authenticate()
  if (userId === null) throw fieldError('password', 'Address and password do not go together.')
  await context.session.signIn(userId)
  return lookAround(context, userId)
}

export const signOut = (context: Context): Promise<void> => context.session.signOut()

/** The signed-in person's own row, held until the request ends. */
async function ownUser(context: Context): Promise<User> {
  const user =
    context.actor.userId === null ? null : await User.findByPk(context.actor.userId, { lock: true })
  if (!user) throw new ApiError('not_signed_in', 'Sign in first.')
  return user
}

/**
 * Changes the person's name, in their panels too.
 * @returns null where somebody changed it after this edit began
 */
export async function rename(context: Context, name: string): Promise<Standing | null> {
  const user = await ownUser(context)
  if (context.version !== user.version) return null
  await user.update({ name, version: user.version + 1 })
  await Member.update({ displayName: name }, { where: { userId: user.id } })
  return lookAround(context, user.id)
}

/** Ends every other session of the person. */
export async function changePassword(
  context: Context,
  { current, next }: z.output<typeof replacePassword.body>,
): Promise<void> {
  const user = await ownUser(context)
  if (!(await passwordMatches(user.passwordHash, current)))
    throw fieldError('current', 'This is not your present password.')
  await user.update({ passwordHash: await hashPassword(next) })
  await endSessions(context.deps.sequelize, user.id, context.session.id())
}
