import { QueryClientProvider } from '@tanstack/react-query'
import { configure, render } from '@testing-library/react'
import type { ComponentType } from 'react'
import { createMemoryRouter, RouterProvider } from 'react-router-dom'
import { vi } from 'vitest'
import type { Endpoint, ResponseOf } from '#shared/contracts/endpoint.ts'
import { statusOf, type ErrorCode } from '#shared/contracts/errors.ts'
import { createQueryClient } from '#src/lib/query-client.ts'

// The machine may be busy: a page gets five seconds to come, a test a minute.
configure({ asyncUtilTimeout: 5_000 })
vi.setConfig({ testTimeout: 60_000 })

export interface Asked {
  params: Record<string, string>
  body: unknown
  key: string | null
}

type Answerer = (asked: Asked) => unknown

/** A refusal that a fake server answers with, as problem details. */
export class Refusal {
  readonly code: ErrorCode
  readonly detail: string
  readonly fields: Record<string, string> | undefined
  constructor(code: ErrorCode, detail: string, fields?: Record<string, string>) {
    this.code = code
    this.detail = detail
    this.fields = fields
  }
}

const problem = ({ code, detail, fields }: Refusal): Response =>
  new Response(
    JSON.stringify({
      type: 'about:blank',
      title: detail,
      status: statusOf[code],
      detail,
      code,
      requestId: 'r-1',
      ...(fields ? { fields } : {}),
    }),
    { status: statusOf[code], headers: { 'content-type': 'application/problem+json' } },
  )

/** Stands for the server: answers the endpoints it was given, counts what it was asked, and can be cut off. */
export function fakeServer() {
  const routes: { endpoint: Endpoint; pattern: RegExp; names: string[]; answer: Answerer }[] = []
  const asked: { id: string; asked: Asked }[] = []
  const missed: string[] = []
  const server = {
    /** False cuts the network. */
    reachable: true,
    asked: (id: string) => asked.filter((one) => one.id === id).map((one) => one.asked),
    /** How often an endpoint was tried while the network was cut. */
    missed: (id: string) => missed.filter((one) => one === id).length,
    on<E extends Endpoint>(endpoint: E, answer: (asked: Asked) => ResponseOf<E> | Refusal) {
      const names = [...endpoint.path.matchAll(/:(\w+)/g)].map((match) => match[1] ?? '')
      const pattern = new RegExp(`^${endpoint.path.replace(/:\w+/g, '([^/]+)')}$`)
      routes.unshift({ endpoint, pattern, names, answer })
      return server
    },
    fetch: (async (input: RequestInfo | URL, init: RequestInit = {}) => {
      const path = String(input).split('?')[0] ?? ''
      const method = init.method ?? 'GET'
      const route = routes.find((one) => one.endpoint.method === method && one.pattern.test(path))
      if (!server.reachable) {
        missed.push(route?.endpoint.id ?? path)
        throw new TypeError('Failed to fetch')
      }
      if (!route) throw new Error(`The test gave no answer for ${method} ${path}.`)
      const found = route.pattern.exec(path) ?? []
      const request: Asked = {
        params: Object.fromEntries(
          route.names.map((name, nth) => [name, decodeURIComponent(found[nth + 1] ?? '')]),
        ),
        body: typeof init.body === 'string' ? (JSON.parse(init.body) as unknown) : undefined,
        key: new Headers(init.headers).get('Idempotency-Key'),
      }
      asked.push({ id: route.endpoint.id, asked: request })
      const answer = route.answer(request)
      return answer instanceof Refusal ? problem(answer) : new Response(JSON.stringify(answer))
    }) as typeof fetch,
  }
  vi.stubGlobal('fetch', server.fetch)
  return server
}

/** Shows one page under its address, with a cache of its own; `others` are places it may lead to. */
export function showPage(
  Page: ComponentType,
  pattern: string,
  address: string | { pathname: string; state: unknown },
  others: Record<string, string> = {},
) {
  const client = createQueryClient()
  const router = createMemoryRouter(
    [
      { path: pattern, element: <Page /> },
      ...Object.entries(others).map(([path, words]) => ({ path, element: <p>{words}</p> })),
    ],
    { initialEntries: [address] },
  )
  const view = render(
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  )
  return { ...view, client, router }
}
