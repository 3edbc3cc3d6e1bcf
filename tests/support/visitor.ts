import { createCall, type Caller } from '#src/lib/call.ts'

/** A browser without a screen: the client's own `call` and a plain `fetch`, with cookies of its own. */
export interface Visitor {
  call: Caller
  /** Takes a path or an address; sends cookies and, on writes, the Origin that a browser would. */
  fetch: typeof fetch
  /** The cookies as they would be sent, for tests that move them to another place. */
  cookies: Map<string, string>
}

/** @param origin the application's address, as `TestApp.url` */
export function visit(origin: string): Visitor {
  const cookies = new Map<string, string>()
  const fetchAs: typeof fetch = async (input, init) => {
    const address = new URL(input instanceof Request ? input.url : String(input), origin)
    const headers = new Headers(init?.headers)
    const sameSite = address.origin === origin
    if (sameSite && cookies.size > 0)
      headers.set('Cookie', [...cookies].map((pair) => pair.join('=')).join('; '))
    if ((init?.method ?? 'GET') !== 'GET' && !headers.has('Origin')) headers.set('Origin', origin)
    const answer = await fetch(address, { redirect: 'manual', ...init, headers })
    for (const line of sameSite ? answer.headers.getSetCookie() : []) keep(cookies, line)
    return answer
  }
  return { call: createCall(origin, fetchAs), fetch: fetchAs, cookies }
}

function keep(cookies: Map<string, string>, line: string): void {
  const [pair = '', ...attributes] = line.split(';')
  const name = pair.slice(0, pair.indexOf('=')).trim()
  const expires = attributes.find((attribute) => /^\s*expires=/i.test(attribute))?.split('=')[1]
  if (expires && Date.parse(expires) < Date.now()) cookies.delete(name)
  else cookies.set(name, pair.slice(pair.indexOf('=') + 1))
}
