/** A text that is not what its scheme says; the message names the place. */
export class ShapeError extends Error {
  override name = 'ShapeError'
}

/** Turns an unknown value into a T or throws ShapeError naming `at`. */
export type Reader<T> = (value: unknown, at: string) => T

const reader =
  <T>(what: string, is: (value: unknown) => value is T): Reader<T> =>
  (value, at) => {
    if (!is(value)) throw new ShapeError(`${at} is not ${what}`)
    return value
  }

export const text = reader('a text', (value): value is string => typeof value === 'string')

export const matching = (what: string, pattern: RegExp): Reader<string> =>
  reader(what, (value): value is string => typeof value === 'string' && pattern.test(value))

export const hex64 = matching('64 lowercase hex digits', /^[0-9a-f]{64}$/)

export const utcTime = matching('a time in UTC', /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d(\.\d{1,6})?Z$/)

export const integer = (least: number, most: number): Reader<number> =>
  reader(
    `a whole number from ${least} to ${most}`,
    (value): value is number => Number.isInteger(value) && Number(value) >= least && Number(value) <= most,
  )

export const oneOf = <const T extends string>(...words: readonly T[]): Reader<T> =>
  reader(`one of ${words.join(', ')}`, (value): value is T => (words as readonly unknown[]).includes(value))

export const nullOr =
  <T>(of: Reader<T>): Reader<T | null> =>
  (value, at) =>
    value === null ? null : of(value, at)

export const listOf =
  <T>(of: Reader<T>): Reader<T[]> =>
  (value, at) => {
    if (!Array.isArray(value)) throw new ShapeError(`${at} is not a list`)
    return value.map((item, i) => of(item, `${at}[${i}]`))
  }

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** An object of texts under any keys. */
export const texts: Reader<Record<string, string>> = (value, at) => {
  if (!isRecord(value)) throw new ShapeError(`${at} is not an object`)
  return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, text(item, `${at}.${key}`)]))
}

/**
 * An object with exactly these keys (`optional` ones may be missing); with `open` it keeps unknown keys as they are.
 */
export const record =
  <T extends object>(
    fields: { [K in keyof T]-?: Reader<NonNullable<T[K]> | Extract<T[K], null>> },
    options: { optional?: readonly (keyof T & string)[]; open?: boolean } = {},
  ): Reader<T> =>
  (value, at) => {
    if (!isRecord(value)) throw new ShapeError(`${at} is not an object`)
    const known = Object.keys(fields) as (keyof T & string)[]
    const unknown = Object.keys(value).filter((key) => !Object.hasOwn(fields, key))
    if (unknown.length > 0 && !options.open) throw new ShapeError(`${at} has an unknown field: ${unknown[0]}`)
    const out: Record<string, unknown> = Object.fromEntries(unknown.map((key) => [key, value[key]]))
    for (const key of known) {
      if (value[key] === undefined) {
        if (options.optional?.includes(key)) continue
        throw new ShapeError(`${at}.${key} is missing`)
      }
      out[key] = fields[key](value[key], `${at}.${key}`)
    }
    return out as T
  }
