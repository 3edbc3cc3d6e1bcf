import { createHash, createHmac, timingSafeEqual } from 'node:crypto'
import type { Deps } from '../deps.ts'

/** 256 random bits for a link; base64url, 43 characters. */
export const newToken = (deps: Pick<Deps, 'random'>): string => deps.random.bytes(32).toString('base64url')

/** What the database keeps of a link: its SHA-256 in hex. The token is random, so no salt is needed. */
export const tokenDigest = (token: string): string => createHash('sha256').update(token).digest('hex')

/**
 * The token of the first organiser's address: made from the installation's secret, so that every process and every
 * start prints the same one. It works as long as there is no user, which is once.
 */
export const firstOrganiserToken = (secret: string): string =>
  createHmac('sha256', secret).update('the first organiser').digest('base64url').slice(0, 32)

export const isFirstOrganiserToken = (secret: string, token: string): boolean => {
  const expected = Buffer.from(tokenDigest(firstOrganiserToken(secret)))
  return timingSafeEqual(expected, Buffer.from(tokenDigest(token)))
}
