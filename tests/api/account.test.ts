import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import * as account from '#shared/contracts/account.ts'
import { getPanel } from '#shared/contracts/panels.ts'
import { CallError } from '#src/lib/call.ts'
import { firstOrganiserToken } from '#server/auth/tokens.ts'
import { User } from '#server/models/user.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { standingClock } from '#tests/support/clock.ts'
import { visit, type Visitor } from '#tests/support/visitor.ts'

const clock = standingClock()
let app: TestApp

beforeAll(async () => {
  app = await startApp({ clock })
})
afterAll(() => app.close())

const password = 'three quiet herons'
let people = 0
const someone = (more: Partial<Parameters<typeof sign>[1]> = {}) => ({
  name: 'Runa Holt',
  email: `runa${++people}@example.org`,
  password,
  panelName: `Bench ${people}`,
  ...more,
})
const sign = (
  visitor: Visitor,
  body: {
    name: string
    email: string
    password: string
    panelName: string
    timeZone?: string
    first?: string
  },
) => visitor.call(account.createAccount, { body })

/** The problem that a call ends with. */
async function problemOf(work: Promise<unknown>): Promise<CallError['problem']> {
  const error = await work.then(
    () => undefined,
    (thrown: unknown) => thrown,
  )
  if (!(error instanceof CallError)) throw new Error('The call succeeded.', { cause: error })
  return error.problem
}

async function askForLink(visitor: Visitor, email: string): Promise<string | undefined> {
  const before = app.sent.length
  expect(await visitor.call(account.askReset, { body: { email } })).toEqual({ done: true })
  await app.runJobs()
  const message = app.sent.slice(before)
  expect(message.length).toBeLessThanOrEqual(1)
  return message[0]?.text.match(/\/reset\/([\w-]+)/)?.[1]
}

