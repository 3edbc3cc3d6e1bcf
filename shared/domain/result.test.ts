import { describe, expect, it } from 'vitest'
import { REASONS, cannot, isCannot, reasonSentences, sentenceFor } from './result.ts'

describe('a figure that cannot be said', () => {
  it('has a sentence for each reason', () => {
    expect(Object.keys(reasonSentences).sort()).toEqual([...REASONS].sort())
    for (const sentence of Object.values(reasonSentences)) expect(sentence).toMatch(/^[A-Z].*[.]$/)
  })
  it('is told from a figure', () => {
    expect(isCannot(cannot('no-repeats'))).toBe(true)
    expect([isCannot(0), isCannot(null), isCannot({ estimate: 1 }), isCannot({ ok: true })]).toEqual([
      false,
      false,
      false,
      false,
    ])
  })
  it('shows a reason from elsewhere as it is', () => {
    expect(sentenceFor('no-repeats')).toBe('No unit came back a second time.')
    expect(sentenceFor('not estimable')).toBe('Not estimable.')
  })
})
