/**
 * A key for a write that may be repeated. `randomUUID` is missing on plain http beyond loopback; `getRandomValues` is
 * there everywhere.
 */
export function randomKey(): string {
  if (typeof crypto.randomUUID === 'function') return crypto.randomUUID()
  const bytes = crypto.getRandomValues(new Uint8Array(16))
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')
}
