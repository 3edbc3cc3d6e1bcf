import { createHash } from 'node:crypto'
import { existsSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

/** What the build depends on. Tests are left out: editing one is no reason to build. */
const sources = [
  'index.html',
  'package.json',
  'package-lock.json',
  'vite.config.ts',
  'tsconfig.base.json',
  'public',
  'shared',
  'server',
  'src',
  'migrations',
  'seeders',
  'scripts/build.mjs',
]

const isTest = (name) => /\.test\.tsx?$/.test(name)

/**
 * SHA-256 over names and bytes of all sources of the build, hex.
 * @param {string} root
 */
export function sourcesFingerprint(root) {
  const hash = createHash('sha256').update(process.versions.node)
  const add = (path) => {
    const full = join(root, path)
    if (!existsSync(full)) return
    if (statSync(full).isDirectory()) {
      for (const name of readdirSync(full).sort()) if (!name.startsWith('.')) add(`${path}/${name}`)
    } else if (!isTest(path)) {
      const bytes = readFileSync(full)
      hash.update(`\0${path}\0${bytes.length}\0`).update(bytes)
    }
  }
  for (const source of sources) add(source)
  return hash.digest('hex')
}

/**
 * SHA-256 of the lock file and of what decides which binaries are installed, hex.
 * @param {string} root
 */
export function lockFingerprint(root) {
  const { platform, arch, version } = process
  const lock = readFileSync(join(root, 'package-lock.json'))
  return createHash('sha256')
    .update(`${platform} ${arch} ${version.split('.')[0]}`)
    .update(lock)
    .digest('hex')
}

/** @param {string} file @param {string} fingerprint */
export const isMarked = (file, fingerprint) =>
  existsSync(file) && readFileSync(file, 'utf8').trim() === fingerprint

/** @param {string} file @param {string} fingerprint */
export const mark = (file, fingerprint) => writeFileSync(file, `${fingerprint}\n`)
