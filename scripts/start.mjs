/**
 * npm start: from a bare machine with Node to the running application; see docs/operations.md. Until packages
 * are installed nothing but Node's own modules may be imported here.
 */
import { chmodSync, mkdirSync } from 'node:fs'
import { join, relative } from 'node:path'
import { build } from './build.mjs'
import { databases, projectRoot, startProjectCluster } from './postgres.mjs'
import { chooseAddress, startApplication } from './start/application.mjs'
import { ensurePackages, requireNode } from './start/install.mjs'
import { lanNotice } from './start/lan.mjs'
import { withLock } from './start/lock.mjs'
import { parseOptions, usage } from './start/options.mjs'
import { freePort, waitForPort } from './start/ports.mjs'
import { endChildren, pause } from './start/processes.mjs'
import { keptSecret } from './start/secret.mjs'

const root = projectRoot
const state = join(root, '.scrim')
const say = (line) => console.log(`  ${line}`)

/** What has been started so far, in the order in which it must end. */
const running = { ending: undefined, application: undefined, cluster: undefined }

/** Ends everything within two seconds: the server first, then the database under it. */
function end(code) {
  running.ending ??= (async () => {
    await Promise.all([endChildren(900), running.application?.close()])
    const cluster = await Promise.race([running.cluster, pause(500)])
    await cluster?.stop()
    process.exit(code)
  })().catch((error) => {
    console.error(error.message)
    process.exit(1)
  })
  return running.ending
}

function watchForTheEnd() {
  for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP']) process.on(signal, () => end(0))
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {})
  // npm does not always pass a signal on; when it is gone, so are we.
  const parent = process.ppid
  if (process.env.npm_lifecycle_event) {
    setInterval(() => process.ppid !== parent && end(0), 200).unref()
  }
}

/** Where the application's and the owner's connections go: our own cluster, or, live, the one that is named. */
async function databaseAddresses(mode) {
  const { DATABASE_URL, DATABASE_OWNER_URL } = process.env
  if (mode === 'live' && DATABASE_URL && DATABASE_OWNER_URL) {
    say('PostgreSQL: the one that DATABASE_URL names')
    return { DATABASE_URL, DATABASE_OWNER_URL }
  }
  running.cluster = startProjectCluster({ root, say })
  running.cluster.catch(() => (running.cluster = undefined))
  const cluster = await running.cluster
  const place = relative(root, cluster.data)
  say(
    `PostgreSQL ${cluster.version} on port ${cluster.port}, data in ${place.startsWith('..') ? cluster.data : place}`,
  )
  return {
    DATABASE_URL: cluster.url('scrim_app', databases[mode]),
    DATABASE_OWNER_URL: cluster.url('scrim_owner', databases[mode]),
  }
}

async function prepare({ mode, dev }) {
  mkdirSync(state, { recursive: true })
  if (process.getuid?.() === 0) chmodSync(state, 0o711)
  const onWait = () => say('Another start is preparing: waiting for it')
  const work = async () => {
    const packages = ensurePackages(root, say).then(() => dev || build({ root, ifChanged: true, say }))
    const [addresses] = await Promise.all([databaseAddresses(mode), packages])
    return addresses
  }
  return withLock(join(state, 'prepare.lock'), work, { onWait })
}

async function main() {
  const options = parseOptions(process.argv.slice(2), process.env)
  if (options.help) return console.log(usage)
  requireNode()
  watchForTheEnd()
  console.log(`Scrim, ${options.mode}`)
  const addresses = await prepare(options)
  if (running.ending) return
  const env = {
    ...process.env,
    ...addresses,
    SCRIM_MODE: options.mode,
    SCRIM_SECRET: process.env.SCRIM_SECRET || keptSecret(join(state, `secret-${options.mode}`)),
    SCRIM_LAN: options.lan ? '1' : '0',
  }
  await launch(options, env)
}

/** Chooses a port and starts the server on it; another port when somebody else was quicker to take that one. */
async function launch(options, env, attempt = 1) {
  const onePortAtATime = join(state, 'port.lock')
  const { address, opened } = await withLock(onePortAtATime, async () => {
    const { host, port, address } = await chooseAddress(options, env, say)
    const application = await startApplication({
      root,
      dev: options.dev,
      host,
      port,
      env: { ...env, SCRIM_ADDRESS: address },
    })
    running.application = application
    const { server } = application
    server.on('exit', async (code) => {
      if (running.ending) return
      const overtaken = code !== 0 && !options.dev && attempt < 4 && (await freePort(host, port)) !== port
      if (overtaken) return launch(options, env, attempt + 1).catch(fail)
      console.error('The server ended by itself.')
      await end(code || 1)
    })
    const opened = await waitForPort(port, () => !running.ending && server.exitCode === null)
    return { address, opened }
  })
  if (options.lan && opened) console.log(await lanNotice(address))
}

async function fail(error) {
  if (!running.ending) console.error(error.message)
  await end(error instanceof RangeError ? 2 : 1)
}

main().catch(fail)
