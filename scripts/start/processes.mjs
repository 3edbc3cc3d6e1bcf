import { spawn } from 'node:child_process'
import { readFileSync, readdirSync, readlinkSync, realpathSync } from 'node:fs'

/** Children that die with us: each leads its own process group, so that its children go too. */
const children = new Set()

/**
 * Runs a command to its end.
 * @param {string} command
 * @param {string[]} args
 * @param {{ cwd?: string, env?: NodeJS.ProcessEnv, input?: string, uid?: number, gid?: number,
 *   survives?: boolean, onLine?: (line: string) => void, timeoutMs?: number }} [options]
 *   `survives`: is left alone when we are told to end (a package manager must not be cut off half-way)
 * @returns {Promise<{ code: number, output: string, stdout: string }>} code 127 when the command is missing;
 *   output is stdout and stderr in the order they came
 */
export function run(command, args, options = {}) {
  const { cwd, env = process.env, input, uid, gid, survives = false, onLine, timeoutMs } = options
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd, env, uid, gid, detached: true, timeout: timeoutMs })
    if (!survives) children.add(child)
    let output = ''
    let stdout = ''
    const take = (text) => {
      output += text
      if (onLine) for (const line of text.split('\n')) if (line.trim()) onLine(line)
    }
    child.stdout.setEncoding('utf8').on('data', (text) => {
      stdout += text
      take(text)
    })
    child.stderr.setEncoding('utf8').on('data', take)
    child.stdin.on('error', () => {})
    child.stdin.end(input ?? '')
    const end = (code) => {
      children.delete(child)
      resolve({ code, output, stdout })
    }
    child.on('error', (error) => {
      output += error.message
      end(127)
    })
    child.on('close', (code, signal) => end(signal ? 128 : (code ?? 1)))
  })
}

/**
 * A child whose output goes straight to ours, for programs that stay.
 * @param {string} command
 * @param {string[]} args
 * @param {import('node:child_process').SpawnOptions} options
 */
export function spawnTracked(command, args, options) {
  const child = spawn(command, args, { ...options, detached: true })
  children.add(child)
  child.on('exit', () => children.delete(child))
  return child
}

/** Asks all tracked children to end, and makes them end after `graceMs`. */
export async function endChildren(graceMs = 900) {
  const gone = [...children].map((child) => new Promise((resolve) => child.once('exit', resolve)))
  signalGroups('SIGTERM')
  const timer = setTimeout(() => signalGroups('SIGKILL'), graceMs)
  await Promise.all(gone)
  clearTimeout(timer)
}

function signalGroups(signal) {
  for (const child of children) {
    try {
      process.kill(-child.pid, signal)
    } catch {
      children.delete(child)
      child.emit('exit', null, signal)
    }
  }
}

/** @param {number} pid */
export function isAlive(pid) {
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    return error.code === 'EPERM'
  }
}

/**
 * Names a process so that a later one with the same number is not taken for it: "PID START" on Linux.
 * A dead process that nobody has collected yet (a zombie) has no start.
 * @param {number} [pid]
 */
export function identity(pid = process.pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8')
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ')
    return fields[0] === 'Z' ? `${pid} dead` : `${pid} ${fields[19]}`
  } catch {
    return String(pid)
  }
}

/** @param {string} name as `identity` gave it */
export function stillRuns(name) {
  const pid = Number(name.split(' ')[0])
  if (!Number.isInteger(pid) || pid <= 0 || !isAlive(pid)) return false
  return !name.includes(' ') || identity(pid) === name.trim()
}

/**
 * Numbers of the processes whose working folder is `folder`: postgres and all its children sit in their data.
 * @param {string} folder
 * @returns {number[] | undefined} undefined where the system does not tell (no /proc)
 */
export function processesIn(folder) {
  let real
  try {
    real = realpathSync(folder)
    readlinkSync('/proc/self/cwd')
  } catch {
    return undefined
  }
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .filter((name) => {
      try {
        return readlinkSync(`/proc/${name}/cwd`) === real
      } catch {
        return false
      }
    })
    .map(Number)
}

/** @param {number} ms */
export const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms))
