/**
 * PostgreSQL for Scrim, on loopback, with nothing but Node: this runs before any package is installed.
 * By hand: `node scripts/postgres.mjs url demo|live` starts it and prints the owner's address, `stop` ends it.
 */
import { createHash } from 'node:crypto'
import { chmodSync, existsSync, mkdirSync, realpathSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { clusterUser, ensureBinaries } from './start/pg-binaries.mjs'
import { runCluster } from './start/pg-running.mjs'
import { run } from './start/processes.mjs'

export { holdThrowAwayFolder, removeThrowAway } from './start/pg-throw-away.mjs'

export const projectRoot = dirname(dirname(fileURLToPath(import.meta.url)))

/** One database for each way to start. */
export const databases = { demo: 'scrim_demo', live: 'scrim_live' }

/**
 * Where the project's database lies: `.scrim` in the project, or, where the user postgres may not enter it,
 * a folder under /var/lib named by the project's path.
 * @param {string} root
 */
export async function clusterFolder(root) {
  const inside = join(root, '.scrim')
  const hash = createHash('sha256').update(realpathSync(root)).digest('hex').slice(0, 12)
  const outside = `/var/lib/scrim-${hash}`
  if (existsSync(join(inside, 'pg'))) return inside
  if (existsSync(join(outside, 'pg'))) return outside
  mkdirSync(inside, { recursive: true })
  const user = clusterUser(join(inside, 'pg'))
  if (user.uid === undefined) return inside
  chmodSync(inside, 0o711)
  const { code } = await run('test', ['-x', inside], { ...user, cwd: '/' })
  if (code === 0) return inside
  mkdirSync(outside, { recursive: true, mode: 0o711 })
  return outside
}

/**
 * Starts the project's PostgreSQL, or joins the one that runs on its data.
 * @param {{ root?: string, say?: (line: string) => void }} [options]
 */
export async function startProjectCluster({ root = projectRoot, say } = {}) {
  // Installing comes first: it makes the user whose rights decide where the data can lie.
  await ensureBinaries(undefined, say ?? (() => {}))
  return runCluster(await clusterFolder(root), { databases: Object.values(databases), say })
}

/**
 * Starts the cluster of tests in a folder that `holdThrowAwayFolder` gave, or joins it. Call `removeThrowAway`
 * at the end, not `stop`.
 * @param {string} folder
 * @param {{ say?: (line: string) => void }} [options]
 */
export const joinThrowAwayCluster = (folder, { say } = {}) => runCluster(folder, { throwAway: true, say })

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const [action, mode] = process.argv.slice(2)
  if (action === 'url' && mode && mode in databases) {
    const cluster = await startProjectCluster({ say: console.error })
    console.log(cluster.url('scrim_owner', databases[mode]))
  } else if (action === 'stop') {
    const cluster = await startProjectCluster({ say: console.error })
    await cluster.stop()
  } else {
    console.error('Usage: node scripts/postgres.mjs url demo|live\n       node scripts/postgres.mjs stop')
    process.exitCode = 2
  }
}
