import { randomUUID } from 'node:crypto'
import { gzipSync } from 'node:zlib'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createAccount, getMe } from '#shared/contracts/account.ts'
import { endpoints } from '#shared/contracts/all.ts'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { getPanel } from '#shared/contracts/panels.ts'
import { limits } from '#shared/domain/limits.ts'
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
const jsonWrites = endpoints.filter(({ method, kind }) => method !== 'GET' && kind === 'json')

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

describe('a body', () => {
  it.each<[string, unknown]>([
    ['a list', []],
    ['a list of lists', [[[]]]],
    ['an object of strangers', { nobody: 1, asked: { for: ['this'] } }],
    ['a prototype', JSON.parse('{"__proto__":{"admin":true},"constructor":{"prototype":{}}}')],
  ])('that is %s instead of what is asked for gets a problem at every endpoint', async (_name, body) => {
    for (const endpoint of jsonWrites)
      await refused(
        await send(endpoint, JSON.stringify(body)),
        lines(endpoint),
        'invalid',
        'not_found',
        'forbidden',
      )
  })

  it('with every field of a wrong type gets a problem that names fields', async () => {
    const wrong = [1, true, null, [1], { a: 1 }, -1e308]
    for (const endpoint of jsonWrites) {
      const fields = Object.keys((endpoint.body as unknown as { shape?: object }).shape ?? {})
      if (fields.length === 0) continue
      for (const value of [{ never: [{ right: null }] }, ...wrong]) {
        const body = JSON.stringify(Object.fromEntries(fields.map((field) => [field, value])))
        const told = await refused(await send(endpoint, body), `${lines(endpoint)} ${body}`)
        if (told.code === 'invalid')
          expect(Object.keys(told.fields ?? {}).length, lines(endpoint)).toBeGreaterThan(0)
      }
    }
  })

  it.each(['{"name":', '"text"', '7', 'null', 'NaN', '{"a":1}}', "{'a':1}", '\u0000'])(
    'that is no JSON object (%j) is malformed or asked for in full',
    async (body) => {
      for (const endpoint of jsonWrites)
        await refused(
          await send(endpoint, body),
          `${lines(endpoint)} ${body}`,
          'malformed',
          'invalid',
          'not_found',
          'forbidden',
        )
    },
  )

  it('of ten megabytes is too large, also when it was pressed small', async () => {
    const least = 10 * 1024 * 1024
    for (const endpoint of jsonWrites.filter(
      ({ audience }) => audience === 'anyone' || audience === 'panel',
    )) {
      const large = Buffer.alloc(Math.max(least, (endpoint.bodyLimit ?? 0) + 1), 'x')
      large.write('{"name":"')
      large.write('"}', large.length - 2)
      const pressed = gzipSync(large, { level: 1 })
      expect(pressed.length).toBeLessThan(limits.jsonBytes)
      await refused(await send(endpoint, large), lines(endpoint), 'too_large')
      await refused(
        await send(endpoint, pressed, { 'Content-Encoding': 'gzip' }),
        lines(endpoint),
        'too_large',
      )
    }
  })

  it('nested a hundred thousand deep is refused and the server goes on', async () => {
    const deep = `${'['.repeat(100_000)}${']'.repeat(100_000)}`
    const objects = `${'{"a":'.repeat(30_000)}1${'}'.repeat(30_000)}`
    for (const endpoint of jsonWrites.filter(({ audience }) => audience === 'anyone' || audience === 'panel'))
      for (const body of [deep, objects, `{"name":${deep}}`])
        await refused(await send(endpoint, body), lines(endpoint), 'invalid', 'not_found', 'forbidden')
    expect((await ines.call(getMe)).user?.name).toBe('Ines')
  })

  it('of another kind than JSON is malformed', async () => {
    const kinds: Record<string, string> = {
      'text/plain': '{"email":"ines@example.org"}',
      'application/x-www-form-urlencoded': 'email=ines%40example.org&password=x',
      'multipart/form-data; boundary=x': '--x--',
      'application/json; charset=koi8-r': '{}',
    }
    for (const endpoint of jsonWrites)
      for (const [kind, body] of Object.entries(kinds))
        await refused(
          await send(endpoint, body, { 'Content-Type': kind }),
          `${lines(endpoint)} ${kind}`,
          'malformed',
          'not_found',
        )
    const unpacked = await send(jsonWrites[0] as Endpoint, '{}', { 'Content-Encoding': 'gzip' })
    await refused(unpacked, 'not gzip at all', 'malformed')
    const unknown = await send(jsonWrites[0] as Endpoint, '{}', { 'Content-Encoding': 'squeezed' })
    await refused(unknown, 'an unknown encoding', 'malformed')
  })
})

describe('text', () => {
  const signUp = async (name: string, panelName: string) => {
    const visitor = visit(app.url)
    const email = `p${randomUUID()}@example.org`
    const me = await visitor.call(createAccount, {
      body: { name, email, password: 'three quiet herons', panelName },
    })
    const panel = await visitor.call(getPanel, { params: { panel: me.panels[0]?.slug ?? '' } })
    return { name: me.user?.name, panel: panel.name, member: panel.you.name }
  }

  it('in any script, with emoji and right-to-left, comes back as it was typed', async () => {
    const name = 'Zoë 👩🏽‍🚀 שלום أحمد 李'
    expect(await signUp(name, '🎧 لوحة الاستماع 🎧')).toEqual({
      name,
      panel: '🎧 لوحة الاستماع 🎧',
      member: name,
    })
  })

  it('loses what nobody can see: NUL, control characters, turned reading direction, halves of a character', async () => {
    const told = await signUp('A\u0000d\u0007a \u202Eevil\u202C', 'Be\u0000nch \ud800 two\u2066')
    expect(told).toEqual({ name: 'Ada evil', panel: 'Bench two', member: 'Ada evil' })
  })

  it('of nothing but that is no text', async () => {
    const body = {
      name: '\u0000\u202e \ud800',
      email: 'x@example.org',
      password: 'three quiet herons',
      panelName: ' ',
    }
    const told = await refused(await send(createAccount, JSON.stringify(body)), 'unseen', 'invalid')
    expect(Object.keys(told.fields ?? {}).sort()).toEqual(['name', 'panelName'])
  })

  it('with a NUL in a password is a password like any other', async () => {
    const visitor = visit(app.url)
    const password = 'quiet\u0000herons three'
    const body = { name: 'N', email: `p${randomUUID()}@example.org`, password, panelName: 'N' }
    expect((await visitor.call(createAccount, { body })).user?.name).toBe('N')
  })
})
