import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '#tests/support/app.ts'

let app: TestApp
beforeAll(async () => {
  app = await startApp()
})
afterAll(() => app.close())

describe('what every answer carries', () => {
  it('lets a browser load nothing from elsewhere, and sends nobody to https on plain http', async () => {
    const answer = await request(app.url).get('/api/me').expect(200)
    const policy = answer.headers['content-security-policy'] ?? ''
    expect(policy).toContain("default-src 'self'")
    expect(policy).toContain("frame-ancestors 'none'")
    expect(policy).not.toContain('upgrade-insecure-requests')
    expect(answer.headers['strict-transport-security']).toBeUndefined()
    expect(answer.headers['x-powered-by']).toBeUndefined()
    expect(answer.headers['cache-control']).toBe('no-store')
  })

  it('numbers a failure, and says the same number in header and body', async () => {
    const answer = await request(app.url)
      .get('/api/nothing-here')
      .expect(404)
      .expect('Content-Type', /problem\+json/)
    expect(answer.body).toMatchObject({
      code: 'not_found',
      status: 404,
      requestId: answer.headers['x-request-id'],
    })
  })

  it('makes no session for somebody who only reads', async () => {
    const answer = await request(app.url).get('/api/verdicts').expect(200)
    expect(answer.headers['set-cookie']).toBeUndefined()
  })
})
