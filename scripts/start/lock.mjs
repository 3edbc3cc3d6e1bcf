import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { identity, pause, stillRuns } from './processes.mjs'

/**
 * Holds a lock file while `work` runs. The file is written aside and then linked into place, so that it is
 * never seen half-written; a lock whose holder is dead is taken away.
 * @template T
 * @param {string} path
 * @param {() => Promise<T>} work
 * @param {{ waitMs?: number, onWait?: () => void }} [options] waitMs: how long to wait for another holder
 * @returns {Promise<T>}
 */
export async function withLock(path, work, { waitMs = 600_000, onWait } = {}) {
  const until = Date.now() + waitMs
  let told = false
  while (!take(path)) {
    if (Date.now() >= until) throw new LockBusy(path)
    if (!told) onWait?.()
    told = true
    await pause(50)
  }
  try {
    return await work()
  } finally {
    rmSync(path, { force: true })
  }
}

export class LockBusy extends Error {
  /** @param {string} path */
  constructor(path) {
    super(`Another process holds ${path}.`)
    this.name = 'LockBusy'
  }
}

let attempts = 0

function take(path) {
  const mine = `${path}.${process.pid}.${++attempts}`
  writeFileSync(mine, identity(), { mode: 0o600 })
  try {
    linkSync(mine, path)
    return true
  } catch (error) {
    if (error.code !== 'EEXIST') throw error
    clearStale(path, `${mine}.stale`)
    return false
  } finally {
    rmSync(mine, { force: true })
  }
}

/** Moves the lock of a dead holder aside; puts it back when it turns out to be a newer, living one. */
function clearStale(path, aside) {
  try {
    if (stillRuns(readFileSync(path, 'utf8'))) return
    renameSync(path, aside)
    if (stillRuns(readFileSync(aside, 'utf8'))) linkSync(aside, path)
  } catch (error) {
    if (error.code !== 'ENOENT' && error.code !== 'EEXIST') throw error
  } finally {
    rmSync(aside, { force: true })
  }
}
