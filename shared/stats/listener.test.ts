import { describe, expect, it } from 'vitest'
import { discrimination } from './listener-discrimination.ts'
import { listenerAgreement } from './listener-agreement.ts'

/** Constructed panel: P1 good, P2 compressed, P3 unrepeatable, P4 reversed; two servings of five units each. */
const panel = {
  P1: [
    [20, 24],
    [35, 31],
    [50, 54],
    [62, 66],
    [80, 78],
  ],
  P2: [
    [40, 44],
    [46, 50],
    [52, 54],
    [58, 60],
    [64, 62],
  ],
  P3: [
    [30, 60],
    [20, 70],
    [55, 35],
    [75, 40],
    [60, 85],
  ],
  P4: [
    [70, 66],
    [60, 64],
    [52, 50],
    [41, 45],
    [30, 28],
  ],
}
type Name = keyof typeof panel
const meansOf = (name: Name): number[] => panel[name].map(([a = 0, b = 0]) => (a + b) / 2)
const othersOf = (name: Name): number[] => {
  const rest = (Object.keys(panel) as Name[]).filter((other) => other !== name).map(meansOf)
  return rest[0]!.map((_, unit) => rest.reduce((total, means) => total + means[unit]!, 0) / rest.length)
}

describe('one listener', () => {
  it.each([
    // F(4, 5), p, mean square of repeats, leave-one-out r, bias, slope: recomputed in R.
    ['P1', 155.441176, 0.0000198, 6.8, 0.614137, -2.2, 7.326103],
    ['P2', 32.045455, 0.00093, 4.4, 0.964434, 1.8, 1.296362],
    ['P3', 0.524336, 0.724318, 565, 0.806558, 1.8, 1.825295],
    ['P4', 85.464286, 0.0000864, 5.6, -0.997213, -1.4, -1.093268],
  ] as const)('%s of the constructed panel', (name, f, p, repeatability, agreement, bias, slope) => {
    const own = discrimination(panel[name])
    expect(own.f).toBeCloseTo(f, 5)
    expect(own.p).toBeCloseTo(p, 6)
    expect(own.repeatability).toBeCloseTo(repeatability, 10)
    const compared = listenerAgreement(meansOf(name), othersOf(name), 3)
    expect(compared.agreement).toBeCloseTo(agreement, 5)
    expect(compared.bias).toBeCloseTo(bias, 10)
    expect(compared.slope).toBeCloseTo(slope, 5)
  })

  it('takes partial repeats as they are: Σ over units, N − I error df', () => {
    const found = discrimination([[10, 14], [20], [30, 34, 38]])
    expect([found.df1, found.df2]).toEqual([2, 3])
    expect(found.repeatability).toBeCloseTo((8 + 32) / 3, 12)
  })

  it('gives no F under the wanted error df, but still says how closely he repeats himself', () => {
    expect(discrimination([[10, 14], [20, 22], [30]], 6)).toMatchObject({
      f: { ok: false, reason: 'too-few-repeats' },
      repeatability: 5,
    })
    expect(discrimination([[10], [20]])).toMatchObject({ repeatability: { ok: false, reason: 'no-repeats' } })
    expect(discrimination([])).toMatchObject({ f: { ok: false, reason: 'no-ratings' } })
    expect(
      discrimination([
        [10, 10],
        [20, 20],
      ]),
    ).toMatchObject({ f: { reason: 'no-variation-left' }, repeatability: 0 })
  })

  it('who gives one rating throughout has repeatability 0, slope 0, a bias, and neither F nor r', () => {
    expect(
      discrimination([
        [50, 50],
        [50, 50],
        [50, 50],
      ]),
    ).toMatchObject({
      f: { reason: 'constant-listener' },
      repeatability: 0,
    })
    expect(listenerAgreement([50, 50, 50], [40, 50, 66], 3)).toEqual({
      agreement: { ok: false, reason: 'constant-listener' },
      slope: 0,
      bias: -2,
    })
  })

  it('cannot be compared with others who do not differ, or on too few units; the bias stands', () => {
    expect(listenerAgreement([1, 2, 3], [5, 5, 5], 3)).toMatchObject({
      slope: { reason: 'others-do-not-differ' },
      bias: -3,
    })
    expect(listenerAgreement([1, 2, 3], [5, 6, 8], 4)).toMatchObject({
      agreement: { reason: 'fewer-than-four-units' },
    })
    expect(listenerAgreement([], [], 3)).toMatchObject({ bias: { reason: 'no-ratings-by-this-listener' } })
    expect(() => listenerAgreement([1], [], 3)).toThrow(RangeError)
  })
})
