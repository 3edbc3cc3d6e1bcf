import { existsSync } from 'node:fs'
import { createServer } from 'node:http'
import { join } from 'node:path'
import pino from 'pino'
import { createApp } from './app.ts'
import { systemClock, systemRandom } from './clock-and-chance.ts'
import { migrate } from './db/migrate.ts'
import { connect } from './db/sequelize.ts'
import type { Deps } from './deps.ts'
import { readEnv } from './env.ts'
import { greeting } from './greeting.ts'
import { changeHub } from './http/changes.ts'
import { usualLimits } from './http/rate-limits.ts'
import { startWorker } from './jobs/worker.ts'
import { mailerFor } from './mail/mailer-for.ts'
import { initModels } from './models/index.ts'
import { stopper } from './stopper.ts'

const env = readEnv()
const log = pino({ level: env.logLevel, base: null }, pino.destination({ dest: 2, sync: true }))
const stopping = stopper(log)

async function start(): Promise<void> {
  const sequelize = connect(env.databaseUrl)
  stopping.last('database', () => sequelize.close())
  initModels(sequelize)

  const mail = await mailerFor(env, {
    sequelize,
    clock: systemClock,
    random: systemRandom,
    print: console.log,
  })
  stopping.then('mail', mail.stop)
  // From dist/server/index.js the built pages lie next door; beside the sources Vite serves them.
  const built = join(import.meta.dirname, '..', 'client')
  const deps: Omit<Deps, 'changes'> = {
    env,
    sequelize,
    clock: systemClock,
    random: systemRandom,
    mail,
    limits: usualLimits,
    log,
    clientFolder: existsSync(join(built, 'index.html')) ? built : null,
  }
  await migrate(env.databaseOwnerUrl, {
    afterwards: async () => {
      if (env.mode !== 'demo') return
      const { seedDemo } = await import('#seeders/index.ts')
      await seedDemo({ ...deps, changes: { listen: () => () => undefined, stop: async () => undefined } })
    },
  })
  const changes = await changeHub(env.databaseUrl, log)
  stopping.then('changes', changes.stop)
  const app = createApp({ ...deps, changes })
  stopping.then('sessions', app.stop)
  const worker = startWorker({ ...deps, changes })
  stopping.then('worker', worker.stop)

  const server = createServer(app.express)
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen({ port: env.port, host: env.host }, resolve)
  })
  stopping.first('server', () => stopping.drained(server))
  for (const line of await greeting(deps)) console.log(line)
}

for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => void stopping.stop(0))
try {
  await start()
} catch (error) {
  log.fatal({ err: error }, 'Scrim could not start')
  console.error(error instanceof Error ? error.message : error)
  await stopping.stop(1)
}
