import { createHash } from 'node:crypto'
import type { Deps } from '#server/deps.ts'

/** Randomness that comes out the same in two runs: two applications then make the same ids, seeds and codes. */
export function seededChance(seed: string): Deps['random'] {
  let count = 0
  const block = (): Buffer => createHash('sha256').update(`${seed} ${count++}`).digest()
  const bytes = (wanted: number): Buffer => {
    const parts: Buffer[] = []
    for (let have = 0; have < wanted; have += 32) parts.push(block())
    return Buffer.concat(parts).subarray(0, wanted)
  }
  return {
    bytes,
    id: () => {
      const hex = bytes(16).toString('hex')
      return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-a${hex.slice(17, 20)}-${hex.slice(20, 32)}`
    },
  }
}
