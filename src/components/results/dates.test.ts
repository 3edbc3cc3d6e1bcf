import { describe, expect, it } from 'vitest'
import { asDay, asInstant, asInstantDay } from './dates.ts'

describe('dates on screen', () => {
  it('writes a calendar date the same in every zone', () => {
    expect(asDay('2026-11-30')).toBe('30 November 2026')
  })

  it('gives a moment its zone', () => {
    expect(asInstant('2026-11-07T21:40:00Z', 'UTC')).toMatch(/^7 November 2026(,| at) 21:40 UTC$/)
  })

  it('says the day as it was in the zone asked for', () => {
    expect(asInstantDay('2026-11-07T23:40:00Z', 'Europe/Athens')).toBe('8 November 2026')
  })
})
