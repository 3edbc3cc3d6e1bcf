import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { range } from './balance.ts'
import { CODE_SETS, CODES, drawCodes, drawLetters, isCode, MOST_CODES, placesApart } from './codes.ts'
import { createStream } from './stream.ts'

const stream = (label = 'codes') => createStream('91'.repeat(32), label)
const names = (count: number) => range(count).map((i) => `unit-${i}`)
const none = { pairs: [], codes: [] }

type Drawn = Extract<ReturnType<typeof drawCodes>, { ok: true }>['rows']

function drawn(input: Partial<Parameters<typeof drawCodes>[0]> & { rows: number; units: string[] }): Drawn {
  const result = drawCodes({ ...none, stream: stream(), ...input })
  if (!result.ok) throw new Error(result.detail)
  return result.rows
}

const ofRow = (row: Drawn[number]) => row.flatMap((codes) => CODE_SETS.map((set) => codes[set]))

const closest = (codes: number[]) =>
  Math.min(...codes.flatMap((one, i) => codes.slice(0, i).map((other) => placesApart(one, other))))

describe('codes', () => {
  test('are the 633 numbers of three different digits that do not run up or down', () => {
    expect(CODES).toHaveLength(633)
    for (const refused of [99, 1000, 100, 112, 121, 666, 123, 345, 789, 210, 321, 987, 417.5, NaN]) {
      expect(isCode(refused), `${refused}`).toBe(false)
    }
    for (const taken of [102, 135, 132, 890, 901, 417, 980]) expect(isCode(taken), `${taken}`).toBe(true)
  })

  test('differ throughout a sitting, and in two places within a row, in every size that is allowed', () => {
    for (let units = 2; units <= 12; units += 1) {
      for (const rows of [1, 2, Math.floor(MOST_CODES / (3 * units))]) {
        const codes = drawn({ rows, units: names(units) })
        const all = codes.flatMap(ofRow)
        expect(new Set(all).size).toBe(rows * units * 3)
        expect(all.every(isCode)).toBe(true)
        for (const row of codes) expect(closest(ofRow(row))).toBeGreaterThanOrEqual(2)
      }
    }
  })

  test('are refused with the reason when a sitting needs more than 300', () => {
    const result = drawCodes({ rows: 17, units: names(6), ...none, stream: stream() })
    expect(result).toEqual({
      ok: false,
      reason: 'too-many-codes',
      detail: '17 rows of 6 units need 306 codes; a sitting has at most 300',
    })
    expect(drawn({ rows: 16, units: names(6) })).toHaveLength(16)
  })

  test('never bring back an excluded code or an excluded pair of code and unit', () => {
    const pair = fc.record({ code: fc.constantFrom(...CODES), unit: fc.constantFrom(...names(4)) })
    const some = { maxLength: 300, size: 'max' } as const
    fc.assert(
      fc.property(
        fc.array(pair, some),
        fc.array(fc.constantFrom(...CODES), some),
        fc.nat(),
        (pairs, codes, label) => {
          const spent = new Set(pairs.map(({ code, unit }) => `${code} ${unit}`))
          const units = names(4)
          const rows = drawn({ rows: 8, units, pairs, codes, stream: stream(`${label}`) })
          for (const row of rows) {
            row.forEach((byset, u) => {
              for (const set of CODE_SETS) {
                expect(codes).not.toContain(byset[set])
                expect(spent.has(`${byset[set]} ${units[u]}`)).toBe(false)
              }
            })
          }
          expect(new Set(rows.flatMap(ofRow)).size).toBe(96)
        },
      ),
      { numRuns: 25 },
    )
  })

  test('find room for a unit that was in all of the last ten rounds', () => {
    const [house, ...others] = names(6)
    const pairs = stream('spent')
      .shuffle(CODES)
      .slice(0, 480)
      .map((code) => ({ code, unit: house! }))
    const spent = new Set(pairs.map((pair) => pair.code))
    const rows = drawn({ rows: 16, units: [house!, ...others], pairs })
    for (const row of rows) for (const set of CODE_SETS) expect(spent.has(row[0]![set])).toBe(false)
  })

  test('move codes among servings when only one arrangement is left', () => {
    const onlyFor = (unit: string, left: number[]) =>
      CODES.filter((code) => !left.includes(code)).map((code) => ({ code, unit }))
    const pairs = [
      ...onlyFor('a', [102, 304]),
      ...onlyFor('b', [102, 304, 516, 718]),
      ...onlyFor('c', [516, 718, 920, 142]),
    ]
    for (let i = 0; i < 8; i += 1) {
      const result = drawLetters({ units: ['a', 'b', 'c'], pairs, codes: [], stream: stream(`tight ${i}`) })
      if (!result.ok) throw new Error(result.detail)
      const of = (unit: string) => {
        const { served, reserve } = result.letters.find((letter) => letter.unit === unit)!.codes
        return [served, reserve].sort((x, y) => x - y)
      }
      expect(of('a')).toEqual([102, 304])
      expect(of('b')).toEqual([516, 718])
      expect(of('c')).toEqual([142, 920])
    }
  })

  test('are refused with the reason when earlier rounds leave too few', () => {
    const codes = CODES.slice(0, 600)
    const result = drawCodes({ rows: 6, units: names(4), pairs: [], codes, stream: stream() })
    expect(result).toMatchObject({ ok: false, reason: 'history-leaves-too-few-codes' })
    const letters = drawLetters({ units: names(4), pairs: [], codes: CODES.slice(0, 626), stream: stream() })
    expect(letters).toMatchObject({ ok: false, reason: 'history-leaves-too-few-codes' })
  })

  test('fall to one place apart only when two places are no longer possible', () => {
    const left = [102, 103, 104, 105, 106, 107]
    const codes = CODES.filter((code) => !left.includes(code))
    const row = drawn({ rows: 1, units: names(2), codes })
    expect(row.flatMap(ofRow).sort((a, b) => a - b)).toEqual(left)
  })
})

describe('the letters of a split key', () => {
  test('give each unit one letter and two codes, in two different places from all others', () => {
    const firsts = new Set<string>()
    for (let i = 0; i < 60; i += 1) {
      const units = names(6)
      const result = drawLetters({ units, ...none, stream: stream(`letters ${i}`) })
      if (!result.ok) throw new Error(result.detail)
      expect(result.letters.map((letter) => letter.letter).join('')).toBe('ABCDEF')
      expect(result.letters.map((letter) => letter.unit).sort()).toEqual(units)
      expect(
        closest(result.letters.flatMap(({ codes }) => [codes.served, codes.reserve])),
      ).toBeGreaterThanOrEqual(2)
      firsts.add(result.letters[0]!.unit)
    }
    expect(firsts.size).toBe(6)
  })
})
