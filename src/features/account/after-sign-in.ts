import type { Me } from '#shared/contracts/account.ts'
import { to } from '#src/app/paths.ts'

/** Where somebody wanted to go, if it is a place inside Scrim. */
export const insideAddress = (next: string | null): string | null =>
  next !== null && /^\/(?![/\\])/.test(next) ? next : null

/** After signing in: where they wanted to go, else their first panel's desk, else their account. */
export function afterSignIn(me: Me, next: string | null): string {
  const [first] = me.panels
  return insideAddress(next) ?? (first ? to('panel', { panel: first.slug }) : to('account'))
}
