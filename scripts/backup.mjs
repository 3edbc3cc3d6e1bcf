/**
 * node scripts/backup.mjs demo|live FOLDER: everything that a new machine needs to go on, in a new folder. Scrim
 * may run meanwhile.
 */
import { chmodSync, copyFileSync, existsSync, mkdirSync, rmSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { databases, projectRoot, startProjectCluster } from './postgres.mjs'
import { run } from './start/processes.mjs'
import { keptSecret } from './start/secret.mjs'

const [mode = '', target] = process.argv.slice(2)
if (!(mode in databases) || !target) {
  console.error('Usage: node scripts/backup.mjs demo|live FOLDER')
  process.exit(2)
}
const folder = resolve(target)
if (existsSync(folder)) {
  console.error(`${folder} is there already: name a new folder.`)
  process.exit(2)
}

const cluster = await startProjectCluster({ say: console.log })
try {
  const secret = join(projectRoot, '.scrim', `secret-${mode}`)
  keptSecret(secret)
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  const url = new URL(cluster.url('scrim_owner', databases[mode]))
  const password = url.password
  url.password = ''
  const file = join(folder, 'database.dump')
  const args = ['--format=custom', `--file=${file}`, `--dbname=${url}`]
  const { code, output } = await run(join(cluster.binaries, 'pg_dump'), args, {
    env: { ...process.env, PGPASSWORD: password },
  })
  if (code !== 0) throw new Error(`pg_dump failed:\n${output}`)
  copyFileSync(secret, join(folder, 'secret'))
  for (const name of ['database.dump', 'secret']) chmodSync(join(folder, name), 0o600)
  console.log(`Kept in ${folder}: the database and the secret. Both are confidential.`)
} catch (error) {
  rmSync(folder, { recursive: true, force: true })
  console.error(error.message)
  process.exitCode = 1
} finally {
  await cluster.stop()
}
