import type { OpenApi, Operation } from './openapi.ts'

type Schema = Record<string, unknown>

/** A schema in a few words: `text`, `one of “draft”, “open”`, `list of { id, label }`. */
function said(schema: Schema, depth = 0): string {
  if ('const' in schema) return JSON.stringify(schema.const)
  if (Array.isArray(schema.enum)) return `one of ${schema.enum.map((one) => JSON.stringify(one)).join(', ')}`
  const choices = (schema.anyOf ?? schema.oneOf) as Schema[] | undefined
  if (choices) return choices.map((one) => said(one, depth)).join(' or ')
  if (schema.type === 'array') return `list of ${said((schema.items ?? {}) as Schema, depth)}`
  if (schema.type === 'object') {
    const names = Object.entries((schema.properties ?? {}) as Record<string, Schema>)
    if (names.length === 0) return schema.additionalProperties ? 'map' : '{}'
    const inner = names.map(([name, one]) =>
      depth < 1 && one.type === 'object' ? `${name}: ${said(one, depth + 1)}` : name,
    )
    return `{ ${inner.join(', ')} }`
  }
  const format = typeof schema.format === 'string' ? ` (${schema.format})` : ''
  return `${typeof schema.type === 'string' ? schema.type : 'anything'}${format}`
}

function bodyLines(operation: Operation): string[] {
  const [mediaType, content] = Object.entries(operation.requestBody?.content ?? {})[0] ?? []
  if (!mediaType || !content) return []
  const { properties = {}, required = [] } = content.schema as {
    properties?: Record<string, Schema>
    required?: string[]
  }
  const lines = Object.entries(properties).map(
    ([name, schema]) =>
      `  - \`${name}\`: ${said(schema)}${required.includes(name) ? '' : '; may be left out'}`,
  )
  return [`- body, \`${mediaType}\``, ...lines]
}

function answerLine(operation: Operation): string {
  const { content = {} } = operation.responses[200] as { content?: Record<string, { schema?: Schema }> }
  const [mediaType = '', { schema } = {}] = Object.entries(content)[0] ?? []
  return `- answers \`${mediaType}\`${schema ? `: ${said(schema)}` : ''}`
}

function operationPart(path: string, method: string, operation: Operation): string {
  const parameters = operation.parameters.map(
    ({ name, in: place, schema, required }) =>
      `- ${place} \`${name}\`: ${said(schema)}${required ? '' : '; may be left out'}`,
  )
  const lines = [
    ...parameters,
    ...bodyLines(operation),
    answerLine(operation),
    `- may refuse with ${Object.keys(operation.responses)
      .filter((status) => status !== '200')
      .join(', ')}`,
  ]
  return [
    `### ${operation.summary}`,
    `\`${method.toUpperCase()} ${path}\` (\`${operation.operationId}\`). ${operation.description}`,
    lines.join('\n'),
  ].join('\n\n')
}

/** docs/api.md: the same document as `/api/openapi.json`, to read. */
export function apiPage(document: OpenApi): string {
  const all = Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]) => ({ path, method, operation })),
  )
  const parts = document.tags.map(({ name }) =>
    [
      `## ${name}`,
      ...all
        .filter(({ operation }) => operation.tags.includes(name))
        .map(({ path, method, operation }) => operationPart(path, method, operation)),
    ].join('\n\n'),
  )
  const head = [
    '# The API',
    `Made from the contracts by \`npm run api-docs\`; the whole of it, with every field, is OpenAPI ${document.openapi} at \`/api/openapi.json\`.`,
    document.info.description,
    'A refusal is `application/problem+json` (RFC 9457) with `code`, `title`, `detail`, `requestId` and, where an input is at fault, `fields` keyed by input name.',
  ]
  return `${[...head, ...parts].join('\n\n')}\n`
}
