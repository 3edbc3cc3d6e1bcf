import { createHmac } from 'node:crypto'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { createStream } from './stream.ts'

const seed = '5c'.repeat(32)
const hex = (bytes: Uint8Array) => Buffer.from(bytes).toString('hex')

describe('the stream that everything is drawn from', () => {
  test('is HMAC-SHA-256 over label and counter, as another implementation computes it', () => {
    const block = (counter: number) => {
      const count = Buffer.alloc(8)
      count.writeBigUInt64BE(BigInt(counter))
      return createHmac('sha256', Buffer.from(seed, 'hex'))
        .update(Buffer.concat([Buffer.from('scrim-stream-1\0codes\0', 'utf8'), count]))
        .digest('hex')
    }
    expect(hex(createStream(seed, 'codes').bytes(96))).toBe(block(0) + block(1) + block(2))
  })

  test('has a state of 256 bits: each single bit of the seed changes what is drawn', () => {
    const drawn = new Set<string>([hex(createStream(seed, 'rows').bytes(32))])
    for (let bit = 0; bit < 256; bit += 1) {
      const other = Uint8Array.from(Buffer.from(seed, 'hex'))
      other[Math.floor(bit / 8)]! ^= 1 << (bit % 8)
      drawn.add(hex(createStream(other, 'rows').bytes(32)))
    }
    expect(drawn.size).toBe(257)
  })

  test('refuses a seed of fewer bits and one that is not plain hex', () => {
    expect(() => createStream(new Uint8Array(31), 'a')).toThrow(RangeError)
    expect(() => createStream(new Uint8Array(4), 'a')).toThrow(RangeError)
    expect(() => createStream('5C'.repeat(32), 'a')).toThrow(RangeError)
    expect(() => createStream('5c'.repeat(31), 'a')).toThrow(RangeError)
    expect(() => createStream(seed, '')).toThrow(RangeError)
    expect(() => createStream(seed, 'a\0b')).toThrow(RangeError)
  })

  test('gives the same again for the same seed and label, in pieces of any size', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 70 }), { maxLength: 8 }), (sizes) => {
        const pieces = createStream(seed, 'x')
        const joined = sizes.map((size) => hex(pieces.bytes(size))).join('')
        expect(joined).toBe(hex(createStream(seed, 'x').bytes(joined.length / 2)))
      }),
    )
  })

  test('keeps labels apart, also where one begins like the other', () => {
    const labels = ['codes 1', 'codes 11', 'codes', 'seats 1', 'turns']
    expect(new Set(labels.map((label) => hex(createStream(seed, label).bytes(32)))).size).toBe(labels.length)
  })

  test('draws whole numbers without favouring low ones', () => {
    const stream = createStream(seed, 'fair')
    const third = 2 ** 30
    const counts = [0, 0, 0]
    for (let i = 0; i < 3000; i += 1) counts[Math.floor(stream.integer(3 * third) / third)]! += 1
    // Without rejection the first third would come up 1500 times; 5 standard deviations are 129.
    for (const count of counts) expect(Math.abs(count - 1000)).toBeLessThan(129)
  })

  test('reaches every number below the bound and none above', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 40 }), (bound) => {
        const stream = createStream(seed, `bound ${bound}`)
        const seen = new Set(Array.from({ length: bound * 30 }, () => stream.integer(bound)))
        expect([...seen].sort((a, b) => a - b)).toEqual(Array.from({ length: bound }, (_, i) => i))
      }),
    )
    for (const bound of [0, -1, 1.5, 2 ** 32 + 1, NaN]) {
      expect(() => createStream(seed, 'a').integer(bound)).toThrow(RangeError)
    }
  })

  test('shuffles into every order about equally often and leaves the list as it was', () => {
    const stream = createStream(seed, 'shuffle')
    const list = ['a', 'b', 'c']
    const counts = new Map<string, number>()
    for (let i = 0; i < 1200; i += 1) {
      const order = stream.shuffle(list).join('')
      counts.set(order, (counts.get(order) ?? 0) + 1)
    }
    expect(list).toEqual(['a', 'b', 'c'])
    expect(counts.size).toBe(6)
    for (const count of counts.values()) expect(Math.abs(count - 200)).toBeLessThan(65)
  })

  test('picks only from what is there', () => {
    const stream = createStream(seed, 'pick')
    expect(new Set(Array.from({ length: 60 }, () => stream.pick(['a', 'b']))).size).toBe(2)
    expect(() => stream.pick([])).toThrow(RangeError)
  })
})
