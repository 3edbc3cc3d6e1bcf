import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { installPackages, refuseDefaultCluster } from './apt.mjs'
import { run } from './processes.mjs'

const DEBIAN = '/usr/lib/postgresql'

/**
 * The folder of PostgreSQL's programs: the version that made the data, or the highest installed.
 * @param {string} [version] major version that existing data asks for, as in its PG_VERSION
 * @returns {Promise<{ folder: string, version: string } | undefined>}
 */
export async function findBinaries(version) {
  const installed = existsSync(DEBIAN) ? readdirSync(DEBIAN) : []
  const usable = installed
    .filter((name) => existsSync(join(DEBIAN, name, 'bin', 'initdb')))
    .sort((a, b) => Number(b) - Number(a))
  const chosen = version ? usable.find((name) => name === version) : usable[0]
  if (chosen) return { folder: join(DEBIAN, chosen, 'bin'), version: chosen }
  for (const folder of (process.env.PATH ?? '').split(':')) {
    if (
      !folder ||
      !['initdb', 'postgres', 'pg_ctl', 'psql'].every((name) => existsSync(join(folder, name)))
    ) {
      continue
    }
    const { code, stdout } = await run(join(folder, 'initdb'), ['--version'])
    const found = /(\d+)(\.\d+|\w*)/.exec(stdout)?.[1]
    if (code === 0 && found && (!version || version === found)) return { folder, version: found }
  }
  return undefined
}

/**
 * As `findBinaries`, installing what is missing.
 * @param {string | undefined} version
 * @param {(line: string) => void} say
 */
export async function ensureBinaries(version, say) {
  const found = await findBinaries(version)
  if (found) return found
  say('PostgreSQL is not installed: installing it')
  if (process.getuid?.() === 0 && existsSync('/usr/bin/apt-get')) refuseDefaultCluster()
  const name = version ? `postgresql-${version}` : 'postgresql'
  await installPackages([name], version ? `PostgreSQL ${version}, which made the data here` : 'PostgreSQL')
  const now = await findBinaries(version)
  if (!now) throw new Error(`PostgreSQL was installed, but its programs are not under ${DEBIAN}.`)
  return now
}

/**
 * The user that PostgreSQL's programs run as: they refuse root. The owner of existing data, else `postgres`
 * when we are root, else ourselves (an empty object).
 * @param {string} data
 * @returns {{ uid?: number, gid?: number }}
 */
export function clusterUser(data) {
  if (process.getuid?.() !== 0) return {}
  if (existsSync(data)) {
    const { uid, gid } = statSync(data)
    if (uid !== 0) return { uid, gid }
  }
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'))
  if (!line) throw new Error('There is no user "postgres": install PostgreSQL from Debian’s packages.')
  const [, , uid, gid] = line.split(':')
  return { uid: Number(uid), gid: Number(gid) }
}
