import { describe, expect, it } from 'vitest'
import { exampleReveal } from './reveal.fixture.ts'
import { lastStep, progressAt, saidAt, stepFrom } from './reveal-steps.ts'

describe('the reveal, step by step', () => {
  it('names no unit before its cloth is drawn aside', () => {
    for (let step = 0; step < exampleReveal.units.length; step++) {
      const said = JSON.stringify(saidAt(exampleReveal, step))
      for (const hidden of exampleReveal.units.slice(step)) expect(said).not.toContain(hidden.name)
    }
  })

  it('says codes, maker, name and figures of the unit that has just come out', () => {
    expect(saidAt(exampleReveal, 1)).toEqual({
      heading: 'Saltmarsh Audio Tern One',
      codes: ['417', '528'],
      detail: 'Width: median 41.0, the middle half between 33.0 and 47.0, six ratings.',
    })
  })

  it('says so where nobody could rate a unit', () => {
    expect(saidAt(exampleReveal, 3).detail).toBe('Nobody could rate it on width.')
  })

  it('ends with the panel’s sentence', () => {
    expect(saidAt(exampleReveal, lastStep(exampleReveal))).toEqual({
      heading: exampleReveal.sentence,
      codes: [],
      detail: '',
    })
  })

  it('takes a step from the address only where there is such a step', () => {
    expect(stepFrom('2', exampleReveal)).toBe(2)
    expect(stepFrom('99', exampleReveal)).toBe(4)
    expect(stepFrom('-3', exampleReveal)).toBe(0)
    expect(stepFrom('soon', exampleReveal)).toBe(0)
    expect(stepFrom(null, exampleReveal)).toBe(0)
  })

  it('counts what is drawn aside', () => {
    expect(progressAt(exampleReveal, 2)).toBe('2 of 3 drawn aside')
    expect(progressAt(exampleReveal, 4)).toBe('3 of 3 drawn aside')
  })
})
