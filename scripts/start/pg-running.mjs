import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { LockBusy, withLock } from './lock.mjs'
import { clusterUser, ensureBinaries } from './pg-binaries.mjs'
import { initialise, resetSuperuser, runningPort, startServer, stopServer } from './pg-cluster.mjs'
import { databaseUrl, newPasswords, psql, readPasswords, rolesSql, writePasswords } from './pg-roles.mjs'
import { identity, stillRuns } from './processes.mjs'

/**
 * @typedef {{ folder: string, data: string, port: number, version: string, binaries: string,
 *   url: (role: 'postgres' | 'scrim_owner' | 'scrim_app', database: string) => string,
 *   stop: () => Promise<void> }} RunningCluster
 *   `stop`: says that this process is done; the last one to say so ends the server
 */

/**
 * The cluster whose files lie in `folder`, made if new, started if it does not run.
 * @param {string} folder
 * @param {{ databases?: string[], throwAway?: boolean, say?: (line: string) => void }} [options]
 * @returns {Promise<RunningCluster>}
 */
export async function runCluster(folder, { databases = [], throwAway = false, say = () => {} } = {}) {
  const cluster = await describe(folder, throwAway, say)
  const lock = join(folder, 'pg.lock')
  const users = join(folder, 'in-use')
  mkdirSync(users, { recursive: true, mode: 0o711 })
  const { port, passwords } = await withLock(lock, async () => {
    writeFileSync(join(users, String(process.pid)), identity())
    return open(cluster, join(folder, 'database-passwords.json'), databases)
  })
  return {
    folder,
    data: cluster.data,
    port,
    version: cluster.version,
    binaries: cluster.binaries,
    url: (role, database) => databaseUrl(role, passwords[role], port, database),
    stop: () => leave(cluster, lock, users),
  }
}

/** @returns {Promise<import('./pg-cluster.mjs').Cluster>} */
async function describe(folder, throwAway, say) {
  const data = join(folder, 'pg')
  const made = join(data, 'PG_VERSION')
  const programs = await ensureBinaries(existsSync(made) ? readFileSync(made, 'utf8').trim() : undefined, say)
  const { folder: binaries, version } = programs
  return { data, binaries, version, user: clusterUser(data), throwAway }
}

/** Makes, starts and furnishes the cluster; a lost or foreign password file is no reason to lose the data. */
async function open(cluster, passwordFile, databases) {
  let passwords = readPasswords(passwordFile)
  if (!existsSync(join(cluster.data, 'PG_VERSION'))) {
    passwords = newPasswords()
    writePasswords(passwordFile, passwords)
    await initialise(cluster, passwords.postgres)
  }
  let port = (await runningPort(cluster)) ?? (passwords ? await startServer(cluster) : undefined)
  const furnish = async () => {
    const at = { binaries: cluster.binaries, port: port ?? 0, password: passwords?.postgres ?? '' }
    await psql(at, rolesSql(/** @type {any} */ (passwords), databases))
  }
  try {
    if (!passwords) throw new Error('password authentication failed: no password is kept')
    await furnish()
  } catch (error) {
    if (!String(error).includes('password authentication failed')) throw error
    if (port) await stopServer(cluster)
    passwords = newPasswords()
    await resetSuperuser(cluster, passwords.postgres)
    writePasswords(passwordFile, passwords)
    port = await startServer(cluster)
    await furnish()
  }
  return { port: /** @type {number} */ (port), passwords }
}

async function leave(cluster, lock, users) {
  rmSync(join(users, String(process.pid)), { force: true })
  const stopIfLast = async () => {
    const others = readdirSync(users).filter((name) => {
      const alive = stillRuns(readFileSync(join(users, name), 'utf8'))
      if (!alive) rmSync(join(users, name), { force: true })
      return alive
    })
    if (others.length === 0) await stopServer(cluster)
  }
  try {
    await withLock(lock, stopIfLast, { waitMs: 500 })
  } catch (error) {
    if (!(error instanceof LockBusy)) throw error // another start is about to use it: leave it running
  }
}
