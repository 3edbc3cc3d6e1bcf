import { demoSignIns } from '#shared/domain/demo-sign-ins.ts'
import { firstOrganiserToken } from './auth/tokens.ts'
import { inTransaction } from './db/transaction.ts'
import type { Deps } from './deps.ts'
import { User } from './models/user.ts'

const column = (texts: readonly string[]) => Math.max(...texts.map((text) => text.length))

/** What the console says once the server listens. The address comes first: it is the first `http://` printed. */
export async function greeting(deps: Pick<Deps, 'env' | 'sequelize'>): Promise<string[]> {
  const { env } = deps
  const lines = ['', `  Scrim runs at ${env.address}`, '']
  if (env.mode === 'demo') {
    const wide = column(demoSignIns.map(({ email }) => email))
    return [
      ...lines,
      '  Everything in it is invented. Sign in as one of',
      ...demoSignIns.map(({ email, password, does }) => `    ${email.padEnd(wide)}  ${password}  (${does})`),
      '',
    ]
  }
  const users = await inTransaction(deps.sequelize, {}, () => User.count())
  if (users > 0) return lines
  return [
    ...lines,
    '  Nobody has an account yet. The first organiser makes one here; the address works once:',
    `    ${env.address}/sign-up?first=${firstOrganiserToken(env.secret)}`,
    '',
  ]
}
