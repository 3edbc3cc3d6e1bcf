import { describe, expect, test } from 'vitest'
import { servingStates } from '#shared/domain/round-status.ts'
import { mayVoid, seatState, ticksOf, turnVerb } from './state-words.ts'
import { tableFixture, tableSeat, tableServing } from './table.fixture.ts'

const now = Date.parse('2026-03-12T19:00:00Z')
const { sitting } = tableFixture()
const said = (part: Parameters<typeof tableSeat>[1]) => seatState(tableSeat(1, part), sitting, now)
const serving = (part: Parameters<typeof tableServing>[0]) => said({ serving: tableServing(part) })

describe('what a seat is doing, in the steward’s words', () => {
  test('every state of a serving has its words', () => {
    const words = servingStates.map((state) => serving({ state }).words)
    expect(words.every((one) => one.length > 0)).toBe(true)
    expect(new Set(words).size).toBe(servingStates.length)
  })

  test('a rest counts down, and afterwards the serving is simply sent', () => {
    const restUntil = '2026-03-12T19:01:20Z'
    expect(serving({ state: 'submitted', restUntil })).toEqual({ words: 'sent, rests 1:20', kind: 'done' })
    const later = seatState(
      tableSeat(1, { serving: tableServing({ state: 'submitted', restUntil }) }),
      sitting,
      now + 80_000,
    )
    expect(later.words).toBe('sent')
  })

  test('a wrong code and a missing seal call the steward', () => {
    expect(serving({ state: 'handed', wrongCodes: 2 })).toEqual({
      words: 'typed a wrong code 2 times: check the pouch',
      kind: 'signal',
    })
    expect(serving({ state: 'confirmed', seal: 'no' }).kind).toBe('signal')
    expect(serving({ state: 'confirmed', seal: null }).words).toBe('has the pouch, seal check')
    expect(serving({ state: 'confirmed', seal: 'unsure' }).words).toBe('listening and rating')
  })

  test('who has left, has not come, or rests is said before anything else', () => {
    expect(said({ left: true }).words).toBe('has left')
    expect(said({ joined: false }).kind).toBe('signal')
    expect(said({ serving: null, resting: true }).words).toBe('rests this turn')
  })

  test('after the listening the end questions are awaited', () => {
    const over = { ...sitting, ended: true }
    expect(seatState(tableSeat(1), over, now).words).toBe('at the end questions')
    expect(seatState(tableSeat(1, { endAnswered: true }), over, now).words).toBe('all answered')
  })

  test('ticks say what was done at the seat, and nothing is ticked before the code was read back', () => {
    const ticks = (part: Parameters<typeof tableServing>[0]) =>
      ticksOf(tableSeat(1, { serving: tableServing(part) }))
    expect(ticks({ state: 'handed', seal: null })).toEqual([])
    expect(ticks({ state: 'confirmed', seal: null })).toEqual(['code read back'])
    expect(ticks({ state: 'submitted', seal: 'unsure' })).toEqual(['code read back', 'seal unsure'])
  })

  test('only what is handed over or in hand may be set aside', () => {
    const may = servingStates.filter((state) => mayVoid(tableSeat(1, { serving: tableServing({ state }) })))
    expect(may).toEqual(['handed', 'confirmed'])
  })

  test('the verb starts, goes on, and ends', () => {
    expect([0, 1, 4].map((turn) => turnVerb({ turn, turns: 4 }))).toEqual([
      'Start turn 1',
      'Next turn: 2 of 4',
      'End the listening',
    ])
  })
})
