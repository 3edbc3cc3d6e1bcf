import { z } from 'zod'
import { endpoints } from '#shared/contracts/all.ts'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { problem, statusOf, type ErrorCode } from '#shared/contracts/errors.ts'
import about from '../../package.json' with { type: 'json' }

type Json = Record<string, unknown>
export interface OpenApi {
  openapi: '3.1.1'
  info: { title: string; version: string; description: string }
  tags: { name: string }[]
  paths: Record<string, Record<string, Operation>>
  components: Json
}
export interface Operation {
  operationId: string
  tags: string[]
  summary: string
  description: string
  parameters: {
    name: string
    in: 'path' | 'query' | 'header'
    required: boolean
    schema: Json
    description?: string
  }[]
  requestBody?: { required: true; content: Record<string, { schema: Json }> }
  responses: Record<string, Json>
}

/** A contract's schema as JSON Schema 2020-12. What code decides beyond it (a time zone that exists) stays out. */
function schemaOf(schema: z.ZodType, io: 'input' | 'output'): Json {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, {
    io,
    unrepresentable: 'any',
    reused: 'inline',
  }) as Json
  return rest
}

const who: Record<Endpoint['audience'], string> = {
  anyone: 'Anyone, without signing in.',
  'signed-in': 'A signed-in person.',
  panel: 'A signed-in member of the panel.',
  round: 'Whoever holds a role in the round, by membership or by a link opened in this browser.',
  seat: 'Whoever opened the link of this seat in this browser.',
}

const takesBody = (endpoint: Endpoint): boolean =>
  endpoint.kind === 'upload' ||
  Object.keys((schemaOf(endpoint.body, 'input').properties ?? {}) as Json).length > 0

function parametersOf(endpoint: Endpoint): Operation['parameters'] {
  const from = (schema: z.ZodType, place: 'path' | 'query'): Operation['parameters'] => {
    const { properties = {}, required = [] } = schemaOf(schema, 'input') as {
      properties?: Record<string, Json>
      required?: string[]
    }
    return Object.entries(properties).map(([name, property]) => ({
      name,
      in: place,
      required: place === 'path' || required.includes(name),
      schema: property,
    }))
  }
  return [
    ...from(endpoint.params, 'path'),
    ...from(endpoint.query, 'query'),
    ...(endpoint.versioned
      ? [
          {
            name: 'If-Match',
            in: 'header' as const,
            required: true,
            schema: { type: 'string', pattern: '^"\\d+"$' },
            description: 'The version that the edit was made from.',
          },
        ]
      : []),
    ...(endpoint.idempotent
      ? [
          {
            name: 'Idempotency-Key',
            in: 'header' as const,
            required: false,
            schema: { type: 'string', pattern: '^[\\w-]{8,100}$' },
            description: 'The same key gets the first answer again.',
          },
        ]
      : []),
  ]
}

function answerOf(endpoint: Endpoint): Json {
  if (endpoint.kind === 'file') return { description: 'The file', content: { '*/*': {} } }
  const schema = schemaOf(endpoint.response, 'output')
  if (endpoint.kind === 'events')
    return { description: 'Events, one JSON value each', content: { 'text/event-stream': { schema } } }
  return { description: 'Done', content: { 'application/json': { schema } } }
}

function refusalsOf(endpoint: Endpoint): ErrorCode[] {
  const writes = endpoint.method !== 'GET'
  const named = Object.keys((schemaOf(endpoint.params, 'input').properties ?? {}) as Json).length > 0
  return [
    'malformed',
    ...(endpoint.audience === 'signed-in' || endpoint.audience === 'panel'
      ? (['not_signed_in'] as const)
      : []),
    ...(writes || endpoint.audience !== 'anyone' ? (['forbidden'] as const) : []),
    ...(named ? (['not_found'] as const) : []),
    ...(writes ? (['conflict', 'too_large', 'invalid', 'too_many'] as const) : []),
    'internal',
  ]
}

function operationOf(endpoint: Endpoint, tag: string): Operation {
  const mediaType = endpoint.kind === 'upload' ? 'multipart/form-data' : 'application/json'
  return {
    operationId: endpoint.id,
    tags: [tag],
    summary: endpoint.summary,
    description: who[endpoint.audience],
    parameters: parametersOf(endpoint),
    ...(takesBody(endpoint)
      ? {
          requestBody: {
            required: true as const,
            content: { [mediaType]: { schema: schemaOf(endpoint.body, 'input') } },
          },
        }
      : {}),
    responses: {
      200: answerOf(endpoint),
      ...Object.fromEntries(
        refusalsOf(endpoint).map((code) => [statusOf[code], { $ref: `#/components/responses/${code}` }]),
      ),
    },
  }
}

/** `/api/panels/:panel/units` is about `panels`. */
const tagOf = (endpoint: Endpoint): string => endpoint.path.split('/')[2] ?? 'api'
const addressOf = (endpoint: Endpoint): string => endpoint.path.replace(/:(\w+)/g, '{$1}')

/** The whole API as OpenAPI 3.1, made from the contracts that the server parses by. */
export function openApi(which: readonly Endpoint[] = endpoints): OpenApi {
  const order = ({ path, method }: Endpoint) => `${path} ${method}`
  const of = [...which].sort((a, b) => (order(a) < order(b) ? -1 : 1))
  const paths: OpenApi['paths'] = {}
  for (const endpoint of of)
    (paths[addressOf(endpoint)] ??= {})[endpoint.method.toLowerCase()] = operationOf(
      endpoint,
      tagOf(endpoint),
    )
  const problems = Object.entries(statusOf).map(([code, status]) => [
    code,
    {
      description: `${status}: problem details (RFC 9457) with the code ${code}`,
      content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
    },
  ])
  return {
    openapi: '3.1.1',
    info: {
      title: 'Scrim',
      version: about.version,
      description:
        'Blind listening, openly reported. A session cookie says who asks; a write is taken from the application’s own pages only (Sec-Fetch-Site or Origin).',
    },
    tags: [...new Set(of.map(tagOf))].map((name) => ({ name })),
    paths,
    components: {
      schemas: { Problem: schemaOf(problem, 'output') },
      responses: Object.fromEntries(problems) as Json,
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'scrim' } },
    },
  }
}
