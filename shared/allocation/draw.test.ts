import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { range } from './balance.ts'
import { canonicalJson } from './canonical-json.ts'
import { CODE_SETS, CODES } from './codes.ts'
import { drawRound } from './draw.ts'
import { fingerprint } from './key-files.ts'
import { createStream } from './stream.ts'
import type { Draw, DrawInput, Json } from './types.ts'

const input = (more: Partial<DrawInput> = {}): DrawInput => ({
  seed: '6b'.repeat(32),
  scheme: 'scrim-draw-1',
  mode: 'turns',
  units: ['tern-one', 'dunlin', 'whimbrel', 'avocet'].map((id) => ({ id })),
  seats: range(6).map((i) => ({ seatRef: `seat-${i}` })),
  spares: 2,
  codePolicy: 'per-seat',
  history: { pairs: [], codes: [], seats: [] },
  ...more,
})

function drawn(more: Partial<DrawInput> = {}): Draw {
  const result = drawRound(input(more))
  if (!result.ok) throw new Error(result.detail)
  return result.draw
}

const digest = (draw: Draw) => fingerprint(canonicalJson(draw as unknown as Json))
const servedIn = (draw: Draw, seatRef: string) => {
  const listener = draw.seats.find((seat) => seat.seatRef === seatRef)!.listener
  return draw.rows.find((row) => row.listener === listener)!
}

