import { randomUUID } from 'node:crypto'
import { expect } from 'vitest'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { problem, type ErrorCode, type Problem } from '#shared/contracts/errors.ts'
import { addressOf } from '#src/lib/call.ts'

/** The endpoint's address with parts that look right: the panel `bench`, ids of nothing. */
export function addressFor(endpoint: Endpoint, parts: Record<string, string> = {}): string {
  const names = [...endpoint.path.matchAll(/:(\w+)/g)].map((match) => match[1] ?? '')
  const params = Object.fromEntries(names.map((name) => [name, name === 'panel' ? 'bench' : randomUUID()]))
  return addressOf(endpoint, { params: { ...params, ...parts } as never })
}

export const lines = (endpoint: Endpoint) => `${endpoint.method} ${endpoint.path}`
export const versionOf = (endpoint: Endpoint): Record<string, string> =>
  endpoint.versioned ? { 'If-Match': '"1"' } : {}

/** Reads an answer as the problem that it must be. */
export async function refused(answer: Response, about: string, ...codes: ErrorCode[]): Promise<Problem> {
  const text = await answer.text()
  expect(answer.headers.get('content-type'), `${about}: ${answer.status} ${text}`).toMatch(
    /^application\/problem\+json/,
  )
  const told = problem.parse(JSON.parse(text))
  expect(told.status, about).toBe(answer.status)
  expect(told.requestId, about).toBe(answer.headers.get('x-request-id'))
  expect(codes.length === 0 || codes.includes(told.code), `${about}: ${text}`).toBe(true)
  expect(answer.status, about).toBeLessThan(500)
  expect(answer.status, about).toBeGreaterThanOrEqual(400)
  return told
}