describe('an account', () => {
  it('is made together with a panel, and its maker is signed in with every role', async () => {
    const visitor = visit(app.url)
    expect((await visitor.call(account.getMe)).user).toBeNull()
    const body = someone({ panelName: 'Žižkov  Ear Club', email: ' Runa.Holt@Example.ORG ' })
    const me = await sign(visitor, body)
    expect(me).toMatchObject({
      user: { name: 'Runa Holt', email: 'runa.holt@example.org', version: 1 },
      panels: [{ slug: 'zizkov-ear-club', name: 'Žižkov Ear Club' }],
      seats: [],
      duties: [],
      mode: 'demo',
    })
    expect(me.panels[0]?.roles).toEqual(['organiser', 'keeper', 'steward', 'panelist', 'editor'])
    expect(await visitor.call(account.getMe)).toEqual(me)
  })

  it('keeps its password as argon2id and never as it was typed', async () => {
    const { user } = await sign(visit(app.url), someone())
    const row = await User.findByPk(user?.id)
    expect(row?.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
    expect(JSON.stringify(row)).not.toContain(password)
  })

  it('gives two panels of one name two addresses, also for names without a Latin letter', async () => {
    const named = async (panelName: string) =>
      (await sign(visit(app.url), someone({ panelName }))).panels[0]?.slug
    expect(await named('The Weir')).toBe('the-weir')
    expect(await named('the  WEIR')).toBe('the-weir-2')
    expect(await named('لوحة الاستماع')).toBe('panel')
    expect(await named('🎧🎧')).toBe('panel-2')
    expect((await Promise.all([named('Same time'), named('Same time')])).sort()).toEqual([
      'same-time',
      'same-time-2',
    ])
  })

  it('cannot be made twice for one address, in whatever case it is written', async () => {
    const body = someone()
    await sign(visit(app.url), body)
    const again = visit(app.url)
    const problem = await problemOf(sign(again, { ...body, email: body.email.toUpperCase() }))
    expect(problem).toMatchObject({
      status: 422,
      code: 'invalid',
      fields: { email: expect.stringMatching(/account/) },
    })
    expect((await again.call(account.getMe)).user).toBeNull()
  })

  it('names every field at fault at once', async () => {
    const problem = await problemOf(
      sign(visit(app.url), { name: ' ', email: 'nobody', password: 'short', panelName: '\u200e' }),
    )
    expect(problem.status).toBe(422)
    expect(Object.keys(problem.fields ?? {}).sort()).toEqual(['email', 'name', 'panelName', 'password'])
  })

  it('takes a browser’s unknown time zone for UTC instead of refusing the person', async () => {
    const visitor = visit(app.url)
    const me = await sign(visitor, someone({ timeZone: 'Middle/Nowhere' }))
    const panel = await visitor.call(getPanel, { params: { panel: me.panels[0]?.slug ?? '' } })
    expect(panel.timeZone).toBe('UTC')
  })
})

describe('signing in', () => {
  it('says the same for a wrong password and for an unknown address', async () => {
    const body = someone()
    await sign(visit(app.url), body)
    const wrong = await problemOf(
      visit(app.url).call(account.createSession, { body: { email: body.email, password: 'wrong password' } }),
    )
    const unknown = await problemOf(
      visit(app.url).call(account.createSession, { body: { email: 'not.there@example.org', password } }),
    )
    expect(wrong).toMatchObject({ status: 422, fields: { password: expect.any(String) as string } })
    expect({ ...unknown, requestId: '' }).toEqual({ ...wrong, requestId: '' })
  })

  it('lasts until signing out, and gives the browser a new session number', async () => {
    const body = someone()
    await sign(visit(app.url), body)
    const visitor = visit(app.url)
    await visitor.call(account.createSession, { body: { email: body.email, password } })
    const first = visitor.cookies.get('scrim')
    expect(first).toBeDefined()
    await visitor.call(account.createSession, { body: { email: body.email, password } })
    const second = visitor.cookies.get('scrim')
    expect(second).not.toBe(first)
    visitor.cookies.set('scrim', first ?? '')
    expect((await visitor.call(account.getMe)).user).toBeNull()
    visitor.cookies.set('scrim', second ?? '')
    expect((await visitor.call(account.getMe)).user?.email).toBe(body.email)
    await visitor.call(account.endSession)
    visitor.cookies.set('scrim', second ?? '')
    expect((await visitor.call(account.getMe)).user).toBeNull()
  })

  it('is refused for a while after too many wrong tries, and not after as many right ones', async () => {
    const strict = await startApp({ limits: { signIn: { most: 3, seconds: 300 } } })
    try {
      const body = someone()
      await sign(visit(strict.url), body)
      const tryWith = (typed: string) =>
        visit(strict.url).call(account.createSession, { body: { email: body.email, password: typed } })
      for (let time = 0; time < 5; time += 1) await tryWith(password)
      for (let time = 0; time < 3; time += 1) expect((await problemOf(tryWith('wrong'))).status).toBe(422)
      expect(await problemOf(tryWith(password))).toMatchObject({ status: 429, code: 'too_many' })
    } finally {
      await strict.close()
    }
  })
})

describe('a person’s name', () => {
  it('changes from the version it was read in; a stale change gets both versions', async () => {
    const visitor = visit(app.url)
    const me = await sign(visitor, someone())
    const rename = (name: string, version: number) =>
      visitor.call(account.renameAccount, { body: { name }, version })
    const renamed = await rename('Runa Vale', 1)
    expect(renamed.user).toMatchObject({ name: 'Runa Vale', version: 2 })
    const panel = await visitor.call(getPanel, { params: { panel: me.panels[0]?.slug ?? '' } })
    expect(panel.you.name).toBe('Runa Vale')
    expect(await problemOf(rename('Runa Moor', 1))).toMatchObject({
      status: 409,
      current: { user: { name: 'Runa Vale', version: 2 } },
    })
    const unversioned = await visitor.fetch('/api/account', {
      method: 'PATCH',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ name: 'Runa Moor' }),
    })
    expect(unversioned.status).toBe(400)
  })
})

