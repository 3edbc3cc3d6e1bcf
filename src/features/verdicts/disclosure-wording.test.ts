import { describe, expect, it } from 'vitest'
import { suggestedDisclosure } from './disclosure-wording.ts'

const nothing = { lender: '', returnOn: null }

describe('the wording that Scrim suggests for a disclosure', () => {
  it('names the lender and the day of return of a loan', () => {
    expect(suggestedDisclosure({ provenance: 'loan', lender: 'a shop', returnOn: '2026-11-30' })).toBe(
      'On loan from a shop until 30 November 2026; the lender saw nothing before this page.',
    )
  })

  it('waits until the lender is known', () => {
    expect(suggestedDisclosure({ ...nothing, provenance: 'loan' })).toBeNull()
    expect(suggestedDisclosure({ ...nothing, provenance: 'gift' })).toBeNull()
    expect(suggestedDisclosure({ ...nothing, provenance: 'discounted' })).toBeNull()
    expect(suggestedDisclosure({ ...nothing, provenance: null })).toBeNull()
  })

  it('says who bought a unit where that is known', () => {
    expect(suggestedDisclosure({ ...nothing, provenance: 'bought' })).toBe(
      'Bought by the panel at the usual price.',
    )
    expect(suggestedDisclosure({ ...nothing, provenance: 'bought', lender: 'one of the listeners' })).toBe(
      'Bought by one of the listeners at the usual price.',
    )
  })

  it('says that a prototype may differ from what is sold', () => {
    expect(suggestedDisclosure({ ...nothing, provenance: 'prototype' })).toContain('may differ')
  })
})
