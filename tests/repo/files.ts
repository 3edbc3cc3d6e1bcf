import { execFileSync } from 'node:child_process'
import { existsSync, readdirSync } from 'node:fs'

const skipped = new Set(['node_modules', 'dist', 'coverage', 'screens'])

/** Every file of the project that is or would be committed, as paths with forward slashes. */
export function projectFiles(): string[] {
  try {
    const list = execFileSync('git', ['ls-files', '-z', '--cached', '--others', '--exclude-standard'], {
      encoding: 'utf8',
      stdio: ['ignore', 'pipe', 'ignore'],
    })
    return list.split('\0').filter((path) => path && existsSync(path))
  } catch {
    return walk('.')
  }
}

/** Without Git, as in an unpacked archive. */
function walk(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = folder === '.' ? entry.name : `${folder}/${entry.name}`
    if (skipped.has(entry.name) || (entry.name.startsWith('.') && entry.name !== '.ci')) return []
    return entry.isDirectory() ? walk(path) : [path]
  })
}
