import { endpoints } from '#shared/contracts/all.ts'
import { createCall } from '#src/lib/call.ts'
import { visit, type Visitor } from './visitor.ts'

/** Everything that one answer told: which endpoint, status, headers and body. */
export interface Told {
  endpoint: string
  status: number
  text: string
}

export interface RecordedVisitor extends Visitor {
  told: Told[]
}

const patterns = endpoints.map((endpoint) => ({
  id: endpoint.id,
  method: endpoint.method,
  path: new RegExp(`^${endpoint.path.replace(/:[a-z]\w*/gi, '[^/]+')}$`),
}))

/** The endpoint that an address belongs to; the address itself for a page. */
export const endpointAt = (method: string, path: string): string =>
  patterns.find((one) => one.method === method && one.path.test(path))?.id ?? `${method} ${path}`

/** A browser whose every answer is kept, headers included; session cookie and request number differ by nature. */
export function visitRecorded(origin: string): RecordedVisitor {
  const visitor = visit(origin)
  const told: Told[] = []
  const fetchAs: typeof fetch = async (input, init) => {
    const answer = await visitor.fetch(input, init)
    const path = new URL(String(input), origin).pathname
    const headers = [...answer.headers].filter(
      ([name]) =>
        ![
          'set-cookie',
          'x-request-id',
          'date',
          'etag',
          'ratelimit',
          'ratelimit-policy',
          'content-length',
          'keep-alive',
          'connection',
        ].includes(name),
    )
    const body = answer.headers.get('content-type')?.startsWith('text/event-stream')
      ? ''
      : await answer.clone().text()
    told.push({
      endpoint: endpointAt(init?.method ?? 'GET', path),
      status: answer.status,
      text: `${JSON.stringify(headers)}\n${body.replace(/"requestId":"[^"]*"/, '"requestId":""')}`,
    })
    return answer
  }
  return { ...visitor, fetch: fetchAs, call: createCall(origin, fetchAs), told }
}

/** Listens to a stream of events until `stop`; what it said is kept with the rest. */
export async function listen(visitor: RecordedVisitor, path: string): Promise<{ stop(): Promise<void> }> {
  const away = new AbortController()
  const answer = await visitor.fetch(path, { signal: away.signal })
  let heard = ''
  const reading = (async () => {
    if (answer.status !== 200 || !answer.body) return
    const decoder = new TextDecoder()
    for await (const chunk of answer.body) heard += decoder.decode(chunk as Uint8Array, { stream: true })
  })().catch(() => undefined)
  return {
    stop: async () => {
      away.abort()
      await reading
      visitor.told.push({
        endpoint: `events ${endpointAt('GET', path)}`,
        status: answer.status,
        text: [...new Set(heard.split('\n').filter((line) => line.startsWith('data')))].sort().join('\n'),
      })
    },
  }
}
