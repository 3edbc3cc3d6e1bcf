import { describe, expect, it } from 'vitest'
import { exampleVerdict } from './verdict.fixture.ts'
import { methodWords } from './method-words.ts'

const at = (term: string, method = exampleVerdict.method) =>
  methodWords(method).find((row) => row.term === term)?.words

describe('how the round was held', () => {
  it('says blinding and level matching in sentences', () => {
    expect(at('Blinding')).toMatch(/^Single-blind/)
    expect(at('Levels')).toBe('Levels were matched by ear.')
  })

  it('says when the plan froze', () => {
    expect(at('Opened and closed')).toMatch(/nothing in the plan could change/)
  })

  it('leaves out what an imported round does not know', () => {
    const imported = {
      ...exampleVerdict.method,
      origin: 'imported' as const,
      blinding: 'imported',
      openedAt: null,
      closedAt: null,
      turns: null,
      levelMatching: '',
      hiding: '',
      sourceChain: '',
      tracks: [],
    }
    expect(methodWords(imported).map((row) => row.term)).toEqual(['Blinding', 'Listeners', 'Statistics'])
    expect(at('Blinding', imported)).toMatch(/Scrim did not draw the codes/)
  })
})
