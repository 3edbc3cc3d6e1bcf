import { QueryTypes, UniqueConstraintError } from 'sequelize'
import type { z } from 'zod'
import type { createAccount } from '#shared/contracts/account.ts'
import { hashPassword } from '#server/auth/passwords.ts'
import { isFirstOrganiserToken } from '#server/auth/tokens.ts'
import { foundPanel } from '#server/features/panels/founding-service.ts'
import { fieldError } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { User } from '#server/models/user.ts'
import { maySignUp } from '#server/policies/account.ts'
import { lookAround, type Standing } from './standing-service.ts'

/** Makes a person and their panel, and signs in. */
export async function signUp(context: Context, body: z.output<typeof createAccount.body>): Promise<Standing> {
  await letIn(context, body.first)
  const { deps } = context
  const user = await User.create({
    id: deps.random.id(),
    email: body.email,
    name: body.name,
    passwordHash: await hashPassword(body.password),
    createdAt: context.now,
  }).catch((error: unknown) => {
    if (!(error instanceof UniqueConstraintError)) throw error
    throw fieldError('email', 'This address has an account here. Sign in, or choose a new password.')
  })
  await foundPanel(context, user, { name: body.panelName, timeZone: body.timeZone })
  await context.session.signIn(user.id)
  return lookAround(context, user.id)
}

/** Two people with the first organiser's address come in one after the other: the second finds it used. */
async function letIn({ deps }: Context, first: string): Promise<void> {
  const open = deps.env.openSignUp
  if (!open) await deps.sequelize.query('select pg_advisory_xact_lock(731, 2)', { type: QueryTypes.SELECT })
  const anybodyYet = (await User.findOne({ attributes: ['id'] })) !== null
  const byFirstAddress = isFirstOrganiserToken(deps.env.secret, first)
  permit(maySignUp({ open, anybodyYet, byFirstAddress }), {
    detail: anybodyYet
      ? byFirstAddress
        ? 'This address has been used: the first account is made. Sign in instead.'
        : 'Accounts on this Scrim are made by whoever runs it. Listeners need none.'
      : 'The first account is made by the address that Scrim printed where it was started.',
  })
}
