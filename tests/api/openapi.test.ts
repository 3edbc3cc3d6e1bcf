import { readFileSync } from 'node:fs'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '#shared/contracts/all.ts'
import { statusOf } from '#shared/contracts/errors.ts'
import { apiPage } from '#server/http/api-page.ts'
import { openApi, type OpenApi } from '#server/http/openapi.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { visit } from '#tests/support/visitor.ts'

let app: TestApp
let served: OpenApi
beforeAll(async () => {
  app = await startApp()
  served = (await (await visit(app.url).fetch('/api/openapi.json')).json()) as OpenApi
})
afterAll(() => app.close())

const operations = (document: OpenApi) =>
  Object.values(document.paths).flatMap((methods) => Object.values(methods))

describe('the API’s description', () => {
  it('is served to anyone, and lists every endpoint of the contracts exactly once', () => {
    expect(served.openapi).toBe('3.1.1')
    const ids = operations(served).map(({ operationId }) => operationId)
    expect([...ids].sort()).toEqual(endpoints.map(({ id }) => id).sort())
    expect(new Set(ids).size).toBe(ids.length)
  })

  it('is not complete when one endpoint is left out', () => {
    for (const left of endpoints.slice(0, 3)) {
      const ids = operations(openApi(endpoints.filter((one) => one !== left))).map(
        ({ operationId }) => operationId,
      )
      expect(ids).not.toContain(left.id)
    }
  })

  it('names each part of an address as a parameter of it', () => {
    for (const [path, methods] of Object.entries(served.paths))
      for (const operation of Object.values(methods)) {
        const inPath = [...path.matchAll(/\{(\w+)\}/g)].map((match) => match[1])
        const named = operation.parameters.filter((one) => one.in === 'path').map(({ name }) => name)
        expect(named.sort(), operation.operationId).toEqual(inPath.sort())
      }
  })

  it('asks for the version where an edit needs one, and offers a key where a write may be repeated', () => {
    for (const { id, versioned, idempotent } of endpoints) {
      const headers = operations(served)
        .find(({ operationId }) => operationId === id)
        ?.parameters.filter((one) => one.in === 'header')
        .map(({ name }) => name)
      expect(headers, id).toEqual([
        ...(versioned ? ['If-Match'] : []),
        ...(idempotent ? ['Idempotency-Key'] : []),
      ])
    }
  })

  it('points only at parts that are there, and knows every code of a refusal', () => {
    const text = JSON.stringify(served)
    const found = (pointer: string) =>
      pointer
        .slice(2)
        .split('/')
        .reduce<unknown>((at, step) => (at as Record<string, unknown> | undefined)?.[step], served)
    const pointers = [...text.matchAll(/"\$ref":"([^"]+)"/g)].map((match) => match[1] ?? '')
    expect(pointers.length).toBeGreaterThan(0)
    for (const pointer of new Set(pointers)) expect(found(pointer), pointer).toBeDefined()
    const responses = served.components.responses as Record<string, unknown>
    expect(Object.keys(responses).sort()).toEqual(Object.keys(statusOf).sort())
  })

  it('says that a strict object takes no other key', () => {
    const body = served.paths['/api/session']?.post?.requestBody?.content['application/json']?.schema
    expect(body).toMatchObject({
      type: 'object',
      required: ['email', 'password'],
      additionalProperties: false,
    })
  })

  it('is also a page in docs, written anew by npm run api-docs after a contract changed', () => {
    expect(readFileSync('docs/api.md', 'utf8')).toBe(apiPage(openApi()))
  })
})
