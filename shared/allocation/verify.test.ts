import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { canonicalJson } from './canonical-json.ts'
import { fingerprint } from './key-files.ts'
import { files } from './round-fixture.ts'
import { readKey, readPlan } from './shapes.ts'
import type { CodePolicy, Json, KeyDocument, PlanDocument } from './types.ts'
import { repeatDraw, verifyFiles } from './verify.ts'

const failed = (checks: { name: string; ok: boolean }[]) =>
  checks.filter((one) => !one.ok).map((one) => one.name)
const SAME_DRAW = 'The published seed gives the same draw'

/** The files after a change to the key, with a fingerprint that fits the changed text. */
function forged(change: (key: KeyDocument) => void, codePolicy: CodePolicy = 'per-seat') {
  const { input } = files(codePolicy)
  const key = JSON.parse(input.keyText) as KeyDocument
  change(key)
  const keyText = canonicalJson(key as unknown as Json)
  return verifyFiles({
    ...input,
    keyText,
    fingerprints: { ...input.fingerprints, key: fingerprint(keyText) },
  })
}

describe('the check in the reader’s browser', () => {
  test.each(['per-seat', 'split'] as const)('finds everything in order in a %s round', (codePolicy) => {
    const { drawn, input } = files(codePolicy)
    const ratedRows = drawn.rows.flatMap((row) =>
      row.places.flatMap(({ codes }) => [
        { listener: row.listener, code: codes.served },
        { listener: row.takeoverListener, code: codes.takeover },
        { listener: row.listener, code: codes.reserve },
        { listener: row.takeoverListener, code: codes.reserve },
      ]),
    )
    const checks = verifyFiles({ ...input, ratedRows })
    expect(failed(checks)).toEqual([])
    expect(checks).toHaveLength(9)
    expect(failed(repeatDraw(input.keyText, input.planText))).toEqual([])
    expect(repeatDraw(input.keyText, input.planText)).toHaveLength(4)
  })

  test('fails on one changed bit of any file', () => {
    const { input } = files()
    const which = fc.constantFrom('planText' as const, 'keyText' as const, 'ratingsText' as const)
    fc.assert(
      fc.property(which, fc.nat(), fc.integer({ min: 0, max: 6 }), (file, position, bit) => {
        const bytes = Buffer.from(input[file], 'utf8')
        bytes[position % bytes.length]! ^= 1 << bit
        const checks = verifyFiles({ ...input, [file]: bytes.toString('utf8') })
        expect(failed(checks)).toContain(`The ${file.slice(0, -4)} file has the published fingerprint`)
      }),
      { numRuns: 150 },
    )
  })

  test('fails on a changed serving, unit, turn or position even when the fingerprint was made to fit', () => {
    expect(failed(forged(() => undefined))).toEqual([])
    const [first, second] = [0, 1] as const
    const swaps: ((key: KeyDocument) => void)[] = [
      (key) => {
        const places = key.rows[0]!.places
        const unit = places[first]!.unit
        places[first]!.unit = places[second]!.unit
        places[second]!.unit = unit
      },
      (key) => void (key.rows[3]!.places[first]!.code = 985),
      (key) => void (key.rows[4]!.places[first]!.turn += 1),
      (key) => void (key.rows[5]!.places[first]!.position = 3),
      (key) => void key.rows.pop(),
      (key) => void (key.seed = `3${key.seed.slice(1)}`),
      (key) => void (key.draw.attempt = 1),
      (key) => void key.units.reverse(),
    ]
    for (const change of swaps) expect(failed(forged(change))).toContain(SAME_DRAW)
  })

  test('fails on letters that the seed does not give', () => {
    const swap = (key: KeyDocument) => {
      const [a, b] = key.letters!
      ;[a!.unit, b!.unit] = [b!.unit, a!.unit]
    }
    expect(failed(forged(swap, 'split'))).toEqual([SAME_DRAW])
  })

  test('fails on a plan that is not the one the key was drawn for', () => {
    const { input } = files()
    const change = (of: (plan: PlanDocument) => void) => {
      const plan = JSON.parse(input.planText) as PlanDocument
      of(plan)
      plan.planDigest = fingerprint(canonicalJson(plan.plan))
      const planText = canonicalJson(plan as unknown as Json)
      return verifyFiles({
        ...input,
        planText,
        fingerprints: { ...input.fingerprints, plan: fingerprint(planText) },
      })
    }
    expect(failed(change((plan) => void (plan.plan.primaryDescriptor = 'bass amount')))).toEqual([
      'The key belongs to the plan',
    ])
    expect(failed(change((plan) => void (plan.plan.design.listeners = 6)))).toEqual([
      'The key belongs to the plan',
      'The draw follows the frozen plan',
    ])
    expect(failed(change((plan) => void (plan.round = 'round-8')))).toEqual(['The key belongs to the plan'])
  })

  test('names a rating whose code the listener did not have', () => {
    const { drawn, input } = files()
    const code = drawn.rows[0]!.places[0]!.codes.served
    const checks = verifyFiles({
      ...input,
      ratedRows: [
        { listener: 1, code },
        { listener: 2, code },
      ],
    })
    expect(failed(checks)).toEqual(['Every rating’s code is in the key'])
    expect(checks.at(-1)!.detail).toContain(`listener 2, code ${code}`)
  })

  test('does without a ratings file where the organiser publishes no rows', () => {
    const { input } = files()
    const checks = verifyFiles({
      ...input,
      ratingsText: null,
      fingerprints: { ...input.fingerprints, ratings: null },
    })
    expect(failed(checks)).toEqual([])
    expect(checks).toHaveLength(7)
    const unpublished = verifyFiles({ ...input, fingerprints: { ...input.fingerprints, ratings: null } })
    expect(failed(unpublished)).toEqual(['The ratings file has the published fingerprint'])
  })

  test('says what is wrong with a text that is no such file, and never breaks', () => {
    const { input } = files()
    const key = JSON.parse(input.keyText) as Record<string, unknown>
    const wrong = [
      '',
      'null',
      '[]',
      '{"scheme":"scrim-key-1"}',
      ` ${input.keyText}`,
      canonicalJson({ ...key, more: 1 } as Json),
      canonicalJson({ ...key, seed: 'AB' } as Json),
      canonicalJson({
        ...key,
        rows: [{ listener: 1, set: 'served', places: [{ position: 1, turn: 1, code: 123, unit: 'u1' }] }],
      } as Json),
      canonicalJson({ ...key, units: [] } as Json),
      JSON.stringify({ ...key, draw: { ...(key.draw as object), listeners: 5.5 } }),
    ]
    for (const keyText of wrong) expect(failed(verifyFiles({ ...input, keyText })).length).toBeGreaterThan(1)
    expect(() => readPlan('{}')).toThrow('plan.scheme is missing')
    expect(() => readKey('{')).toThrow('key is not JSON')
    expect(failed(repeatDraw('{}', input.planText))).toEqual(['The key file can be read'])
  })
})
