import type { Analysis } from './analysis-types.ts'
import { isCannot } from './cannot.ts'
import { holm } from './holm.ts'

export interface StatedDescriptor {
  readonly descriptor: string
  readonly isPrimary: boolean
  /** Unit test after Holm over the scorecard; absent for the primary one and where there is no test. */
  readonly pHolm?: number
  /** May stand as a sentence; otherwise it is read "as a hint". */
  readonly stated: boolean
  /** Pairs may be read: stated, and the descriptor's own test of units holds (p < .05). */
  readonly pairs: boolean
}

/**
 * Which descriptors a verdict may state: the primary one that the plan names, and those others whose test of units
 * survives Holm over the whole scorecard at .05. All else is a hint: ten descriptors without any difference show
 * "some difference" in 40 % of rounds.
 *
 * @param primary name of the descriptor frozen as primary, or null
 */
export function statedDescriptors(
  analysis: Pick<Analysis, 'descriptors' | 'order'>,
  primary: string | null,
): StatedDescriptor[] {
  const tests = analysis.order.descriptors.map((descriptor) => {
    const model = analysis.descriptors[descriptor]?.model
    const test = model && !isCannot(model) && !isCannot(model.unitTest) ? model.unitTest.p : undefined
    return { descriptor, p: test, isPrimary: descriptor === primary }
  })
  const family = tests.filter(({ p }) => p !== undefined)
  const adjusted = holm(family.map(({ p }) => p ?? 1))
  return tests.map(({ descriptor, p, isPrimary }) => {
    const place = family.findIndex((test) => test.descriptor === descriptor)
    const pHolm = place < 0 ? undefined : adjusted[place]
    const stated = isPrimary || (pHolm !== undefined && pHolm < 0.05)
    return {
      descriptor,
      isPrimary,
      ...(pHolm === undefined ? {} : { pHolm }),
      stated,
      pairs: stated && p !== undefined && p < 0.05,
    }
  })
}
