import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { clusterUser, ensureBinaries } from './pg-binaries.mjs'
import { stopServer } from './pg-cluster.mjs'
import { identity, stillRuns } from './processes.mjs'

const PREFIX = 'scrim-test-'

/** A place that the user postgres may enter: its own folder under /root or a private TMPDIR would not do. */
const parent = () => ['/tmp', '/var/lib'].find((folder) => existsSync(folder)) ?? '.'

/**
 * A folder for a cluster of tests, held by this process; nothing is started yet. Folders whose holder is dead
 * are removed first, with the servers left running in them.
 */
export async function holdThrowAwayFolder() {
  for (const name of readdirSync(parent()).filter((entry) => entry.startsWith(PREFIX))) {
    await removeIfAbandoned(join(parent(), name))
  }
  const folder = join(parent(), `${PREFIX}${process.pid}-${Date.now().toString(36)}`)
  mkdirSync(folder, { mode: 0o711 })
  writeFileSync(join(folder, 'holder'), identity())
  return folder
}

async function removeIfAbandoned(folder) {
  try {
    if (!stillRuns(readFileSync(join(folder, 'holder'), 'utf8'))) await removeThrowAway(folder)
  } catch {
    // Another user's, or being made or removed at this moment.
  }
}

/**
 * Ends the cluster in the folder, if one was started, and removes all of it.
 * @param {string} folder
 */
export async function removeThrowAway(folder) {
  const data = join(folder, 'pg')
  if (existsSync(join(data, 'postmaster.pid'))) {
    const version = readFileSync(join(data, 'PG_VERSION'), 'utf8').trim()
    const { folder: binaries } = await ensureBinaries(version, () => {})
    await stopServer({ data, binaries, version, user: clusterUser(data), throwAway: true })
  }
  rmSync(folder, { recursive: true, force: true, maxRetries: 5, retryDelay: 100 })
}
