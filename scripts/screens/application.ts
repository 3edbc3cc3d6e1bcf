import { randomBytes } from 'node:crypto'
import { join } from 'node:path'
import { createTestDatabase } from '#tests/support/database.ts'
import { freePort, waitForPort } from '../start/ports.mjs'
import { spawnTracked } from '../start/processes.mjs'

/** The built application in demo on an empty database, which it fills by itself before it listens. */
export async function startDemo(): Promise<{ url: string; stop(): Promise<void> }> {
  const database = await createTestDatabase({ migrated: false })
  const port = await freePort('127.0.0.1')
  const server = spawnTracked(process.execPath, ['--enable-source-maps', join('dist', 'server', 'index.js')], {
    stdio: ['ignore', 'ignore', 'inherit'],
    env: {
      ...process.env,
      NODE_ENV: 'production',
      SCRIM_MODE: 'demo',
      SCRIM_SECRET: randomBytes(32).toString('hex'),
      DATABASE_URL: database.appUrl,
      DATABASE_OWNER_URL: database.ownerUrl,
      HOST: '127.0.0.1',
      PORT: String(port),
    },
  })
  const listens = await waitForPort(port, () => server.exitCode === null)
  if (!listens) throw new Error('The application did not start.')
  return {
    url: `http://127.0.0.1:${port}`,
    stop: async () => {
      const ended = new Promise((resolve) => server.once('exit', resolve))
      server.kill('SIGTERM')
      await ended
      await database.drop()
    },
  }
}
