import * as contract from '#shared/contracts/account.ts'
import type { Feature } from '#server/http/feature.ts'
import { staleEdit } from '#server/http/api-error.ts'
import { presentMe } from './presenter.ts'
import { askResetLink, resetByLink } from './reset-service.ts'
import { changePassword, rename, signIn, signOut } from './service.ts'
import { signUp } from './sign-up-service.ts'
import { lookAround, type Standing } from './standing-service.ts'

const done = { done: true } as const

export const account: Feature = (mount, _router, { env, mail }) => {
  const me = (standing: Standing) => presentMe(standing, { mode: env.mode, mailSends: mail.sends })

  mount(contract.getMe, async (_input, context) => me(await lookAround(context, context.actor.userId)))
  mount(contract.createAccount, async ({ body }, context) => me(await signUp(context, body)))
  mount(contract.createSession, async (_input, context) => me(await signIn(context)))
  mount(contract.endSession, async (_input, context) => {
    await signOut(context)
    return done
  })
  mount(contract.renameAccount, async ({ body }, context) => {
    const renamed = await rename(context, body.name)
    if (!renamed) throw staleEdit(me(await lookAround(context, context.actor.userId)))
    return me(renamed)
  })
  mount(contract.replacePassword, async ({ body }, context) => {
    await changePassword(context, body)
    return done
  })
  mount(contract.askReset, async ({ body }, context) => {
    await askResetLink(context, body.email)
    return done
  })
  mount(contract.useReset, async ({ params, body }, context) => {
    await resetByLink(context, params.token, body.password)
    return done
  })
}
