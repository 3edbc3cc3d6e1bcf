import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { canonicalJson } from './canonical-json.ts'
import type { Json } from './types.ts'

describe('the canonical text of a file', () => {
  // RFC 8785, sections 3.2.2.2 and 3.2.3, examples written down from memory.
  test('sorts keys by UTF-16 code units as RFC 8785 shows', () => {
    const value = {
      '\u20ac': 'Euro Sign',
      '\r': 'Carriage Return',
      '\ufb33': 'Hebrew Letter Dalet With Dagesh',
      '1': 'One',
      '\ud83d\ude00': 'Emoji: Grinning Face',
      '\u0080': 'Control',
      '\u00f6': 'Latin Small Letter O With Diaeresis',
    }
    expect(canonicalJson(value)).toBe(
      '{"\\r":"Carriage Return","1":"One","\u0080":"Control","\u00f6":"Latin Small Letter O With Diaeresis",' +
        '"\u20ac":"Euro Sign","\ud83d\ude00":"Emoji: Grinning Face","\ufb33":"Hebrew Letter Dalet With Dagesh"}',
    )
  })

  test('escapes what RFC 8785 escapes and nothing else', () => {
    expect(canonicalJson('\u20ac$\u000F\u000aA\'\u0042\u0022\u005c\\"/')).toBe(
      '"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"',
    )
    expect(canonicalJson({ literals: [null, true, false] })).toBe('{"literals":[null,true,false]}')
  })

  test('writes whole numbers, also zero with a sign and the largest', () => {
    expect(canonicalJson([0, -0, -7, 2 ** 53 - 1, 1 - 2 ** 53])).toBe(
      '[0,0,-7,9007199254740991,-9007199254740991]',
    )
  })

  test('refuses what has no single text', () => {
    const refused: unknown[] = [
      0.5,
      2 ** 53,
      NaN,
      Infinity,
      undefined,
      1n,
      '\ud800',
      'a\udc00b',
      '\udc00\ud800',
      Symbol('s'),
      () => 1,
      [1, undefined],
      new Array(2),
      { a: undefined },
      { '\ud800': 1 },
      new Date(0),
      new Map(),
    ]
    for (const value of refused) expect(() => canonicalJson(value as Json)).toThrow(TypeError)
  })

  test('does not depend on the order in which keys were set, and reads back as it was', () => {
    const leaf = fc.oneof(
      fc.string({ unit: 'grapheme' }),
      fc.maxSafeInteger(),
      fc.boolean(),
      fc.constant(null),
    )
    const { tree } = fc.letrec<{ tree: Json }>((tie) => ({
      tree: fc.oneof(
        { maxDepth: 3 },
        leaf,
        fc.array(tie('tree'), { maxLength: 4 }),
        fc.dictionary(fc.string(), tie('tree'), { maxKeys: 5, noNullPrototype: true }),
      ),
    }))
    const reversed = (value: Json): Json => {
      if (Array.isArray(value)) return value.map(reversed)
      if (typeof value !== 'object' || value === null) return value
      return Object.fromEntries(
        Object.entries(value)
          .reverse()
          .map(([key, item]) => [key, reversed(item as Json)]),
      )
    }
    fc.assert(
      fc.property(tree, (value) => {
        const text = canonicalJson(value)
        expect(canonicalJson(reversed(value))).toBe(text)
        expect(canonicalJson(JSON.parse(text) as Json)).toBe(text)
        expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(value)))
      }),
    )
  })
})
