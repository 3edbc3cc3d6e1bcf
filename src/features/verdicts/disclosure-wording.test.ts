import { describe, expect, it } from 'vitest'
import { suggestedDisclosure } from './disclosure-wording.ts'

const dunlin = { name: 'Dunlin', lender: '', returnOn: null }

describe('the wording that Scrim suggests for a disclosure', () => {
  it('names the lender and the day of return of a loan', () => {
    expect(
      suggestedDisclosure({ ...dunlin, provenance: 'loan', lender: 'a shop', returnOn: '2026-11-30' }),
    ).toBe('Dunlin is on loan from a shop until 30 November 2026; the lender saw nothing before this page.')
  })

  it('waits until the lender is known', () => {
    expect(suggestedDisclosure({ ...dunlin, provenance: 'loan' })).toBeNull()
    expect(suggestedDisclosure({ ...dunlin, provenance: 'gift' })).toBeNull()
    expect(suggestedDisclosure({ ...dunlin, provenance: null })).toBeNull()
  })

  it('says who bought a unit where that is known', () => {
    expect(suggestedDisclosure({ ...dunlin, provenance: 'bought' })).toBe(
      'Dunlin was bought by the panel at the usual price.',
    )
    expect(suggestedDisclosure({ ...dunlin, provenance: 'bought', lender: 'one of the listeners' })).toBe(
      'Dunlin was bought by one of the listeners at the usual price.',
    )
  })

  it('says that a prototype may differ from what is sold', () => {
    expect(suggestedDisclosure({ ...dunlin, provenance: 'prototype' })).toContain('may differ')
  })
})
