import { z } from 'zod'

/** Who may try an endpoint at all; the policy then decides by the facts of the record. */
export type Audience = 'anyone' | 'signed-in' | 'panel' | 'round' | 'seat'

type Schema = z.ZodType
type NoShape = z.ZodObject<Record<string, never>>

/** One operation of the API: the server mounts it, the browser calls it, OpenAPI and the permission table list it. */
export interface Endpoint<
  P extends Schema = Schema,
  Q extends Schema = Schema,
  B extends Schema = Schema,
  R extends Schema = Schema,
> {
  id: string
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'
  /** Express path under the origin, e.g. `/api/panels/:panel`. */
  path: string
  audience: Audience
  summary: string
  params: P
  query: Q
  body: B
  response: R
  /** `json` by default; `file` answers with bytes, `events` with server-sent events, `upload` takes multipart. */
  kind: 'json' | 'file' | 'events' | 'upload'
  /** A repeated `Idempotency-Key` gets the first answer again. */
  idempotent: boolean
  /** Carries the version it edits in `If-Match`; a stale one gets 409 with both versions. */
  versioned: boolean
  /** Largest JSON body in bytes, where it differs from the house's limit. */
  bodyLimit?: number
}

const nothing = z.strictObject({}) as unknown as NoShape

interface Definition<P extends Schema, Q extends Schema, B extends Schema, R extends Schema> {
  id: string
  audience: Audience
  summary: string
  params?: P
  query?: Q
  body?: B
  response: R
  kind?: Endpoint['kind']
  idempotent?: boolean
  versioned?: boolean
  bodyLimit?: number
}

/** Declares an endpoint, e.g. `endpoint('GET /api/me', { … })`. */
export function endpoint<
  R extends Schema,
  P extends Schema = NoShape,
  Q extends Schema = NoShape,
  B extends Schema = NoShape,
>(line: `${Endpoint['method']} /${string}`, definition: Definition<P, Q, B, R>): Endpoint<P, Q, B, R> {
  const [method, path] = line.split(' ') as [Endpoint['method'], string]
  return {
    kind: 'json',
    idempotent: false,
    versioned: false,
    ...definition,
    method,
    path,
    params: definition.params ?? (nothing as unknown as P),
    query: definition.query ?? (nothing as unknown as Q),
    body: definition.body ?? (nothing as unknown as B),
  }
}

export type ParamsOf<E> = E extends Endpoint<infer P, Schema, Schema, Schema> ? z.output<P> : never
export type QueryOf<E> = E extends Endpoint<Schema, infer Q, Schema, Schema> ? z.input<Q> : never
export type BodyOf<E> = E extends Endpoint<Schema, Schema, infer B, Schema> ? z.input<B> : never
export type ResponseOf<E> = E extends Endpoint<Schema, Schema, Schema, infer R> ? z.output<R> : never
