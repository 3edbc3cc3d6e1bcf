import { describe, expect, it } from 'vitest'
import type { Analysis } from './analysis-types.ts'
import { cannot } from './cannot.ts'
import { holm } from './holm.ts'
import { statedDescriptors } from './stated-descriptors.ts'

describe('Holm’s adjustment', () => {
  it('is that of R’s p.adjust, in the order given', () => {
    const adjusted = holm([0.03, 0.005, 0.04, 0.011, 0.02])
    expect(adjusted.map((p) => Number(p.toFixed(12)))).toEqual([0.06, 0.025, 0.06, 0.044, 0.06])
  })
  it('never passes one and refuses what is no probability', () => {
    expect(holm([0.6, 0.7])).toEqual([1, 1])
    expect(holm([])).toEqual([])
    expect(() => holm([1.2])).toThrow(RangeError)
    expect(() => holm([NaN])).toThrow(RangeError)
  })
})

const withTests = (tests: Record<string, number | null>): Pick<Analysis, 'descriptors' | 'order'> =>
  ({
    order: { descriptors: Object.keys(tests), units: [], panelists: [] },
    descriptors: Object.fromEntries(
      Object.entries(tests).map(([name, p]) => [
        name,
        { model: p === null ? cannot('no-ratings') : { unitTest: { f: 1, df1: 1, df2: 1, p } } },
      ]),
    ),
  }) as unknown as Pick<Analysis, 'descriptors' | 'order'>

describe('what a verdict may state', () => {
  it('is the primary descriptor and those that hold over the scorecard; the rest are hints', () => {
    const stated = statedDescriptors(
      withTests({ liking: 0.4, bass: 0.001, treble: 0.03, width: 0.02, detail: null }),
      'liking',
    )
    expect(stated.map(({ descriptor, stated: may, pairs }) => [descriptor, may, pairs])).toEqual([
      ['liking', true, false],
      ['bass', true, true],
      ['treble', false, false],
      ['width', false, false],
      ['detail', false, false],
    ])
    expect(stated[1]!.pHolm).toBeCloseTo(0.004, 12)
    expect(stated[4]).not.toHaveProperty('pHolm')
  })
  it('without a primary descriptor rests on Holm alone', () => {
    expect(statedDescriptors(withTests({ bass: 0.04 }), null)).toMatchObject([{ stated: true, pairs: true }])
  })
})