describe('a new password', () => {
  it('needs the present one, and ends the other sessions but not this one', async () => {
    const body = someone()
    const here = visit(app.url)
    await sign(here, body)
    const elsewhere = visit(app.url)
    await elsewhere.call(account.createSession, { body: { email: body.email, password } })
    const change = (current: string) =>
      here.call(account.replacePassword, { body: { current, next: 'four quiet herons' } })
    expect((await problemOf(change('not this one'))).fields).toHaveProperty('current')
    expect((await elsewhere.call(account.getMe)).user).not.toBeNull()
    await change(password)
    expect((await elsewhere.call(account.getMe)).user).toBeNull()
    expect((await here.call(account.getMe)).user).not.toBeNull()
    const signIn = (typed: string) =>
      elsewhere.call(account.createSession, { body: { email: body.email, password: typed } })
    expect((await problemOf(signIn(password))).status).toBe(422)
    expect((await signIn('four quiet herons')).user?.email).toBe(body.email)
  })

  it('can be chosen once by a mailed link, which ends every session', async () => {
    const body = someone()
    const visitor = visit(app.url)
    await sign(visitor, body)
    const token = (await askForLink(visit(app.url), body.email)) ?? ''
    expect(token).toMatch(/^[\w-]{43}$/)
    const choose = (next: string) =>
      visit(app.url).call(account.useReset, { params: { token }, body: { password: next } })
    expect((await problemOf(choose('short'))).status).toBe(422)
    await choose('five quiet herons')
    expect((await visitor.call(account.getMe)).user).toBeNull()
    expect((await problemOf(choose('six quiet herons'))).status).toBe(404)
    await visitor.call(account.createSession, { body: { email: body.email, password: 'five quiet herons' } })
  })

  it('cannot be chosen by a link that is an hour old', async () => {
    const body = someone()
    await sign(visit(app.url), body)
    const token = (await askForLink(visit(app.url), body.email)) ?? ''
    clock.advance(3600)
    const late = visit(app.url).call(account.useReset, {
      params: { token },
      body: { password: 'a late new word' },
    })
    expect((await problemOf(late)).status).toBe(404)
  })

  it('is not mailed for an address without an account, and the answer does not tell', async () => {
    expect(await askForLink(visit(app.url), 'not.there@example.org')).toBeUndefined()
  })

  it('leaves no link in the database that could be used', async () => {
    const body = someone()
    await sign(visit(app.url), body)
    const token = (await askForLink(visit(app.url), body.email)) ?? ''
    const [rows] = await app.owner.query(
      'select t::text as line from user_tokens t union all select j::text from jobs j',
    )
    expect(rows.length).toBeGreaterThan(0)
    expect(JSON.stringify(rows)).not.toContain(token)
  })
})

describe('a live installation', () => {
  it('takes its first account from the printed address alone, once, and has no demo', async () => {
    const live = await startApp({ mode: 'live' })
    try {
      const first = firstOrganiserToken(live.deps.env.secret)
      const stranger = visit(live.url)
      expect((await stranger.call(account.getMe)).mode).toBe('live')
      expect((await problemOf(stranger.call(account.getMailbox))).status).toBe(404)
      expect((await problemOf(sign(stranger, someone()))).status).toBe(403)
      expect((await problemOf(sign(stranger, someone({ first: 'guessed' })))).status).toBe(403)
      const both = await Promise.allSettled([
        sign(visit(live.url), someone({ first })),
        sign(visit(live.url), someone({ first })),
      ])
      expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
      const used = await problemOf(sign(stranger, someone({ first })))
      expect(used).toMatchObject({ status: 403, detail: expect.stringMatching(/used/) as string })
    } finally {
      await live.close()
    }
  })
})
