import { describe, expect, it } from 'vitest'
import { asMoney, minorUnits, typedMoney } from './money.ts'

describe('prices', () => {
  it('are read as people type them, with either decimal mark and with thousands', () => {
    expect(minorUnits('189', 'EUR')).toBe(18_900)
    expect(minorUnits('189,5', 'EUR')).toBe(18_950)
    expect(minorUnits('1.234,50', 'EUR')).toBe(123_450)
    expect(minorUnits('1 234.50', 'USD')).toBe(123_450)
    expect(minorUnits('1,234', 'USD')).toBe(123_400)
  })

  it('follow the currency: yen have no hundredths', () => {
    expect(minorUnits('29800', 'JPY')).toBe(29_800)
    expect(minorUnits('29800.5', 'JPY')).toBeNull()
  })

  it('are not guessed where the words cannot be read', () => {
    expect(minorUnits('about 50', 'EUR')).toBeNull()
    expect(minorUnits('189', 'EU')).toBeNull()
    expect(minorUnits('-5', 'EUR')).toBeNull()
    expect(minorUnits('', 'EUR')).toBeNull()
  })

  it('are shown with their currency, whole where they are whole', () => {
    expect(asMoney({ minor: 18_900, currency: 'EUR' })).toBe('€189')
    expect(asMoney({ minor: 5450, currency: 'USD' })).toBe('US$54.50')
  })

  it('go back into the field as they were typed', () => {
    expect(typedMoney({ minor: 18_900, currency: 'EUR' })).toBe('189')
    expect(typedMoney({ minor: 18_950, currency: 'EUR' })).toBe('189.50')
    expect(typedMoney({ minor: 29_800, currency: 'JPY' })).toBe('29800')
  })
})
