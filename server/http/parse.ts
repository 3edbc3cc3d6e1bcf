import type { Request } from 'express'
import type { z } from 'zod'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { ApiError, notFound } from './api-error.ts'

/** Every fault of a zod error by input name; the first one where an input has several. */
export function faults(error: z.ZodError): Record<string, string> {
  const fields: Record<string, string> = {}
  for (const issue of error.issues) {
    const names = issue.code === 'unrecognized_keys' ? issue.keys : ['']
    for (const name of names) {
      const path = [...issue.path, ...(name === '' ? [] : [name])].map(String).join('.')
      fields[path === '' ? 'form' : path] ??=
        issue.code === 'unrecognized_keys' ? 'Not asked for.' : issue.message
    }
  }
  return fields
}

/** Reads params, query and body by the endpoint's contract. Wrong params name nothing that exists: 404. */
export function readInput<E extends Endpoint>(
  endpoint: E,
  request: Request,
): { params: z.output<E['params']>; query: z.output<E['query']>; body: z.output<E['body']> } {
  const params = endpoint.params.safeParse(request.params)
  if (!params.success) throw notFound()
  const query = endpoint.query.safeParse(request.query)
  if (!query.success)
    throw new ApiError('malformed', 'The address has a part that Scrim does not know.', {
      fields: faults(query.error),
    })
  const takesBody = endpoint.method !== 'GET' && endpoint.kind === 'json'
  if (takesBody && request.is('application/json') === false)
    throw new ApiError('malformed', 'Scrim reads JSON here (Content-Type: application/json).')
  const body = takesBody ? endpoint.body.safeParse(request.body ?? {}) : { success: true as const, data: {} }
  if (!body.success) {
    const fields = faults(body.error)
    const count = Object.keys(fields).length
    throw new ApiError(
      'invalid',
      count === 1 ? 'One entry needs another look.' : `${count} entries need another look.`,
      { fields },
    )
  }
  return { params: params.data, query: query.data, body: body.data } as never
}

/** Reads a service's answer by its contract, so that a key which the audience's contract does not list cannot leave. */
export function readAnswer<E extends Endpoint>(
  endpoint: E,
  answer: unknown,
  strict: boolean,
  log: (message: string) => void,
): z.output<E['response']> {
  const first = endpoint.response.safeParse(answer)
  if (first.success) return first.data as z.output<E['response']>
  const unlisted = first.error.issues.filter((issue) => issue.code === 'unrecognized_keys')
  if (strict || unlisted.length < first.error.issues.length)
    throw new Error(
      `The answer of ${endpoint.id} breaks its contract: ${JSON.stringify(faults(first.error))}`,
    )
  const copy = structuredClone(answer)
  for (const issue of unlisted) {
    let at = copy as Record<PropertyKey, unknown>
    for (const step of issue.path) at = at[step] as Record<PropertyKey, unknown>
    for (const key of issue.keys) delete at[key]
  }
  log(`Dropped from the answer of ${endpoint.id}: ${Object.keys(faults(first.error)).join(', ')}`)
  return endpoint.response.parse(copy) as z.output<E['response']>
}
