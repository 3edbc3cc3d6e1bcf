import type { Json } from './types.ts'

/** RFC 8785 text of a value of strings, integers, booleans, null, arrays and objects. */
export function canonicalJson(_value: Json): string {
  throw new Error('not built yet')
}