describe('the draw of a round', () => {
  test('is the same to the last digit from the same seed, and as it was when this was written', () => {
    expect(digest(drawn())).toBe(digest(drawn()))
    expect(digest(drawn())).toBe('65a91966252a337fa1f4f795dadd27db062525e62fff284411cd92e21ac16743')
    expect(digest(drawn({ codePolicy: 'split' }))).toBe(
      'a4103b34f6c8956c0d7147ab7ee29eee9c31b24e37faabab51579d80fa37820c',
    )
  })

  test('changes with each single bit of the seed', () => {
    const digests = new Set([digest(drawn())])
    for (let bit = 0; bit < 256; bit += 1) {
      const seed = Buffer.alloc(32, 0x6b)
      seed[Math.floor(bit / 8)]! ^= 1 << (bit % 8)
      digests.add(digest(drawn({ seed: seed.toString('hex') })))
    }
    expect(digests.size).toBe(257)
  })

  test('does not depend on the order in which units and seats are given', () => {
    const { units, seats } = input()
    const plain = digest(drawn())
    fc.assert(
      fc.property(
        fc.shuffledSubarray(units, { minLength: 4 }),
        fc.shuffledSubarray(seats, { minLength: 6 }),
        (mixedUnits, mixedSeats) => {
          expect(digest(drawn({ units: mixedUnits, seats: mixedSeats }))).toBe(plain)
        },
      ),
      { numRuns: 20 },
    )
  })

  test('numbers listeners at random, spares included, and those who take over after all others', () => {
    const draw = drawn()
    expect(draw.rows.map((row) => row.listener)).toEqual([1, 2, 3, 4, 5, 6, 7, 8])
    expect(draw.rows.map((row) => row.takeoverListener)).toEqual([9, 10, 11, 12, 13, 14, 15, 16])
    expect(draw.rows.filter((row) => row.spare)).toHaveLength(2)
    const seated = draw.seats.map((seat) => seat.listener)
    expect(new Set(seated).size).toBe(6)
    for (const { listener } of draw.seats) {
      expect(draw.rows.find((row) => row.listener === listener)!.spare).toBe(false)
    }
    const numbersOfFirstSeat = new Set(
      range(60).map((i) => drawn({ seed: i.toString(16).padStart(64, '0') }).seats[0]!.listener),
    )
    expect(numbersOfFirstSeat.size).toBe(8)
  })

  test('gives every serving of the round a code of its own, in three sets', () => {
    const codes = drawn().rows.flatMap((row) =>
      row.places.flatMap((place) => CODE_SETS.map((set) => place.codes[set])),
    )
    expect(codes).toHaveLength(8 * 4 * 3)
    expect(new Set(codes).size).toBe(codes.length)
  })

  test('keeps every listener from the codes of their last three rounds', () => {
    for (let i = 0; i < 40; i += 1) {
      const memory = createStream(i.toString(16).padStart(64, '0'), 'memory')
      const seats = input().seats.map(({ seatRef }) => ({
        seatRef,
        codes: memory.shuffle(CODES).slice(0, 40),
      }))
      const seed = i.toString(16).padStart(64, '0')
      const draw = drawn({ seed, history: { pairs: [], codes: [], seats } })
      for (const { seatRef, codes } of seats) {
        for (const place of servedIn(draw, seatRef).places) {
          expect(codes).not.toContain(place.codes.served)
          expect(codes).not.toContain(place.codes.reserve)
        }
      }
    }
  })

  test('lets what listeners remember decide only who sits where, so that the key says nothing about them', () => {
    const plain = drawn()
    const met = servedIn(plain, 'seat-2').places[0]!.codes.served
    const other = drawn({ history: { pairs: [], codes: [], seats: [{ seatRef: 'seat-2', codes: [met] }] } })
    expect(other.attempt).toBe(0)
    expect(other.rows).toEqual(plain.rows)
    expect(other.seats).not.toEqual(plain.seats)
  })

  test('draws codes again, and counts it, when no seating suits all', () => {
    const plain = drawn()
    const all = plain.rows.map((row) => row.places[0]!.codes.served)
    const seats = [{ seatRef: 'seat-0', codes: all }]
    const again = drawn({ history: { pairs: [], codes: [], seats } })
    expect(again.attempt).toBeGreaterThan(0)
    expect(again.rows.map((row) => row.places.map((place) => place.unit))).toEqual(
      plain.rows.map((row) => row.places.map((place) => place.unit)),
    )
    for (const place of servedIn(again, 'seat-0').places) expect(all).not.toContain(place.codes.served)
  })

  test('says why it cannot be', () => {
    const many = range(30).map((i) => ({ seatRef: `seat-${i}` }))
    expect(drawRound(input({ seats: many }))).toMatchObject({ ok: false, reason: 'too-many-codes' })
    const seats = [{ seatRef: 'seat-0', codes: [...CODES] }]
    expect(drawRound(input({ history: { pairs: [], codes: [], seats } }))).toMatchObject({
      ok: false,
      reason: 'history-leaves-too-few-codes',
    })
  })

  test('refuses two units or seats of one name, a strange seat in the history, and a short seed', () => {
    const twice = [{ id: 'dunlin' }, { id: 'dunlin' }]
    expect(() => drawRound(input({ units: twice }))).toThrow(RangeError)
    expect(() => drawRound(input({ seats: [{ seatRef: 'a' }, { seatRef: 'a' }] }))).toThrow(RangeError)
    const seats = [{ seatRef: 'nobody', codes: [] }]
    expect(() => drawRound(input({ history: { pairs: [], codes: [], seats } }))).toThrow(RangeError)
    expect(() => drawRound(input({ seed: '6b' }))).toThrow(RangeError)
  })
})

describe('the draw under a split key', () => {
  test('gives one code and one reserve code per letter to the whole sitting, thirty listeners included', () => {
    const draw = drawn({ codePolicy: 'split', seats: range(30).map((i) => ({ seatRef: `seat-${i}` })) })
    expect(draw.letters.map((letter) => letter.letter)).toEqual(['A', 'B', 'C', 'D'])
    for (const row of draw.rows) {
      for (const { unit, codes } of row.places) {
        const letter = draw.letters.find((one) => one.unit === unit)!
        expect(codes).toEqual({ ...letter.codes, takeover: letter.codes.served })
      }
    }
  })

  test('keeps all listeners from the codes that any of them remembers', () => {
    const memory = createStream('0f'.repeat(32), 'memory')
    const seats = input().seats.map(({ seatRef }) => ({ seatRef, codes: memory.shuffle(CODES).slice(0, 25) }))
    const draw = drawn({ codePolicy: 'split', history: { pairs: [], codes: [], seats } })
    const remembered = new Set(seats.flatMap((seat) => seat.codes))
    for (const { codes } of draw.letters) {
      expect(remembered.has(codes.served)).toBe(false)
      expect(remembered.has(codes.reserve)).toBe(false)
    }
  })
})
