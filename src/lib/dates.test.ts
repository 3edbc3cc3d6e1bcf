import { expect, it } from 'vitest'
import { day, moment, zones } from './dates.ts'

it('shows a moment in the panel’s own zone, and says which', () => {
  expect(moment('2026-11-07T23:40:00Z', 'UTC')).toBe('7 November 2026, 23:40 UTC')
  expect(day('2026-11-07T23:40:00Z', 'Asia/Tokyo')).toBe('8 November 2026')
})

it('falls back to the reader’s own zone where a zone is unknown', () => {
  expect(day('2026-11-07T12:00:00Z', 'Marrow/Sound')).toBe('7 November 2026')
})

it('offers every zone once, the panel’s first', () => {
  const offered = zones(['Asia/Tokyo', 'UTC'])
  expect(offered.slice(0, 2)).toEqual(['Asia/Tokyo', 'UTC'])
  expect(new Set(offered).size).toBe(offered.length)
})
