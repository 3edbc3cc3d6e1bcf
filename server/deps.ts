import type { Logger } from 'pino'
import type { Sequelize } from 'sequelize'
import type { ChangeHub } from './http/changes.ts'
import type { RateLimits } from './http/rate-limits.ts'
import type { Env } from './env.ts'
import type { Mailer } from './mail/mailer.ts'

/** Everything that a request may reach outside itself; tests give their own clock, randomness, mail and limits. */
export interface Deps {
  env: Env
  sequelize: Sequelize
  clock: { now(): Date }
  random: { bytes(count: number): Buffer; id(): string }
  mail: Mailer
  changes: ChangeHub
  limits: RateLimits
  log: Logger
  /** The folder of the built browser application; null where only the API runs. */
  clientFolder: string | null
}
