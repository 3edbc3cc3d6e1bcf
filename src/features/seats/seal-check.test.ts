import { describe, expect, test } from 'vitest'
import { sealOutcome, sealStart, sealStep, type SealAnswer, type SealCheck } from './seal-check.ts'

const after = (...answers: SealAnswer[]): SealCheck => answers.reduce(sealStep, sealStart)

describe('the seal check', () => {
  test('three times yes is a seal', () => {
    const check = after('yes', 'yes', 'yes')
    expect(check.at).toBe('sealed')
    expect(sealOutcome(check)).toBe('yes')
  })

  test('not being able to tell goes on and is told as unsure', () => {
    expect(sealOutcome(after('yes', 'cant-tell', 'yes'))).toBe('unsure')
  })

  test('a no means seating the earphones anew, and the questions begin again', () => {
    expect(after('yes', 'no').at).toBe('reseat')
    expect(after('yes', 'no', 'done').at).toBe('bass')
  })

  test('what was unsure before the earphones were seated anew no longer counts', () => {
    expect(sealOutcome(after('cant-tell', 'no', 'done', 'yes', 'yes', 'yes'))).toBe('yes')
  })

  test('after seating anew three times other tips are tried, and only then there is no seal', () => {
    const thrice = ['no', 'done', 'no', 'done', 'no', 'done'] as const
    expect(after(...thrice).reseats).toBe(3)
    expect(after(...thrice, 'no').at).toBe('other-tips')
    const none = after(...thrice, 'no', 'done', 'no')
    expect(none.at).toBe('no-seal')
    expect(sealOutcome(none)).toBe('no')
  })

  test('where there are no other tips there is no seal, and one may check again from the start', () => {
    const none = after('no', 'done', 'no', 'done', 'no', 'done', 'no', 'no-other-tips')
    expect(none.at).toBe('no-seal')
    expect(sealStep(none, 'again')).toEqual(sealStart)
  })
})
