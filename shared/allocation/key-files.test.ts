import { createHash } from 'node:crypto'
import { describe, expect, test } from 'vitest'
import { fingerprint, keyFile } from './key-files.ts'
import { files, head, history, names, seed } from './round-fixture.ts'
import { readKey, ShapeError } from './shapes.ts'

describe('plan.json and key.json', () => {
  test('have as fingerprint the SHA-256 of their bytes, as any other program computes it', () => {
    const { plan, key } = files()
    for (const file of [plan, key]) {
      expect(file.fingerprint).toBe(createHash('sha256').update(Buffer.from(file.text, 'utf8')).digest('hex'))
    }
    // FIPS 180-2, appendix B.1.
    expect(fingerprint('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad')
  })

  test('are the same text again from the same round', () => {
    expect(files()).toEqual(files())
  })

  test('hold every serving of every row, spares included, under a listener number', () => {
    const { drawn, key } = files()
    const document = readKey(key.text)
    expect(document.rows).toHaveLength(7 * 3)
    for (const row of drawn.rows) {
      for (const set of ['served', 'takeover', 'reserve'] as const) {
        const listener = set === 'takeover' ? row.takeoverListener : row.listener
        const written = document.rows.find((one) => one.listener === listener && one.set === set)!
        expect(written.places.map((place) => [place.position, place.turn, place.code, place.unit])).toEqual(
          row.places.map((place) => [place.position, place.turn, place.codes[set], place.unit]),
        )
      }
    }
    expect(document.previousKey).toBe('7f'.repeat(32))
    expect(document.units.map((unit) => unit.name)).toEqual(['Tern One', 'Dunlin', 'Whimbrel “Σ” 🎧'])
  })

  test('say nothing about people: no seat and no code that a listener remembers from before', () => {
    const { plan, key } = files()
    for (const { text } of [plan, key]) expect(text).not.toMatch(/s-anna|s-bo|seatRef|913,274/)
    const document = readKey(key.text)
    expect(document.draw.excludedPairs).toEqual([
      { code: 301, unit: 'u1' },
      { code: 417, unit: 'u2' },
    ])
    expect(document.draw.excludedCodes).toEqual([203, 852])
    expect(JSON.stringify(document.draw)).not.toContain('913')
  })

  test('hold letters only under a split key', () => {
    expect(readKey(files().key.text).letters).toBeUndefined()
    const split = readKey(files('split').key.text)
    expect(split.letters!.map((letter) => letter.letter)).toEqual(['A', 'B', 'C'])
    expect(new Set(split.rows.map((row) => row.set))).toEqual(new Set(['served', 'reserve']))
  })

  test('are refused while being written if a reader would refuse them', () => {
    const { drawn } = files()
    const units = names.map(([id, maker, name]) => ({ id, maker, name, serial: '', firmware: '' }))
    const key = {
      ...head,
      nonce: '0b'.repeat(32),
      seed,
      planDigest: '0c'.repeat(32),
      units,
      draw: drawn,
      history,
      previousKey: null,
    }
    expect(() => keyFile({ ...key, time: '14 March' })).toThrow(ShapeError)
    expect(() => keyFile({ ...key, nonce: 'short' })).toThrow(ShapeError)
    expect(() => keyFile({ ...key, units: units.slice(1) })).toThrow(RangeError)
    expect(() => keyFile({ ...key, previousKey: 'none' })).toThrow(ShapeError)
    expect(keyFile(key).text).toContain('"previousKey":null')
  })
})
