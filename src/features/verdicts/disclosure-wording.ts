import { day } from '#src/lib/dates.ts'

export type Provenance = 'bought' | 'loan' | 'gift' | 'discounted' | 'prototype'

/** How a provenance is asked for on the desk, and the one word that stands in the table of compared units. */
export const provenanceWords: Record<Provenance, { choice: string; word: string; hint: string }> = {
  bought: { choice: 'Bought', word: 'bought', hint: 'Paid in full, by the panel or by a listener.' },
  loan: { choice: 'On loan', word: 'loan', hint: 'Goes back to whoever lent it.' },
  gift: { choice: 'A gift', word: 'gift', hint: 'Given, and kept.' },
  discounted: { choice: 'Bought at a discount', word: 'discounted', hint: 'Cheaper because of who we are.' },
  prototype: { choice: 'A prototype', word: 'prototype', hint: 'Not what is sold.' },
}

interface Facts {
  provenance: Provenance | null
  lender: string
  returnOn: string | null
}

/**
 * A wording for the sentence that readers will see after the unit's name. The organiser changes it until it is true; null while the facts it
 * needs are missing.
 */
export function suggestedDisclosure({ provenance, lender, returnOn }: Facts): string | null {
  const from = lender.trim()
  switch (provenance) {
    case null:
      return null
    case 'bought':
      return from === '' ? 'Bought by the panel at the usual price.' : `Bought by ${from} at the usual price.`
    case 'loan': {
      if (from === '') return null
      const until = returnOn === null ? '' : ` until ${day(returnOn, 'UTC')}`
      return `On loan from ${from}${until}; the lender saw nothing before this page.`
    }
    case 'gift':
      return from === '' ? null : `Given by ${from}, who asked for nothing and saw nothing before this page.`
    case 'discounted':
      return from === '' ? null : `Bought from ${from} below the usual price.`
    case 'prototype':
      return from === ''
        ? 'A prototype; what is sold may differ.'
        : `A prototype from ${from}; what is sold may differ.`
  }
}
