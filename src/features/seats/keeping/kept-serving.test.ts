import { describe, expect, test } from 'vitest'
import { scorecardOf } from '../seat.fixture.ts'
import { submission } from '#shared/contracts/seats.ts'
import { CallError } from '#src/lib/call.ts'
import type { ErrorCode } from '#shared/contracts/errors.ts'
import { changed, keptId, keptStart, openLines, requeued, submissionOf, submitted } from './kept-serving.ts'
import { lostSeatWords, settled } from './settle.ts'

const place = { seat: 's', serving: 'v', code: '417', ordinal: 1 }
const start = keptStart(place)
const refusal = (code: ErrorCode) =>
  new CallError({
    type: 'about:blank',
    title: '',
    status: 400,
    detail: `because ${code}`,
    code,
    requestId: 'r',
  })

describe('what is kept of one serving', () => {
  test('answers are laid over each other line by line, and cleared lines are open again', () => {
    const one = changed(start, { answers: { a: 40, b: 'cant-tell' } })
    const two = changed(one, { answers: { a: null }, remark: 'thin' })
    expect(two.answers).toEqual({ b: 'cant-tell' })
    expect(two.remark).toBe('thin')
  })

  test('nothing changes once it is submitted, and submitting again keeps the same key', () => {
    const sent = submitted(changed(start, { answers: { a: 40 } }))
    expect(changed(sent, { answers: { a: 90 } })).toBe(sent)
    expect(submitted(sent)).toBe(sent)
  })

  test('two phones or tabs use one key for one serving, and a serving under another code is another one', () => {
    expect(submitted(start).outbox?.key).toBe(submitted(keptStart(place)).outbox?.key)
    expect(submitted(keptStart({ ...place, code: '528' })).outbox?.key).not.toBe(submitted(start).outbox?.key)
    expect(submitted(start).outbox?.key).toMatch(/^[\w-]+$/)
    expect(keptId(place)).not.toBe(keptId({ ...place, code: '528' }))
  })

  test('a line is open until it has a value or “can’t tell”; zero is a value', () => {
    const card = scorecardOf(['warmth', 'width'])
    const kept = changed(start, { answers: { 'overall-liking': 0, warmth: 'cant-tell' } })
    expect(openLines(card, kept).map(({ key }) => key)).toEqual(['width'])
  })

  test('the submission is what the contract takes', () => {
    const kept = changed(start, { answers: { a: 40, b: 'cant-tell' }, remark: ' quiet ' })
    expect(submission.parse(submissionOf(kept))).toEqual({
      answers: [
        { descriptor: 'a', value: 40, cantTell: false },
        { descriptor: 'b', value: null, cantTell: true },
      ],
      remark: 'quiet',
    })
  })
})

describe('after an attempt to send', () => {
  const queued = submitted(changed(start, { answers: { a: 40 }, remark: 'thin' }))

  test('what the server has taken is forgotten on the phone', () => {
    expect(settled(queued, { outcome: 'taken' })).toBeUndefined()
  })

  test('late and void leave a word to read and no answers behind', () => {
    for (const outcome of ['late', 'void'] as const) {
      const left = settled(queued, { outcome })
      expect(left?.outbox?.state).toBe(outcome)
      expect(left?.answers).toEqual({})
      expect(left?.remark).toBe('')
    }
  })

  test('a network or server that is away keeps it in the queue', () => {
    expect(settled(queued, { error: refusal('unavailable') })).toBe(queued)
    expect(settled(queued, { error: refusal('internal') })).toBe(queued)
    expect(settled(queued, { error: refusal('too_many') })).toBe(queued)
    expect(settled(queued, { error: new Error('cut off') })).toBe(queued)
  })

  test('a refusal keeps the answers and says why; sending again uses the same key', () => {
    const left = settled(queued, { error: refusal('conflict') })
    expect(left?.answers).toEqual(queued.answers)
    expect(left?.outbox).toMatchObject({
      state: 'refused',
      words: 'because conflict',
      key: queued.outbox?.key,
    })
    expect(requeued(left)?.outbox).toEqual(queued.outbox)
  })

  test('a phone that lost its seat is told to open the link again', () => {
    expect(settled(queued, { error: refusal('not_found') })?.outbox?.words).toBe(lostSeatWords)
  })
})
