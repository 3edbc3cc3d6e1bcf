import { mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { createServer, type AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { chooseAddress } from './application.mjs'
import { sourcesFingerprint } from './fingerprints.mjs'
import { parseOptions } from './options.mjs'
import { rolesSql } from './pg-roles.mjs'
import { freePort } from './ports.mjs'
import { keptSecret } from './secret.mjs'
import { countReport } from './stages.mjs'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'scrim-start-'))
})
afterEach(() => rmSync(folder, { recursive: true }))

describe('the options of npm start', () => {
  it('are the demo on port 4600 when none is given', () => {
    expect(parseOptions([])).toEqual({ mode: 'demo', lan: false, dev: false, help: false, port: 4600 })
  })

  it('take --live, --lan and --port, and prefer --port to PORT', () => {
    const options = parseOptions(['--live', '--lan', '--port', '8080'], { PORT: '9090' })
    expect(options).toMatchObject({ mode: 'live', lan: true, port: 8080 })
    expect(parseOptions([], { PORT: '9090' }).port).toBe(9090)
  })

  it.each([['--lvie'], ['--port', 'many'], ['--port', '0'], ['--port', '65536'], ['live']])(
    'refuse %s %s',
    (...args) => {
      expect(() => parseOptions(args)).toThrow(RangeError)
    },
  )
})

describe('the port', () => {
  it('that is taken is left alone, another is used, and that is said', async () => {
    const holder = createServer()
    await new Promise<void>((resolve) => holder.listen(0, '127.0.0.1', resolve))
    const { port } = holder.address() as AddressInfo
    const said: string[] = []
    const chosen = await chooseAddress({ lan: false, port }, {}, (line: string) => said.push(line))
    expect(chosen.port).not.toBe(port)
    expect(chosen.address).toBe(`http://127.0.0.1:${chosen.port}`)
    expect(said).toEqual([`Port ${port} is taken: using ${chosen.port}`])
    await new Promise((resolve) => holder.close(resolve))
    expect(await freePort('127.0.0.1', port)).toBe(port)
  })

  it('stays out of the address when a proxy with TLS stands in front', async () => {
    const env = { SCRIM_ADDRESS: 'https://panel.example' }
    const port = await freePort('127.0.0.1')
    expect(await chooseAddress({ lan: false, port }, env, () => {})).toMatchObject({
      port,
      address: 'https://panel.example',
    })
  })
})

describe('the secret', () => {
  it('is made once, has 32 bytes, and only its owner may read it', () => {
    const file = join(folder, 'state', 'secret')
    const secret = keptSecret(file)
    expect(secret).toMatch(/^[0-9a-f]{64}$/)
    expect(keptSecret(file)).toBe(secret)
    expect(statSync(file).mode & 0o777).toBe(0o600)
    expect(keptSecret(join(folder, 'other'))).not.toBe(secret)
  })

  it('is not used when the file was damaged', () => {
    const file = join(folder, 'secret')
    writeFileSync(file, 'short')
    expect(() => keptSecret(file)).toThrow(/64 hex digits/)
    expect(readFileSync(file, 'utf8')).toBe('short')
  })
})

describe('the fingerprint of the sources', () => {
  it('changes with a byte and with a name, and not with a test', () => {
    mkdirSync(join(folder, 'src'))
    writeFileSync(join(folder, 'src', 'a.ts'), 'one')
    const first = sourcesFingerprint(folder)
    writeFileSync(join(folder, 'src', 'a.test.ts'), 'a test')
    expect(sourcesFingerprint(folder)).toBe(first)
    writeFileSync(join(folder, 'src', 'a.ts'), 'two')
    const second = sourcesFingerprint(folder)
    expect(second).not.toBe(first)
    rmSync(join(folder, 'src', 'a.ts'))
    writeFileSync(join(folder, 'src', 'b.ts'), 'two')
    expect(sourcesFingerprint(folder)).not.toBe(second)
  })
})

describe('the roles of the database', () => {
  const passwords = { postgres: 'p', scrim_owner: 'o', scrim_app: 'a' }

  it('give the application no right that would let it past the tables’ rules', () => {
    const sql = rolesSql(passwords, ['scrim_demo'])
    const application = sql.split(';').find((statement) => statement.includes('alter role scrim_app')) ?? ''
    for (const right of ['nosuperuser', 'nobypassrls', 'nocreaterole', 'nocreatedb', 'noinherit']) {
      expect(application).toContain(right)
    }
    expect(sql).toContain('revoke all on database scrim_demo from public')
  })
})

describe('the count of a test report', () => {
  it('takes a file that could not be loaded for a failed test', () => {
    const results = [
      { status: 'failed', assertionResults: [] },
      { status: 'failed', assertionResults: [{}, {}] },
      { status: 'passed', assertionResults: [{}] },
    ]
    const report = { numPassedTests: 2, numFailedTests: 1, testResults: results }
    expect(countReport(report)).toEqual({ passed: 2, failed: 2 })
  })
})
