import { createHash, createHmac } from 'node:crypto'
import type { Deps } from '#server/deps.ts'

export type LinkKind = 'seat' | 'duty'

/**
 * A link's token is made from the server's secret, so that it can be shown again without being stored; the table keeps
 * its hash. Renewing raises the version: the old link stops working. 132 bits.
 */
export function linkToken(deps: Pick<Deps, 'env'>, kind: LinkKind, id: string, version: number): string {
  return createHmac('sha256', Buffer.from(deps.env.secret, 'hex'))
    .update(`link ${kind} ${id} ${version}`)
    .digest('base64url')
    .slice(0, 22)
}

export const linkHash = (token: string): string =>
  createHash('sha256').update(`scrim link ${token}`).digest('hex')

export const linkAddress = (deps: Pick<Deps, 'env'>, token: string): string =>
  `${deps.env.address}/join/${token}`
