import {
  chownSync,
  existsSync,
  mkdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs'
import { join } from 'node:path'
import { freePort } from './ports.mjs'
import { pause, processesIn, run } from './processes.mjs'

/**
 * A cluster: where it lies, whose programs and which user run it.
 * @typedef {{ data: string, binaries: string, version: string, user: { uid?: number, gid?: number },
 *   throwAway: boolean }} Cluster
 */

/** What a throw-away cluster may do without: it never outlives its machine. */
const careless = ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off', 'max_connections=200']

const environment = () => ({ ...process.env, LC_ALL: 'C.UTF-8', PGPASSWORD: '' })

/** @param {Cluster} cluster @param {string} program @param {string[]} args */
function pg(cluster, program, args) {
  return run(join(cluster.binaries, program), args, {
    ...cluster.user,
    cwd: '/',
    env: environment(),
    survives: true,
  })
}

/**
 * Makes the data folder, aside first: a half-made one must not look ready.
 * @param {Cluster} cluster
 * @param {string} password of the superuser
 */
export async function initialise(cluster, password) {
  const making = `${cluster.data}.new`
  const passwordFile = `${cluster.data}.pw`
  const help = await pg(cluster, 'initdb', ['--help'])
  const icu = help.stdout.includes('--locale-provider')
  const locales = [
    ...(icu ? [['--locale-provider=icu', '--icu-locale=und', '--locale=C.UTF-8']] : []),
    ['--locale=C.UTF-8'],
    ['--locale=C'],
  ]
  let last = { code: 1, output: '' }
  try {
    for (const locale of locales) {
      rmSync(making, { recursive: true, force: true })
      mkdirSync(making, { mode: 0o700 })
      writeFileSync(passwordFile, password, { mode: 0o600 })
      give(cluster, making)
      give(cluster, passwordFile)
      const auth = ['-U', 'postgres', `--pwfile=${passwordFile}`, '-A', 'scram-sha-256']
      const sync = cluster.throwAway ? ['--no-sync'] : []
      last = await pg(cluster, 'initdb', ['-D', making, '-E', 'UTF8', ...locale, ...auth, ...sync])
      if (last.code === 0) break
    }
  } finally {
    rmSync(passwordFile, { force: true })
  }
  if (last.code !== 0) throw new Error(`initdb failed:\n${last.output}`)
  renameSync(making, cluster.data)
}

function give(cluster, path) {
  if (cluster.user.uid !== undefined) chownSync(path, cluster.user.uid, cluster.user.gid ?? cluster.user.uid)
}

/**
 * The port of the running server, or nothing when none runs. Leftovers of a crash are cleared away.
 * @param {Cluster} cluster
 * @returns {Promise<number | undefined>}
 */
export async function runningPort(cluster) {
  const file = join(cluster.data, 'postmaster.pid')
  const postmaster = () => {
    if (!existsSync(file)) return {}
    const lines = readFileSync(file, 'utf8').split('\n')
    return { pid: Number(lines[0]), port: Number(lines[3]), status: (lines[7] ?? '').trim() }
  }
  if (!existsSync(file) && !processesIn(cluster.data)?.length) return undefined
  // A starting or stopping server is given time; so are the children of one that was killed.
  for (let round = 0; round < 100; round += 1) {
    const { pid, port, status } = postmaster()
    const living = processesIn(cluster.data)
    if (living === undefined) {
      const told = await pg(cluster, 'pg_ctl', ['-D', cluster.data, 'status'])
      return told.code === 0 ? port : undefined
    }
    if (living.length === 0) {
      rmSync(file, { force: true })
      return undefined
    }
    if (pid && living.includes(pid) && port && status === 'ready') return port
    if (round === 50 && !(pid && living.includes(pid))) for (const orphan of living) kill(orphan)
    await pause(100)
  }
  throw new Error(`A PostgreSQL server on ${cluster.data} neither answers nor ends.`)
}

function kill(pid) {
  try {
    process.kill(pid, 'SIGKILL')
  } catch {
    // It ended by itself.
  }
}

/**
 * Starts the server on loopback, on a free port.
 * @param {Cluster} cluster
 * @returns {Promise<number>} the port
 */
export async function startServer(cluster) {
  const log = join(cluster.data, 'server.log')
  if (existsSync(log) && statSync(log).size > 5_000_000) renameSync(log, `${log}.1`)
  let last
  for (let attempt = 0; attempt < 5; attempt += 1) {
    const port = await freePort('127.0.0.1')
    const settings = ['listen_addresses=127.0.0.1', "unix_socket_directories=''", 'timezone=UTC']
    const all = [...settings, ...(cluster.throwAway ? careless : [])].map((setting) => `-c ${setting}`)
    const options = [`-p ${port}`, ...all].join(' ')
    last = await pg(cluster, 'pg_ctl', [
      '-D',
      cluster.data,
      '-l',
      log,
      '-w',
      '-t',
      '60',
      '-o',
      options,
      'start',
    ])
    if (last.code === 0) return port
    const running = await runningPort(cluster)
    if (running) return running
  }
  const tail = existsSync(log) ? readFileSync(log, 'utf8').split('\n').slice(-15).join('\n') : ''
  throw new Error(`PostgreSQL did not start:\n${last?.output ?? ''}\n${tail}`)
}

/**
 * Stops the server: in order, else at once (which the next start repairs).
 * @param {Cluster} cluster
 */
export async function stopServer(cluster) {
  const mode = cluster.throwAway ? 'immediate' : 'fast'
  const stopped = await pg(cluster, 'pg_ctl', ['-D', cluster.data, '-m', mode, '-w', '-t', '1', 'stop'])
  if (stopped.code !== 0 && existsSync(join(cluster.data, 'postmaster.pid'))) {
    await pg(cluster, 'pg_ctl', ['-D', cluster.data, '-m', 'immediate', '-w', '-t', '5', 'stop'])
  }
}

/**
 * Gives the superuser a new password without knowing the old one; the server must not be running.
 * @param {Cluster} cluster
 * @param {string} password letters and digits only
 */
export async function resetSuperuser(cluster, password) {
  const { code, output } = await run(
    join(cluster.binaries, 'postgres'),
    ['--single', '-D', cluster.data, 'postgres'],
    { ...cluster.user, cwd: '/', env: environment(), input: `alter role postgres password '${password}'\n` },
  )
  if (code !== 0) throw new Error(`The database’s password could not be set anew:\n${output}`)
}
