import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { isMarked, lockFingerprint, mark } from './fingerprints.mjs'
import { pause, run } from './processes.mjs'

/** Says what to do when this Node is not one that `engines` in package.json names. */
export function requireNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if ((major === 20 && minor >= 11) || major === 21 || major === 22) return
  throw new Error(`Scrim runs on Node 20.11 and newer, up to 22; this is Node ${process.versions.node}.`)
}

/**
 * Installs the packages that the lock file names, build tools too; does nothing when they are there.
 * @param {string} root
 * @param {(line: string) => void} say
 */
export async function ensurePackages(root, say) {
  const marker = join(root, 'node_modules', '.scrim-lock')
  const fingerprint = lockFingerprint(root)
  if (isMarked(marker, fingerprint)) return
  if (holdsLockedVersions(root)) {
    mark(marker, fingerprint)
    return
  }
  say('Installing packages (under a minute)')
  const npm = process.env.npm_execpath
  const [command, before] = npm?.endsWith('.js') ? [process.execPath, [npm]] : ['npm', []]
  const args = [...before, 'ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error']
  let last = { code: 1, output: '' }
  for (let attempt = 0; attempt < 2 && last.code !== 0; attempt += 1) {
    if (attempt > 0) await pause(3000)
    last = await run(command, args, { cwd: root })
  }
  if (last.code !== 0) throw new Error(`npm ci failed:\n${last.output}`)
  mark(marker, fingerprint)
}

/** Whether somebody has installed these very versions by hand. Optional packages may be absent. */
function holdsLockedVersions(root) {
  const installed = join(root, 'node_modules', '.package-lock.json')
  if (!existsSync(installed)) return false
  const wanted = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8')).packages
  const found = JSON.parse(readFileSync(installed, 'utf8')).packages
  return Object.entries(wanted).every(
    ([path, entry]) => path === '' || entry.optional || found[path]?.version === entry.version,
  )
}
