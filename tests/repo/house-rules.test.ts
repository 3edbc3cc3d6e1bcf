import { existsSync, readFileSync, statSync } from 'node:fs'
import { dirname, join, normalize } from 'node:path'
import { describe, expect, it } from 'vitest'
import { projectFiles } from './files.ts'

const files = projectFiles()
const code = files.filter((path) => /\.(ts|tsx|js|mjs|css)$/.test(path))
const pages = files.filter((path) => path.endsWith('.md'))
const text = (path: string) => readFileSync(path, 'utf8')

describe('source files', () => {
  it('have at most 300 lines, fixtures and migrations excepted', () => {
    const excepted = /^(migrations\/|tests\/fixtures\/)|\.fixture\.ts$/
    const long = code
      .filter((path) => !excepted.test(path))
      .map((path) => ({ path, lines: text(path).trimEnd().split('\n').length }))
      .filter(({ lines }) => lines > 300)
    expect(long).toEqual([])
  })

  it('name their idea: none is called utils, helpers, misc or common', () => {
    const vague = /(^|\/)(utils?|helpers?|misc|common)(\/|\.)/i
    expect(code.filter((path) => vague.test(path))).toEqual([])
  })

  it('leave nothing for later, and switch off no check but named ones of markup and hooks', () => {
    const mark = new RegExp(['TO' + 'DO', 'FIX' + 'ME', '@ts-' + '(ignore|nocheck)'].join('|'))
    const off = new RegExp('eslint-' + 'disable(-next-line|-line)?(.*)', 'g')
    const rule = /(jsx-a11y|react-hooks)\/[\w-]+|@typescript-eslint\/triple-slash-reference/.source
    const named = new RegExp(`^ ((${rule}),? ?)+(--.*)?(\\*/\\}?)?$`)
    const faulty = code.filter((path) => {
      const source = text(path)
      return (
        mark.test(source) ||
        [...source.matchAll(off)].some((match) => !named.test((match[2] ?? '').trimEnd()))
      )
    })
    expect(faulty.filter((path) => !path.startsWith('tests/repo/'))).toEqual([])
  })

  it('run every test: none is skipped or set apart', () => {
    const apart = /\b(it|test|describe)\.(only|skip|todo)\b/
    const tests = code.filter((path) => /\.test\.tsx?$/.test(path) && !path.startsWith('tests/repo/'))
    expect(tests.filter((path) => apart.test(text(path)))).toEqual([])
  })
})

describe('pages', () => {
  /** Targets of a page's links that are files, without those in code. */
  const links = (page: string) => {
    const prose = text(page)
      .replace(/^```[\s\S]*?^```/gm, '')
      .replace(/`[^`\n]*`/g, '')
    return [...prose.matchAll(/\]\(([^)\s]+)(?:\s+"[^"]*")?\)/g)].map((match) => match[1] ?? '')
  }

  it('link to files and headings that are there', () => {
    const broken = pages.flatMap((page) =>
      links(page)
        .filter((link) => !/^[a-z]+:/i.test(link))
        .filter((link) => {
          const [path = '', heading] = link.split('#')
          const file = path === '' ? page : normalize(join(dirname(page), decodeURIComponent(path)))
          if (file.startsWith('..') || !existsSync(file)) return true
          return heading !== undefined && statSync(file).isFile() && !headings(file).includes(heading)
        })
        .map((link) => `${page}: ${link}`),
    )
    expect(broken).toEqual([])
  })

  it('name files of the project that are there', () => {
    const paths = /`((?:server|shared|src|scripts|tests|docs|migrations|seeders)\/[\w./-]+\.\w+)`/g
    const missing = pages.flatMap((page) =>
      [...text(page).matchAll(paths)]
        .map((match) => match[1] ?? '')
        .filter((path) => !path.includes('NNNN') && !existsSync(path))
        .map((path) => `${page}: ${path}`),
    )
    expect(missing).toEqual([])
  })

  const headings = (page: string) =>
    [...text(page).matchAll(/^#+\s+(.*)$/gm)].map((match) =>
      (match[1] ?? '')
        .toLowerCase()
        .replace(/[^\p{L}\p{N}\s_-]/gu, '')
        .trim()
        .replace(/\s/g, '-'),
    )
})

describe('package-lock.json', () => {
  const lock = JSON.parse(text('package-lock.json')) as { packages: Record<string, Record<string, unknown>> }

  it('carries no address of a registry, and a checksum for each package', () => {
    const entries = Object.entries(lock.packages).filter(([path]) => path !== '')
    expect(entries.length).toBeGreaterThan(100)
    expect(entries.filter(([, entry]) => 'resolved' in entry && entry.link !== true)).toEqual([])
    expect(entries.filter(([, entry]) => typeof entry.integrity !== 'string' && !entry.inBundle)).toEqual([])
    expect(text('package-lock.json')).not.toMatch(/https?:\/\/[^"]*\.tgz/)
  })

  it('names the very versions of package.json', () => {
    const { dependencies, devDependencies } = JSON.parse(text('package.json')) as Record<
      string,
      Record<string, string>
    >
    for (const [name, version] of Object.entries({ ...dependencies, ...devDependencies })) {
      expect(version, name).toMatch(/^\d+\.\d+\.\d+$/)
      expect(lock.packages[`node_modules/${name}`]?.version, name).toBe(version)
    }
  })
})
