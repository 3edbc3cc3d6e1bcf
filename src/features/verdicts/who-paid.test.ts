import { describe, expect, it } from 'vitest'
import { whoPaid } from './who-paid.ts'

const bought = (name: string) => ({ name, provenance: 'bought' as const, lender: null, returnOn: null })
const lent = (name: string, lender = 'a shop') => ({
  name,
  provenance: 'loan' as const,
  lender,
  returnOn: '2026-11-30',
})

describe('who paid', () => {
  it('counts what was bought and names what was lent, by whom and until when', () => {
    expect(whoPaid([bought('Knot'), lent('Dunlin'), bought('Godwit'), lent('Avocet')])).toEqual([
      'Two of four units were bought.',
      'Dunlin and Avocet: on loan from a shop until 30 November 2026.',
    ])
  })

  it('says who gave a unit', () => {
    expect(
      whoPaid([{ name: 'Tern One', provenance: 'gift', lender: 'Saltmarsh Audio', returnOn: null }]),
    ).toEqual(['Tern One: given by Saltmarsh Audio.'])
  })

  it('keeps two lenders apart', () => {
    expect(whoPaid([lent('Dunlin'), lent('Avocet', 'a reader')])).toEqual([
      'Dunlin: on loan from a shop until 30 November 2026.',
      'Avocet: on loan from a reader until 30 November 2026.',
    ])
  })

  it('says so where everything was bought, and where nothing is said', () => {
    expect(whoPaid([bought('Knot'), bought('Godwit'), bought('Dunlin')])).toEqual([
      'All three units were bought.',
    ])
    expect(whoPaid([{ name: 'Knot', provenance: null, lender: null, returnOn: null }])).toEqual([
      'Knot: not said.',
    ])
  })
})
