import { execFile } from 'node:child_process'
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

const script = fileURLToPath(new URL('../analyse.mjs', import.meta.url))
const machines = fileURLToPath(new URL('../../tests/fixtures/stats/machines.csv', import.meta.url))

interface Answer {
  readonly code: number
  readonly out: string
  readonly problem: string
}

const run = (...args: string[]): Promise<Answer> =>
  new Promise((done) => {
    execFile(process.execPath, [script, ...args], { maxBuffer: 1e8 }, (error, out, problem) => {
      done({ code: error ? Number(error.code) : 0, out, problem })
    })
  })

let folder = ''
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'analyse-'))
})
afterAll(() => rm(folder, { recursive: true, force: true }))

describe('the analyse command', () => {
  it('prints the published estimates of Machines as JSON', { timeout: 180_000 }, async () => {
    const { code, out, problem } = await run(machines, '--draws', '0')
    expect([code, problem]).toEqual([0, ''])
    const found = JSON.parse(out) as {
      descriptors: Record<string, { model: { varianceComponents: Record<string, number> }; durbin: object }>
    }
    const { model } = found.descriptors['productivity']!
    expect(model.varianceComponents['panelist']).toBeCloseTo(22.858444, 4)
    expect(model.varianceComponents['panelist:unit']).toBeCloseTo(13.909457, 4)
    expect(model.varianceComponents['residual']).toBeCloseTo(0.92463, 5)
  })

  it('prints the same again, byte for byte, for the same seed', { timeout: 180_000 }, async () => {
    const [first, second] = [await run(machines, '--seed', 'x'), await run(machines, '--seed', 'x')]
    expect(first.code).toBe(0)
    expect(second.out).toBe(first.out)
  })

  it('names every fault of a bad file and analyses nothing', { timeout: 180_000 }, async () => {
    const bad = join(folder, 'bad.csv')
    await writeFile(
      bad,
      'panelist,unit,descriptor,replicate,position,score\n1,A,b,1,,x\n1,A,b,1,,3\n1,A,b,1,,4\n',
    )
    const { code, out, problem } = await run(bad)
    expect([code, out]).toEqual([1, ''])
    expect(JSON.parse(problem)).toMatchObject({
      title: 'The ratings file has faults',
      problems: [
        { line: 2, column: 'score', reason: 'not-a-number' },
        { line: 4, reason: 'duplicate' },
      ],
    })
  })

  it('says how to call it, and that a file is not there', { timeout: 180_000 }, async () => {
    for (const args of [[], ['a.csv', 'b.csv'], [machines, '--draws', 'many'], [machines, '--wrong']]) {
      const { code, problem } = await run(...args)
      expect(code).toBe(1)
      expect((JSON.parse(problem) as { detail: string }).detail).toContain(
        'npm run --silent analyse -- FILE.csv',
      )
    }
    const { code, problem } = await run(join(folder, 'nothing.csv'))
    expect(code).toBe(1)
    expect(problem).toContain('ENOENT')
  })
})
