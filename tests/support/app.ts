import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import { join } from 'node:path'
import pino from 'pino'
import type { Sequelize } from 'sequelize'
import { createApp } from '#server/app.ts'
import { systemClock, systemRandom } from '#server/clock-and-chance.ts'
import { connect } from '#server/db/sequelize.ts'
import type { Deps } from '#server/deps.ts'
import { readEnv } from '#server/env.ts'
import { changeHub } from '#server/http/changes.ts'
import type { RateLimits } from '#server/http/rate-limits.ts'
import { runNextJob, startWorker } from '#server/jobs/worker.ts'
import type { Mailer, Message } from '#server/mail/mailer.ts'
import { createTestDatabase, type TestDatabase } from './database.ts'

export interface TestApp {
  /** `http://127.0.0.1:PORT` */
  url: string
  deps: Deps
  database: TestDatabase
  /** Connects as the owner of the tables: for looking behind the application's back. */
  owner: Sequelize
  /** Mail that was sent, oldest first; empty when the test gave its own mailer. */
  sent: Message[]
  /** Does the jobs that are due now, all of them. */
  runJobs(): Promise<void>
  close(): Promise<void>
}

export interface AppOptions {
  clock?: Deps['clock']
  random?: Deps['random']
  mail?: Mailer
  limits?: Partial<RateLimits>
  mode?: 'demo' | 'live'
  /** Whether the built pages are served too, as browser tests need. */
  pages?: boolean
  /** What links begin with, where it is not the true address: two applications can then make the same links. */
  address?: string
  /** Whether a worker takes jobs as they come; otherwise `runJobs` does. */
  worker?: boolean
}

const many = { most: 100_000, seconds: 60 }
const noLimits: RateLimits = { signIn: many, join: many, write: many }
const secret = '5c'.repeat(32)

/** The real application on a free port and a database of its own. */
export async function startApp(options: AppOptions = {}): Promise<TestApp> {
  const database = await createTestDatabase()
  const server = createServer()
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const { port } = server.address() as AddressInfo
  const env = readEnv({
    NODE_ENV: 'test',
    SCRIM_MODE: options.mode ?? 'demo',
    DATABASE_URL: database.appUrl,
    DATABASE_OWNER_URL: database.ownerUrl,
    PORT: String(port),
    ...(options.address ? { SCRIM_ADDRESS: options.address } : {}),
    SCRIM_SECRET: secret,
    SCRIM_LOG: 'silent',
  })
  const log = pino({ level: process.env.SCRIM_TEST_LOG ?? 'silent' })
  const sent: Message[] = []
  const keeping: Mailer = { sends: true, send: async (message) => void sent.push(message) }
  const deps: Deps = {
    env,
    sequelize: connect(database.appUrl),
    clock: options.clock ?? systemClock,
    random: options.random ?? systemRandom,
    mail: options.mail ?? keeping,
    changes: await changeHub(database.appUrl, log),
    limits: { ...noLimits, ...options.limits },
    log,
    clientFolder: options.pages ? join(process.cwd(), 'dist', 'client') : null,
  }
  const owner = connect(database.ownerUrl, { max: 2 })
  const app = createApp(deps, { pruneSessionsEvery: false })
  server.on('request', app.express)
  const worker = options.worker ? startWorker(deps, 100) : undefined
  return {
    url: `http://127.0.0.1:${port}`,
    deps,
    database,
    owner,
    sent,
    runJobs: async () => {
      while (await runNextJob(deps));
    },
    close: async () => {
      await worker?.stop()
      server.closeAllConnections()
      await new Promise((resolve) => server.close(resolve))
      await Promise.all([deps.changes.stop(), app.stop()])
      await Promise.all([deps.sequelize.close(), owner.close()])
      await database.drop()
    },
  }
}
