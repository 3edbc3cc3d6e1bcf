import { spawn, type ChildProcess } from 'node:child_process'
import { chmodSync, cpSync, mkdtempSync, realpathSync, rmSync, symlinkSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { mark, sourcesFingerprint } from '../../scripts/start/fingerprints.mjs'
import { isAlive, pause, processesIn } from '../../scripts/start/processes.mjs'

/** A built copy of the project in a folder of its own, to start and kill. */
export interface ProjectCopy {
  root: string
  start(...options: string[]): Promise<StartedProject>
  /** Numbers of all processes that work in the copy: start script, server, PostgreSQL. */
  processes(): number[]
  remove(): void
}

export interface StartedProject {
  npm: ChildProcess
  /** The first address that was printed. */
  address: string
  printed(): string
}

/** Everything that works in the copy, killed without notice, as in a power cut. */
export function killAll(copy: ProjectCopy): void {
  for (const pid of copy.processes()) process.kill(pid, 'SIGKILL')
}

/** Waits until nothing works in the copy any more. */
export async function allGone(copy: ProjectCopy): Promise<void> {
  while (copy.processes().length > 0) await pause(50)
}

export function copyBuiltProject(): ProjectCopy {
  const root = realpathSync(mkdtempSync(join(tmpdir(), 'scrim-copy-')))
  chmodSync(root, 0o711)
  for (const name of ['package.json', 'package-lock.json', '.npmrc', 'scripts', 'dist']) {
    cpSync(name, join(root, name), { recursive: true })
  }
  symlinkSync(realpathSync('node_modules'), join(root, 'node_modules'))
  mark(join(root, 'dist', 'fingerprint'), sourcesFingerprint(root))
  const processes = () =>
    [root, join(root, '.scrim', 'pg')].flatMap((folder) => processesIn(folder) ?? []).filter(isAlive)
  return {
    root,
    processes,
    start: (...options) => start(root, options),
    remove: () => rmSync(root, { recursive: true, force: true }),
  }
}

async function start(root: string, options: string[]): Promise<StartedProject> {
  const npm = spawn('npm', ['start', '--', ...options], { cwd: root, stdio: ['ignore', 'pipe', 'pipe'] })
  let output = ''
  for (const stream of [npm.stdout, npm.stderr]) {
    stream.setEncoding('utf8').on('data', (text: string) => (output += text))
  }
  while (!/http:\/\/\S+\s/.test(output)) {
    if (npm.exitCode !== null) throw new Error(`npm start ended:\n${output}`)
    await pause(50)
  }
  return { npm, address: /http:\/\/\S+/.exec(output)?.[0] ?? '', printed: () => output }
}
