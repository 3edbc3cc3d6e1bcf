import { describe, expect, test } from 'vitest'
import { untilWords } from '#src/lib/until-words.ts'
import { keptStart, submitted } from './keeping/kept-serving.ts'
import { seatFixture, seatId, servingFixture, servingId } from './seat.fixture.ts'
import { nextServing, ordinalWord, screenFor } from './step-screen.ts'

const draft = { ...keptStart({ seat: seatId, serving: servingId, code: '417', ordinal: 1 }) }
const plain = { readAbout: true, kept: undefined }

describe('which screen is due', () => {
  test('what is coming is read before consent is asked', () => {
    const seat = seatFixture({ step: 'consent', consented: false })
    expect(screenFor(seat, { readAbout: false, kept: undefined })).toBe('coming-up')
    expect(screenFor(seat, plain)).toBe('consent')
  })

  test('a submission that waits in the outbox is ahead of the server', () => {
    const seat = seatFixture({ step: 'rate', serving: servingFixture() })
    expect(screenFor(seat, { readAbout: true, kept: draft })).toBe('rate')
    expect(screenFor(seat, { readAbout: true, kept: submitted(draft) })).toBe('queued')
  })

  test('the server leads in everything else: a next turn takes the listener along', () => {
    const seat = seatFixture({ step: 'enter-code', serving: servingFixture({ ordinal: 2, code: null }) })
    expect(screenFor(seat, { readAbout: true, kept: submitted(draft) })).toBe('enter-code')
  })

  test('a closed round shows the own report only to those who may see it', () => {
    expect(screenFor(seatFixture({ step: 'closed' }), plain)).toBe('closed')
    expect(screenFor(seatFixture({ step: 'closed', can: { seeReport: true } }), plain)).toBe('report')
  })
})

describe('what comes next, in words', () => {
  test('before the first serving it is the first, after a serving the one after it, and at the end none', () => {
    expect(nextServing(seatFixture())).toEqual({ ordinal: 1, of: 4 })
    const serving = servingFixture({ state: 'submitted', ordinal: 2 })
    expect(nextServing(seatFixture({ serving }))).toEqual({ ordinal: 3, of: 4 })
    expect(nextServing(seatFixture({ serving: { ...serving, ordinal: 4 } }))).toBeNull()
  })

  test('ordinals are words up to eight', () => {
    expect([1, 5, 8, 9].map(ordinalWord)).toEqual(['first', 'fifth', 'eighth', 'number 9'])
  })

  test('a rest counts down in minutes and seconds and then is over', () => {
    expect(untilWords(80_000, 0)).toBe('1:20')
    expect(untilWords(80_000, 79_500)).toBe('0:01')
    expect(untilWords(80_000, 80_000)).toBeNull()
  })
})
