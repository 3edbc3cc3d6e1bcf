import { describe, expect, test } from 'vitest'
import { dueInOrder, heldBy, shortRound, taggedIn, turnsOf, type Pouch } from './due.ts'
import { printed } from './printed.ts'

const pouch = (turn: number, unit: string, state: Pouch['state'], code: string): Pouch => ({
  serving: `s-${code}`,
  seat: `Seat ${code.slice(-1)}`,
  turn,
  code,
  maker: 'Saltmarsh Audio',
  unit,
  state,
})

describe('what is due at the keeper’s', () => {
  test('pouches come turn by turn', () => {
    const pouches = [
      pouch(2, 'Knot', 'to-tag', '417'),
      pouch(1, 'Avocet', 'to-tag', '528'),
      pouch(1, 'Knot', 'free', '639'),
    ]
    expect(dueInOrder(pouches).map(({ code }) => code)).toEqual(['528', '417'])
  })

  test('a pair that is still with a listener is held, and what is at hand comes before it', () => {
    const out = pouch(1, 'Knot', 'out', '639')
    const pouches = [out, pouch(2, 'Knot', 'to-tag', '417'), pouch(2, 'Avocet', 'to-tag', '528')]
    expect(heldBy(pouches[1] as Pouch, pouches)).toBe(out)
    expect(dueInOrder(pouches).map(({ code }) => code)).toEqual(['528', '417'])
  })

  test('a pair that waits under an earlier code is not tagged over', () => {
    const pouches = [pouch(1, 'Knot', 'tagged', '639'), pouch(2, 'Knot', 'to-tag', '417')]
    expect(heldBy(pouches[1] as Pouch, pouches)?.code).toBe('639')
  })

  test('a pair that came back is free for its next code', () => {
    const pouches = [pouch(1, 'Knot', 'free', '639'), pouch(2, 'Knot', 'to-tag', '417')]
    expect(heldBy(pouches[1] as Pouch, pouches)).toBeUndefined()
  })

  test('a turn counts what is tagged, out or back', () => {
    const pouches = [
      pouch(1, 'Knot', 'out', '639'),
      pouch(1, 'Avocet', 'to-tag', '417'),
      pouch(2, 'Knot', 'to-tag', '528'),
    ]
    expect(taggedIn(pouches, 1)).toEqual({ tagged: 1, of: 2 })
    expect(turnsOf(pouches)).toEqual([1, 2])
  })
})

describe('what is printed', () => {
  const tags = {
    part: 'keeper' as const,
    turn: 1,
    turns: 2,
    pouches: [pouch(2, 'Knot', 'to-tag', '952'), pouch(1, 'Avocet', 'to-tag', '417')],
    reserves: [{ seat: 'Seat 1', turn: 2, code: '638', maker: 'Saltmarsh Audio', unit: 'Knot' }],
  }

  test('cards carry signs only, sorted, so that neither a unit nor the order tells anything', () => {
    const { cards } = printed(tags)
    expect(cards).toEqual(['417', '638', '952'])
    expect(cards.join(' ')).not.toMatch(/Knot|Avocet|Saltmarsh/)
  })

  test('the sheet runs turn by turn, reserves last', () => {
    expect(printed(tags).rows.map(([turn, , code]) => [turn, code])).toEqual([
      ['1', '417'],
      ['2', '952'],
      ['reserve', '638'],
    ])
  })

  test('each half of a split key prints its own half and nothing of the other', () => {
    const letters = printed({
      part: 'letters',
      pouches: [{ letter: 'A', maker: 'M', unit: 'Knot', done: false }],
    })
    expect(letters.cards).toEqual(['A'])
    const codes = printed({
      part: 'codes',
      pouches: [{ letter: 'A', code: '417', reserve: '528', done: false }],
    })
    expect(codes.cards).toEqual(['417', '528'])
    expect(codes.rows).toEqual([['A', '417', '528']])
  })

  test('the round’s sign on a card is six characters of its id', () => {
    expect(shortRound('9f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b')).toBe('9F2B1A')
  })
})
