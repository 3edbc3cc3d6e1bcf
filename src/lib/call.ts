import type { z } from 'zod'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { problem, type ErrorCode, type Problem } from '#shared/contracts/errors.ts'

/** An answer that is not a success: the server's problem, or what kept us from asking. */
export class CallError extends Error {
  readonly problem: Problem
  constructor(what: Problem) {
    super(what.detail)
    this.problem = what
  }
  get code(): ErrorCode {
    return this.problem.code
  }
  /** Faults by input name, `units.0.name` for a field in a list. */
  get fields(): Record<string, string> {
    return this.problem.fields ?? {}
  }
  /** True where asking again later may help: the network or the server was away. */
  get offline(): boolean {
    return this.problem.code === 'unavailable'
  }
}

const away = (detail: string): CallError =>
  new CallError({
    type: 'about:blank',
    title: 'Not reached',
    status: 503,
    detail,
    code: 'unavailable',
    requestId: '',
  })

export interface CallInput<E extends Endpoint> {
  params?: z.input<E['params']>
  query?: z.input<E['query']>
  body?: z.input<E['body']>
  /** For writes that may be repeated: the same key gets the first answer again. */
  idempotencyKey?: string
  /** The version this edit was made from, sent as `If-Match`. */
  version?: number
  signal?: AbortSignal
}

export interface Caller {
  <E extends Endpoint>(endpoint: E, input?: CallInput<E>): Promise<z.output<E['response']>>
}

/** The address of an endpoint with its parameters and query filled in. */
export function addressOf<E extends Endpoint>(
  endpoint: E,
  input: Pick<CallInput<E>, 'params' | 'query'> = {},
): string {
  const params = (input.params ?? {}) as Record<string, unknown>
  const path = endpoint.path.replace(/:([a-z]\w*)/gi, (_, name: string) =>
    encodeURIComponent(String(params[name])),
  )
  const query = new URLSearchParams()
  for (const [name, value] of Object.entries((input.query ?? {}) as Record<string, unknown>))
    if (value !== undefined && value !== null) query.set(name, String(value))
  return query.size > 0 ? `${path}?${query}` : path
}

/** A caller for one origin; tests give their own `fetch` that keeps cookies. */
export function createCall(origin = '', fetcher: typeof fetch = (...input) => fetch(...input)): Caller {
  return async <E extends Endpoint>(
    endpoint: E,
    input: CallInput<E> = {},
  ): Promise<z.output<E['response']>> => {
    const headers: Record<string, string> = { Accept: 'application/json' }
    if (input.idempotencyKey) headers['Idempotency-Key'] = input.idempotencyKey
    if (input.version !== undefined) headers['If-Match'] = `"${input.version}"`
    const hasBody = endpoint.method !== 'GET' && endpoint.kind !== 'upload'
    if (hasBody) headers['Content-Type'] = 'application/json'
    let body: BodyInit | undefined
    if (endpoint.kind === 'upload') body = input.body as unknown as FormData
    else if (hasBody) body = JSON.stringify(input.body ?? {})
    let answer: Response
    try {
      answer = await fetcher(origin + addressOf(endpoint, input), {
        method: endpoint.method,
        headers,
        credentials: 'same-origin',
        ...(body === undefined ? {} : { body }),
        ...(input.signal ? { signal: input.signal } : {}),
      })
    } catch (error) {
      if (input.signal?.aborted) throw error
      throw away('Scrim could not be reached. Check the connection; nothing you typed is lost.')
    }
    const text = await answer.text()
    let json: unknown
    try {
      json = text === '' ? undefined : JSON.parse(text)
    } catch {
      throw away('The answer could not be read. Try again in a moment.')
    }
    if (!answer.ok) {
      const told = problem.safeParse(json)
      throw told.success
        ? new CallError(told.data)
        : away(`Scrim answered ${answer.status}. Try again in a moment.`)
    }
    return endpoint.response.parse(json) as z.output<E['response']>
  }
}

export const call = createCall()
