/**
 * node scripts/restore.mjs demo|live FOLDER [--replace]: puts back what scripts/backup.mjs kept. A database that
 * holds a panel is replaced only when `--replace` says so. End Scrim first.
 */
import { chmodSync, copyFileSync, existsSync, mkdirSync, renameSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { databases, projectRoot, startProjectCluster } from './postgres.mjs'
import { run } from './start/processes.mjs'

const [mode = '', source, replace] = process.argv.slice(2)
const folder = source ? resolve(source) : ''
const dump = join(folder, 'database.dump')
if (!(mode in databases) || !source || (replace && replace !== '--replace')) {
  console.error('Usage: node scripts/restore.mjs demo|live FOLDER [--replace]')
  process.exit(2)
}
if (!existsSync(dump) || !existsSync(join(folder, 'secret'))) {
  console.error(`${folder} does not hold database.dump and secret.`)
  process.exit(2)
}

const cluster = await startProjectCluster({ say: console.log })
const name = databases[mode]
/** Made aside and renamed at the end: a restore that fails leaves all as it was. */
const making = `${name}_restored`
const superuser = new URL(cluster.url('postgres', 'postgres'))

/** @param {string} program @param {string[]} args @param {string} database @param {string} [input] */
async function as(program, args, database, input) {
  const url = new URL(cluster.url('postgres', database))
  url.password = ''
  const env = { ...process.env, PGPASSWORD: superuser.password }
  const result = await run(join(cluster.binaries, program), [...args, `--dbname=${url}`], { env, input })
  if (result.code !== 0) throw new Error(`${program} failed:\n${result.output}`)
  return result.stdout.trim()
}
const ask = (sql, database = name) =>
  as('psql', ['-X', '-q', '-A', '-t', '-v', 'ON_ERROR_STOP=1'], database, sql)

try {
  const users = await ask(
    `select count(*) from pg_stat_activity where datname = '${name}' and pid <> pg_backend_pid()`,
  )
  if (users !== '0') throw new Error('Scrim is running on this database. End it first.')
  const panels =
    (await ask(`select to_regclass('panels') is not null`)) === 't'
      ? await ask('select count(*) from panels')
      : '0'
  if (panels !== '0' && !replace)
    throw new Error(`The database holds ${panels} panel(s). Say --replace to replace it.`)
  await ask(`drop database if exists ${making}`, 'postgres')
  await ask(`create database ${making} owner scrim_owner template template0`, 'postgres')
  await ask(
    `revoke all on database ${making} from public; grant connect, temporary on database ${making} to scrim_app`,
    'postgres',
  )
  await as(
    'pg_restore',
    ['--exit-on-error', '--single-transaction', '--role=scrim_owner', '--no-owner', dump],
    making,
  )
  await ask(`drop database ${name}`, 'postgres')
  await ask(`alter database ${making} rename to ${name}`, 'postgres')
  const mine = join(projectRoot, '.scrim', `secret-${mode}`)
  mkdirSync(join(projectRoot, '.scrim'), { recursive: true })
  if (existsSync(mine)) renameSync(mine, `${mine}.replaced`)
  copyFileSync(join(folder, 'secret'), mine)
  chmodSync(mine, 0o600)
  console.log(`Put back into ${name}.`)
} catch (error) {
  console.error(error.message)
  process.exitCode = 1
} finally {
  await cluster.stop()
}
