import type { Deps } from '#server/deps.ts'
import { createStream } from '#shared/allocation/stream.ts'
import { createHash } from 'node:crypto'

/** Randomness that repeats: for invented data only. */
export function seededRandom(name: string): Deps['random'] {
  const stream = createStream(createHash('sha256').update(name).digest('hex'), 'demo')
  return {
    bytes: (count) => Buffer.from(stream.bytes(count)),
    id: () => {
      const bytes = Buffer.from(stream.bytes(16))
      bytes.writeUInt8((bytes.readUInt8(6) & 0x0f) | 0x40, 6) // RFC 9562, version 4
      bytes.writeUInt8((bytes.readUInt8(8) & 0x3f) | 0x80, 8)
      const hex = bytes.toString('hex')
      return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join(
        '-',
      )
    },
  }
}
