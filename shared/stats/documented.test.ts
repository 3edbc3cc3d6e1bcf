import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

const folder = new URL('./', import.meta.url)
const page = readFileSync(new URL('../../docs/statistics.md', import.meta.url), 'utf8')
const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter(
  (name) => name.endsWith('.ts') && !name.endsWith('.test.ts') && !name.endsWith('.d.ts'),
)

describe('docs/statistics.md', () => {
  it('names every function and constant that the statistics export', () => {
    const missing = files
      .filter((name) => name !== 'special-functions.ts')
      .flatMap((name) =>
        [...readFileSync(new URL(name, folder), 'utf8').matchAll(/^export (?:function|const) (\w+)/gm)].map(
          ([, exported]) => exported!,
        ),
      )
      .filter((exported) => !page.includes(`\`${exported}\``))
    expect(missing).toEqual([])
  })
  it('names every file of a method', () => {
    const bare = (name: string): string => name.split('/').at(-1)!
    expect(
      files.filter((name) => !['analysis-types.ts'].includes(name) && !page.includes(bare(name))),
    ).toEqual([])
  })
})
