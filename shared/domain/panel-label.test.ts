import { describe, expect, it } from 'vitest'
import { panelLabel } from './panel-label.ts'

describe('what a round may call its panel', () => {
  it.each([
    [0, 'none', 'Informal', false, false],
    [4, 'none', 'Informal', false, false],
    [5, 'informal', 'Informal', true, false],
    [6, 'small-panel', 'Small panel', true, true],
    [11, 'small-panel', 'Small panel', true, true],
    [12, 'panel', 'Panel', true, true],
    [19, 'panel', 'Panel', true, true],
    [20, 'full-panel', 'Full panel', true, true],
    [200, 'full-panel', 'Full panel', true, true],
  ] as const)('%s listeners: %s', (fewest, key, words, publicFigures, verdictSentence) => {
    expect(panelLabel([fewest])).toEqual({ key, words, fewest, publicFigures, verdictSentence })
  })
  it('goes by the fewest listeners that any shown unit had', () => {
    expect(panelLabel([14, 14, 11]).key).toBe('small-panel')
    expect(panelLabel([]).key).toBe('none')
  })
})
