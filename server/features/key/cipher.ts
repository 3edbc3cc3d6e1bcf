import { createCipheriv, createDecipheriv, hkdfSync } from 'node:crypto'
import type { Deps } from '#server/deps.ts'

const keyFor = (secret: string, purpose: string): Buffer =>
  Buffer.from(hkdfSync('sha256', Buffer.from(secret, 'hex'), Buffer.alloc(0), `scrim ${purpose}`, 32))

/** Encrypts at rest: AES-256-GCM, bound to its purpose (which names the round). Layout: 12 bytes nonce, 16 bytes tag, text. */
export function conceal(deps: Pick<Deps, 'env' | 'random'>, purpose: string, text: string): Buffer {
  const nonce = deps.random.bytes(12)
  const cipher = createCipheriv('aes-256-gcm', keyFor(deps.env.secret, purpose), nonce)
  const body = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()])
  return Buffer.concat([nonce, cipher.getAuthTag(), body])
}

/** @throws where the secret, the purpose or a single bit is not the same */
export function disclose(deps: Pick<Deps, 'env'>, purpose: string, sealed: Buffer): string {
  const decipher = createDecipheriv('aes-256-gcm', keyFor(deps.env.secret, purpose), sealed.subarray(0, 12))
  decipher.setAuthTag(sealed.subarray(12, 28))
  return Buffer.concat([decipher.update(sealed.subarray(28)), decipher.final()]).toString('utf8')
}
