/**
 * Builds the browser's part into dist/client and the server into dist/server. `--if-changed` does nothing when
 * the sources are those of the last build.
 */
import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { projectRoot } from './postgres.mjs'
import { isMarked, mark, sourcesFingerprint } from './start/fingerprints.mjs'
import { run } from './start/processes.mjs'

/**
 * @param {{ root?: string, ifChanged?: boolean, say?: (line: string) => void }} [options]
 * @returns {Promise<boolean>} whether anything was built
 */
export async function build({ root = projectRoot, ifChanged = false, say = () => {} } = {}) {
  const marker = join(root, 'dist', 'fingerprint')
  const fingerprint = sourcesFingerprint(root)
  if (ifChanged && isMarked(marker, fingerprint)) return false
  say('Building')
  rmSync(marker, { force: true })
  const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js')
  const env = { ...process.env, NODE_ENV: 'production' }
  const parts = [
    ['build', '--logLevel', 'warn'],
    ['build', '--logLevel', 'warn', '--ssr', 'server/index.ts'],
  ]
  const done = await Promise.all(
    parts.map((args) => run(process.execPath, [vite, ...args], { cwd: root, env })),
  )
  const failed = done.filter(({ code }) => code !== 0)
  if (failed.length > 0)
    throw new Error(`The build failed:\n${failed.map(({ output }) => output).join('\n')}`)
  mark(marker, fingerprint)
  return true
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  try {
    const built = await build({ ifChanged: process.argv.includes('--if-changed') })
    console.log(built ? 'Built into dist.' : 'The build is up to date.')
  } catch (error) {
    console.error(error.message)
    process.exitCode = 1
  }
}
