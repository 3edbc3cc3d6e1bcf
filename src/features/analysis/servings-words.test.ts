import { describe, expect, it } from 'vitest'
import { listenerNames, servingsWords } from './servings-words.ts'

const none = { planned: 36, counted: 36, void: 0, missing: 0, late: 0 }

describe('what the agreement screen says about servings and listeners', () => {
  it('counts all servings where all came in', () => {
    expect(servingsWords(none, 'live')).toBe('36 of 36 servings counted.')
  })

  it('names what was void, missing or late', () => {
    expect(servingsWords({ ...none, counted: 33, void: 1, missing: 2, late: 1 }, 'live')).toBe(
      '33 of 36 servings counted. One serving void and served again; two servings missing; one serving sent after closing: kept, not counted.',
    )
  })

  it('counts what the file held where ratings were imported', () => {
    expect(servingsWords({ ...none, counted: 54 }, 'imported')).toBe('54 servings in the file.')
  })

  it('uses names only where they are given', () => {
    const called = listenerNames([
      { listener: '3', name: 'Ines Falk' },
      { listener: '4', name: null },
    ])
    expect(called('3')).toBe('Ines Falk')
    expect(called('4')).toBe('Listener 4')
    expect(called('9')).toBe('Listener 9')
  })
})
