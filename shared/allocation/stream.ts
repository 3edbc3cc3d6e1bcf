import { hmac } from '@noble/hashes/hmac.js'
import { sha256 } from '@noble/hashes/sha2.js'
import { hexToBytes, utf8ToBytes } from '@noble/hashes/utils.js'

/** A cryptographic stream of randomness; every value depends on the seed, the label and what was taken before. */
export type Stream = {
  bytes(count: number): Uint8Array
  /** Uniform over 0…maxExclusive−1, by rejection; maxExclusive 1…2³². */
  integer(maxExclusive: number): number
  /** A shuffled copy (Fisher–Yates). */
  shuffle<T>(items: readonly T[]): T[]
  pick<T>(items: readonly T[]): T
}

const SEED_BYTES = 32
const WORD = 2 ** 32

export function seedBytes(seed: Uint8Array | string): Uint8Array {
  if (typeof seed === 'string' && !/^[0-9a-f]{64}$/.test(seed)) {
    throw new RangeError('a seed is 64 lowercase hex digits')
  }
  const key = typeof seed === 'string' ? hexToBytes(seed) : Uint8Array.from(seed)
  if (key.length !== SEED_BYTES) throw new RangeError('a seed is 32 bytes')
  return key
}

function counterBytes(counter: number): Uint8Array {
  const bytes = new Uint8Array(8)
  const view = new DataView(bytes.buffer)
  view.setUint32(0, Math.floor(counter / WORD))
  view.setUint32(4, counter % WORD)
  return bytes
}

/**
 * HMAC-SHA-256 in counter mode: block i is HMAC(seed, "scrim-stream-1" 0x00 label 0x00 i), i a 64-bit big-endian
 * counter from 0 (the construction of NIST SP 800-108). Streams under different labels are independent.
 */
export function createStream(seed: Uint8Array | string, label: string): Stream {
  const key = seedBytes(seed)
  if (label === '' || label.includes('\0'))
    throw new RangeError('a label has at least one character and no NUL')
  const keyed = hmac.create(sha256, key).update(utf8ToBytes(`scrim-stream-1\0${label}\0`))
  let counter = 0
  let block = new Uint8Array(0)
  let used = 0

  const bytes = (count: number): Uint8Array => {
    const out = new Uint8Array(count)
    for (let filled = 0; filled < count;) {
      if (used === block.length) {
        block = keyed.clone().update(counterBytes(counter)).digest()
        counter += 1
        used = 0
      }
      const taken = Math.min(count - filled, block.length - used)
      out.set(block.subarray(used, used + taken), filled)
      used += taken
      filled += taken
    }
    return out
  }

  const integer = (maxExclusive: number): number => {
    if (!Number.isInteger(maxExclusive) || maxExclusive < 1 || maxExclusive > WORD) {
      throw new RangeError('the bound is an integer from 1 to 2^32')
    }
    const limit = WORD - (WORD % maxExclusive)
    for (;;) {
      const word = new DataView(bytes(4).buffer).getUint32(0)
      if (word < limit) return word % maxExclusive
    }
  }

  const shuffle = <T>(items: readonly T[]): T[] => {
    const out = [...items]
    for (let last = out.length - 1; last > 0; last -= 1) {
      const other = integer(last + 1)
      const held = out[last] as T
      out[last] = out[other] as T
      out[other] = held
    }
    return out
  }

  const pick = <T>(items: readonly T[]): T => {
    if (items.length === 0) throw new RangeError('nothing to pick from')
    return items[integer(items.length)] as T
  }

  return { bytes, integer, shuffle, pick }
}
