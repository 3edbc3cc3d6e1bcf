import { describe, expect, it } from 'vitest'
import { agreementWords, bandOf, steadinessSentence } from './agreement-words.ts'
import { cannot } from './result.ts'

const say = (low: number, high: number, units = 6, listeners = 14) =>
  agreementWords({ single: (low + high) / 2, low, high, units, listeners })

describe('one value in words', () => {
  it.each([
    [-0.3, 'hardly'],
    [0, 'hardly'],
    [0.2499, 'hardly'],
    [0.25, 'a little'],
    [0.5, 'a little'],
    [0.5001, 'fairly'],
    [0.75, 'fairly'],
    [0.7501, 'well'],
    [0.9, 'well'],
    [0.9001, 'as one'],
    [1, 'as one'],
  ] as const)('%s is "%s"', (icc, word) => {
    expect(bandOf(icc)).toBe(word)
  })
})

describe('agreement in words, from the interval', () => {
  it.each([
    [0.05, 0.2, 'Listeners hardly agree'],
    [0.3, 0.45, 'Listeners agree a little'],
    [0.55, 0.7, 'Listeners agree fairly'],
    [0.78, 0.88, 'Listeners agree well'],
    [0.92, 0.99, 'Listeners agree as one'],
  ])('%s to %s lies in one band: %s', (low, high, sentence) => {
    expect(say(low, high)).toMatchObject({ sentence, cannotSay: false, maybeChance: false })
    expect(say(low, high).bands).toHaveLength(1)
  })
  it.each([
    [0.1, 0.4, 'Listeners agree between hardly and a little'],
    [0.3, 0.7, 'Listeners agree between a little and fairly'],
    [0.6, 0.85, 'Listeners agree between fairly and well'],
    [0.8, 0.95, 'Listeners agree between well and as one'],
  ])('%s to %s touches two: %s', (low, high, sentence) => {
    expect(say(low, high).sentence).toBe(sentence)
    expect(say(low, high).cannotSay).toBe(false)
  })
  it.each([
    [0.1, 0.6],
    [0.3, 0.8],
    [0.6, 0.95],
    [0.2, 0.99],
  ])('%s to %s touches three or more: this panel cannot say', (low, high) => {
    expect(say(low, high)).toMatchObject({
      cannotSay: true,
      sentence: 'This panel cannot say: only six units',
    })
  })
  it('names chance where the interval holds 0, whatever else is said', () => {
    expect(say(-0.1, 0.2).sentence).toBe('Listeners hardly agree; no better than chance is not ruled out')
    expect(say(0, 0.4).sentence).toBe(
      'Listeners agree between hardly and a little; no better than chance is not ruled out',
    )
    expect(say(-0.2, 0.8).sentence).toBe(
      'This panel cannot say: only six units; no better than chance is not ruled out',
    )
    expect(say(-0.3, -0.1).maybeChance).toBe(false)
  })
  it('blames units, or listeners where units are many and listeners few', () => {
    expect(say(0.1, 0.9, 4).sentence).toBe('This panel cannot say: only four units')
    expect(say(0.1, 0.9, 20, 3).sentence).toBe('This panel cannot say: only three listeners')
    expect(say(0.1, 0.9, 20, 30).sentence).toBe('This panel cannot say: only 20 units')
    expect(say(0.1, 0.9, 1).sentence).toBe('This panel cannot say: only one unit')
  })
  it('says why where there is no figure or no interval', () => {
    const reason = cannot('fewer-than-two-listeners')
    expect(agreementWords({ single: reason, low: reason, high: reason, units: 6, listeners: 1 })).toEqual({
      bands: [],
      cannotSay: true,
      maybeChance: false,
      sentence: 'This panel cannot say: it takes at least two listeners',
    })
    expect(
      agreementWords({ single: 0.4, low: cannot('not-estimable'), high: 0.8, units: 3, listeners: 2 })
        .sentence,
    ).toBe('This panel cannot say: only three units')
  })
})

describe('whether the panel’s mean is steady', () => {
  it('needs the whole interval above or below .75', () => {
    expect(steadinessSentence({ average: 0.9, low: 0.75, high: 0.97 })).toContain('is steady')
    expect(steadinessSentence({ average: 0.4, low: 0.1, high: 0.7 })).toContain('is not steady')
    expect(steadinessSentence({ average: 0.8, low: 0.4, high: 0.95 })).toContain('may or may not be steady')
    expect(steadinessSentence({ average: 0.8, low: cannot('not-estimable'), high: 0.95 })).toContain(
      'may or may not',
    )
    expect(steadinessSentence({ average: cannot('no-ratings'), low: 0, high: 0 })).toContain('cannot be said')
  })
})
