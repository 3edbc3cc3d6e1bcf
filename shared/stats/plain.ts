import { cannot } from './cannot.ts'

/**
 * The same plain data as it comes back from JSON: absent keys dropped, −0 made 0; a number that is not finite, which no
 * method here should return, becomes "not estimable" rather than null.
 *
 * @example
 * plain({ a: 1, b: undefined, c: -0 }) // => { a: 1, c: 0 }
 */
export function plain<T>(value: T): T {
  return cleaned(value) as T
}

function cleaned(value: unknown): unknown {
  if (typeof value === 'number') return Number.isFinite(value) ? value + 0 : cannot('not-estimable')
  if (Array.isArray(value)) return value.map(cleaned)
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(
    Object.entries(value).flatMap(([key, entry]) => (entry === undefined ? [] : [[key, cleaned(entry)]])),
  )
}
