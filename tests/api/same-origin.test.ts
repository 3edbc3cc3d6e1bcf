import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createAccount, endSession, getMe } from '#shared/contracts/account.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { visit } from '#tests/support/visitor.ts'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
})
afterAll(() => app.close())

/** A write by hand: fetch itself adds neither Origin nor Sec-Fetch-Site with these values. */
const write = (headers: Record<string, string>) =>
  fetch(`${app.url}/api/session`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', ...headers },
    body: JSON.stringify({ email: 'nobody@example.org', password: 'not the one' }),
  })

describe('a write', () => {
  it('that another site sent is refused before anything is looked at', async () => {
    const answer = await write({ Origin: 'http://elsewhere.example' })
    expect(answer.status).toBe(403)
    expect(answer.headers.get('content-type')).toMatch('application/problem+json')
    expect(await answer.json()).toMatchObject({ code: 'forbidden', status: 403 })
  })

  it('that says nothing of where it comes from is refused', async () => {
    expect((await write({})).status).toBe(403)
  })

  it('from the same host on another port is refused', async () => {
    const port = Number(new URL(app.url).port) + 1
    expect((await write({ Origin: `http://127.0.0.1:${port}` })).status).toBe(403)
  })

  it('from the application’s own pages reaches the sign-in, which refuses the password', async () => {
    expect((await write({ Origin: app.url })).status).toBe(422)
    expect((await write({ 'Sec-Fetch-Site': 'same-origin' })).status).toBe(422)
  })

  it('that is a cross-site form is refused whatever its type', async () => {
    const answer = await write({ 'Sec-Fetch-Site': 'cross-site', 'Content-Type': 'text/plain' })
    expect(answer.status).toBe(403)
  })
})

describe('a visitor', () => {
  it('who made an account stays signed in, and is nobody again after signing out', async () => {
    const visitor = visit(app.url)
    const password = 'a boat in the fog'
    const body = {
      name: 'Ruta Vint',
      email: 'ruta@example.org',
      password,
      panelName: 'North Pier',
      timeZone: 'UTC',
    }
    await visitor.call(createAccount, { body })
    const { user, panels } = await visitor.call(getMe)
    expect(user).toMatchObject({ name: 'Ruta Vint', email: 'ruta@example.org' })
    expect(panels.map(({ name }) => name)).toEqual(['North Pier'])
    expect((await visit(app.url).call(getMe)).user).toBeNull()
    await visitor.call(endSession)
    expect((await visitor.call(getMe)).user).toBeNull()
  })
})

describe('an address of the interface that there is not', () => {
  it('answers with the problem body, and names the request', async () => {
    const answer = await visit(app.url).fetch('/api/no-such-thing')
    expect(answer.status).toBe(404)
    const problem = await answer.json()
    expect(problem).toMatchObject({ code: 'not_found', status: 404 })
    expect(problem.requestId).toMatch(/\S/)
  })
})
