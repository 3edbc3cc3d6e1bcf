import { existsSync, mkdirSync, writeFileSync } from 'node:fs'
import { pause, run } from './processes.mjs'

const isRoot = () => process.getuid?.() === 0
const environment = () => ({ ...process.env, DEBIAN_FRONTEND: 'noninteractive' })

/**
 * Installs Debian packages, or says what to run. Nothing here is cut off half-way by our own end.
 * @param {string[]} packages
 * @param {string} purpose what they are needed for, as the end of "Scrim needs …"
 */
export async function installPackages(packages, purpose) {
  const command = `apt-get install -y --no-install-recommends ${packages.join(' ')}`
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Error(`Scrim needs ${purpose}. Install it (on Debian: ${command}) and start again.`)
  }
  if (!isRoot()) throw new Error(`Scrim needs ${purpose}. As root, run:\n  ${command}\nand start again.`)
  let last = await install(packages)
  for (let attempt = 1; last.code !== 0 && attempt <= 5; attempt += 1) {
    const updated = await run('apt-get', ['-q', 'update'], { env: environment(), survives: true })
    if (updated.code !== 0) await pause(attempt * 2000)
    last = await install(packages)
  }
  if (last.code !== 0) throw new Error(`apt-get could not install ${packages.join(', ')}:\n${last.output}`)
}

function install(packages) {
  const options = ['-q', '-o', 'DPkg::Lock::Timeout=120', '-o', 'Acquire::Retries=3']
  const args = [...options, 'install', '-y', '--no-install-recommends', ...packages]
  return run('apt-get', args, { env: environment(), survives: true })
}

/** Keeps Debian's package from making and starting a cluster of its own. */
export function refuseDefaultCluster() {
  const folder = '/etc/postgresql-common/createcluster.d'
  mkdirSync(folder, { recursive: true })
  const file = `${folder}/no-main.conf`
  if (!existsSync(file)) writeFileSync(file, 'create_main_cluster = false\n')
}
