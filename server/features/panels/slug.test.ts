import { describe, expect, it } from 'vitest'
import { slug } from '#shared/contracts/text.ts'
import { slugOf } from './slug.ts'
import { isTimeZone } from './time-zone.ts'

describe('a panel’s address', () => {
  it.each([
    ['The Quayside Bench', 'the-quayside-bench'],
    ['Žižkov Ear Club', 'zizkov-ear-club'],
    ['Straße & Łódź', 'strasse-lodz'],
    ['Rosa’s  “Ears”', 'rosas-ears'],
    ['--- 12 ---', '12'],
    ['①②③', '123'],
    ['слух', 'panel'],
    ['🎧', 'panel'],
    [`${'a'.repeat(59)} b`, 'a'.repeat(59)],
  ])('is made of the name: %s', (name, expected) => {
    expect(slugOf(name)).toBe(expected)
    expect(slug.safeParse(slugOf(name)).success).toBe(true)
  })
})

describe('a time zone', () => {
  it.each(['UTC', 'Europe/Dublin', 'America/Argentina/Ushuaia', 'Etc/GMT+3'])(
    'is known by name: %s',
    (name) => {
      expect(isTimeZone(name)).toBe(true)
    },
  )
  it.each(['', '+01:00', 'Middle/Nowhere', 'Europe/Dublin\u0000', "UTC'; drop", 'x'.repeat(64)])(
    'is not %j',
    (name) => {
      expect(isTimeZone(name)).toBe(false)
    },
  )
})
