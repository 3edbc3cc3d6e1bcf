import type { Json } from './types.ts'

const LONE_SURROGATE = /[\uD800-\uDBFF](?![\uDC00-\uDFFF])|(?<![\uD800-\uDBFF])[\uDC00-\uDFFF]/

function text(value: string): string {
  if (LONE_SURROGATE.test(value)) throw new TypeError('half of a surrogate pair cannot be written as UTF-8')
  return JSON.stringify(value)
}

const isList = (value: object): value is readonly Json[] => Array.isArray(value)

/**
 * The text of a value by RFC 8785 (JSON Canonicalization Scheme), for strings, safe integers, booleans, null, arrays
 * and plain objects: no spaces, keys sorted by UTF-16 code units, strings as ECMAScript writes them. Throws
 * TypeError on anything else, so that two programs can never write one value in two ways.
 */
export function canonicalJson(value: Json): string {
  if (value === null || typeof value === 'boolean') return String(value)
  if (typeof value === 'string') return text(value)
  if (typeof value === 'number') {
    if (!Number.isSafeInteger(value))
      throw new TypeError('numbers are safe integers; write decimals as strings')
    return String(value)
  }
  if (typeof value !== 'object') throw new TypeError(`a ${typeof value} has no JSON`)
  if (isList(value)) return `[${Array.from(value, canonicalJson).join(',')}]`
  const prototype: unknown = Object.getPrototypeOf(value)
  if (prototype !== Object.prototype && prototype !== null)
    throw new TypeError('only plain objects have one JSON')
  const keys = Object.keys(value).sort((a, b) => (a < b ? -1 : 1))
  return `{${keys.map((key) => `${text(key)}:${canonicalJson(value[key] as Json)}`).join(',')}}`
}
