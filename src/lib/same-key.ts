import { randomKey } from './random-key.ts'

/** Gives one idempotency key for as long as what is sent stays the same: a repeated press stores once. */
export function createSameKey(fresh: () => string = randomKey): (body: unknown) => string {
  let last: { body: string; key: string } | null = null
  return (body) => {
    const now = JSON.stringify(body)
    if (last?.body !== now) last = { body: now, key: fresh() }
    return last.key
  }
}
