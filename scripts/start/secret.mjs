import { randomBytes } from 'node:crypto'
import { existsSync, linkSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'

/**
 * The secret that signs sessions: 32 random bytes as hex, made once and kept in a file that only its owner reads.
 * @param {string} file
 */
export function keptSecret(file) {
  if (!existsSync(file)) {
    mkdirSync(dirname(file), { recursive: true })
    const making = `${file}.${process.pid}`
    writeFileSync(making, `${randomBytes(32).toString('hex')}\n`, { mode: 0o600 })
    try {
      linkSync(making, file)
    } catch (error) {
      if (error.code !== 'EEXIST') throw error
    } finally {
      rmSync(making, { force: true })
    }
  }
  const secret = readFileSync(file, 'utf8').trim()
  if (!/^[0-9a-f]{64}$/.test(secret))
    throw new Error(`${file} does not hold 64 hex digits. Remove it to get a new one.`)
  return secret
}
