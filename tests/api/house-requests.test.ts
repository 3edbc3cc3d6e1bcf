import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createAccount, getMe } from '#shared/contracts/account.ts'
import { endpoints } from '#shared/contracts/all.ts'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { addressFor, lines, refused, versionOf } from '#tests/support/refused.ts'
import { visit, type Visitor } from '#tests/support/visitor.ts'

let app: TestApp
let ines: Visitor

beforeAll(async () => {
  app = await startApp()
  ines = visit(app.url)
  const body = { name: 'Ines', email: 'ines@example.org', password: 'three quiet herons', panelName: 'Bench' }
  await ines.call(createAccount, { body })
})
afterAll(() => app.close())

const json = { 'Content-Type': 'application/json' }
const writes = endpoints.filter(({ method }) => method !== 'GET')

function send(
  endpoint: Endpoint,
  body: string | Uint8Array<ArrayBuffer>,
  headers: Record<string, string> = {},
): Promise<Response> {
  return ines.fetch(addressFor(endpoint), {
    method: endpoint.method,
    headers: { ...json, ...versionOf(endpoint), ...headers },
    body,
  })
}

describe('a write', () => {
  it('without a sign that it comes from Scrim’s own pages is forbidden at every endpoint', async () => {
    const signs: Record<string, string>[] = [
      { Origin: '' },
      { Origin: 'null' },
      { Origin: 'http://elsewhere.example' },
      { Origin: `${app.url}.elsewhere.example` },
      { Origin: 'http://elsewhere.example', 'Sec-Fetch-Site': 'cross-site' },
      { Origin: '', 'Sec-Fetch-Site': 'same-site' },
      { Origin: '', 'Sec-Fetch-Site': 'none' },
    ]
    for (const [place, endpoint] of writes.entries())
      // Every endpoint without any sign; all wrong signs where one check stands for all.
      for (const sign of place < 3 ? signs : signs.slice(0, 1))
        await refused(
          await send(endpoint, '{}', sign),
          `${lines(endpoint)} ${JSON.stringify(sign)}`,
          'forbidden',
        )
  })

  it('passes on either sign alone', async () => {
    const signs: Record<string, string>[] = [
      { Origin: app.url },
      { Origin: '', 'Sec-Fetch-Site': 'same-origin' },
    ]
    for (const sign of signs) {
      const answer = await visit(app.url).fetch('/api/session', {
        method: 'DELETE',
        headers: { ...json, ...sign },
      })
      expect(answer.status).toBe(200)
    }
  })

  it('with an Idempotency-Key that is none is malformed', async () => {
    const repeatable = endpoints.filter(({ idempotent }) => idempotent)
    expect(repeatable.length).toBeGreaterThan(0)
    for (const endpoint of repeatable)
      for (const key of ['short', 'x'.repeat(101), 'spaces in it', 'percent%00encoded', '«quoted»'])
        await refused(
          await send(endpoint, '{}', { 'Idempotency-Key': Buffer.from(key).toString('latin1') }),
          `${lines(endpoint)} ${key}`,
          'malformed',
        )
  })

  it('that edits without a version, or with one that is none, is malformed', async () => {
    const edits = endpoints.filter(({ versioned }) => versioned)
    expect(edits.length).toBeGreaterThan(0)
    for (const endpoint of edits) {
      const bare = await ines.fetch(addressFor(endpoint), {
        method: endpoint.method,
        headers: json,
        body: '{}',
      })
      await refused(bare, lines(endpoint), 'malformed')
      for (const version of ['*', 'one', '"1.5"', 'W/"1"', '-'])
        await refused(
          await send(endpoint, '{}', { 'If-Match': version }),
          `${lines(endpoint)} ${version}`,
          'malformed',
        )
    }
  })
})

describe('an address', () => {
  it('that is nothing’s gets a problem, whatever the method', async () => {
    for (const path of [
      '/api',
      '/api/',
      '/api/nothing',
      '/api/panels',
      '/api/me/more',
      '/api/panels/bench/nothing',
    ])
      for (const method of ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'])
        await refused(
          await ines.fetch(path, { method, ...(method === 'GET' ? {} : { headers: json, body: '{}' }) }),
          `${method} ${path}`,
          'not_found',
        )
    await refused(
      await ines.fetch('/api/me', { method: 'PUT', headers: json, body: '{}' }),
      'PUT',
      'not_found',
    )
  })

  it('with a part that is no id names nothing that exists', async () => {
    const wrong = ['1', 'NaN', `${randomUUID()}0`, "' or 1=1 --", '%', '\u0000', '💿', 'x'.repeat(4000)]
    for (const endpoint of endpoints) {
      // The last part of the address, behind a panel that is there.
      const name = [...endpoint.path.matchAll(/:(\w+)/g)].at(-1)?.[1]
      for (const part of name === undefined ? [] : wrong) {
        const answer = await ines.fetch(addressFor(endpoint, { [name ?? '']: part }), {
          method: endpoint.method,
          headers: { ...json, ...versionOf(endpoint) },
          ...(endpoint.method === 'GET' ? {} : { body: '{}' }),
        })
        const what = `${lines(endpoint)} ${name}=${part.slice(0, 20)}`
        await refused(answer, what, 'not_found', 'malformed', 'invalid')
      }
    }
  })

  it('that is encoded wrongly is malformed', async () => {
    for (const path of [
      '/api/panels/%E0%A4%A',
      '/api/panels/%zz/rounds',
      '/api/verdicts/%ff',
      '/api/rounds/%c0%ae',
    ])
      await refused(await ines.fetch(path), path, 'malformed')
  })

  it('asked for with a question that nobody reads is malformed', async () => {
    for (const path of [
      '/api/me?who=else',
      '/api/panels/bench?panel=other',
      '/api/me?a[b]=c',
      '/api/me?x=1&x=2',
    ])
      await refused(await ines.fetch(path), path, 'malformed')
  })

  it('of a panel that is somebody else’s is answered like one that is not there', async () => {
    const other = visit(app.url)
    const body = { name: 'O', email: 'o@example.org', password: 'three quiet herons', panelName: 'Other' }
    await other.call(createAccount, { body })
    const theirs = await refused(await ines.fetch('/api/panels/other'), 'theirs', 'not_found')
    const nobodys = await refused(await ines.fetch('/api/panels/no-such'), 'nobody’s', 'not_found')
    expect({ ...theirs, requestId: '' }).toEqual({ ...nobodys, requestId: '' })
  })
})

describe('a cookie', () => {
  it('that Scrim did not give is no sign-in', async () => {
    for (const value of ['s%3Amade-up.signature', 'plain', '%E0%A4%A', 's%3A', 'x'.repeat(3000)]) {
      const visitor = visit(app.url)
      visitor.cookies.set('scrim', value)
      expect((await visitor.call(getMe)).user).toBeNull()
      await refused(await visitor.fetch('/api/panels/bench'), value, 'not_signed_in')
    }
  })
})
