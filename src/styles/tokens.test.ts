import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, test } from 'vitest'

/** Contrast ratio as WCAG 2.2 defines it, from sRGB relative luminance. */
function contrast(one: string, other: string) {
  const luminance = (hex: string) => {
    const [r = 0, g = 0, b = 0] = [1, 3, 5]
      .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
      .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4))
    return 0.2126 * r + 0.7152 * g + 0.0722 * b
  }
  const [light = 0, dark = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a)
  return (light + 0.05) / (dark + 0.05)
}

const css = readFileSync(join(import.meta.dirname, 'theme.css'), 'utf8')
const table = (part: string) =>
  new Map([...part.matchAll(/--color-([a-z-]+): (#[0-9a-f]{6})/g)].map((hit) => [hit[1] ?? '', hit[2] ?? '']))
const at = css.indexOf('@variant dusk {')
const schemes = { light: table(css.slice(0, at)), dusk: table(css.slice(at)) }

test('black on white has a contrast of 21 to 1', () => {
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 5)
})

test('dusk says every colour that light says', () => {
  expect([...schemes.dusk.keys()]).toEqual([...schemes.light.keys()])
  expect(schemes.light.size).toBe(17)
})

describe.each(Object.entries(schemes))('in %s', (_, colours) => {
  const of = (name: string) => {
    const hex = colours.get(name)
    if (!hex) throw new RangeError(`no colour ${name}`)
    return hex
  }

  test.each(['ink', 'muted', 'ochre', 'sea', 'plum', 'signal', 'done'])(
    '%s can be read on paper and in a well: at least 4.5 to 1',
    (name) => {
      for (const ground of ['paper', 'well'])
        expect(contrast(of(name), of(ground))).toBeGreaterThanOrEqual(4.5)
    },
  )

  test.each(['ochre', 'sea', 'plum'])('%s can be read on its own wash', (name) => {
    expect(contrast(of(name), of(`${name}-wash`))).toBeGreaterThanOrEqual(4.5)
  })

  test('ink can be read on cloth, and paper on ink and on signal', () => {
    expect(contrast(of('ink'), of('cloth'))).toBeGreaterThanOrEqual(4.5)
    expect(contrast(of('paper'), of('ink'))).toBeGreaterThanOrEqual(4.5)
    expect(contrast(of('paper'), of('signal'))).toBeGreaterThanOrEqual(4.5)
  })

  test('the edges of controls stand out from what they lie on: at least 3 to 1', () => {
    for (const ground of ['paper', 'well']) expect(contrast(of('edge'), of(ground))).toBeGreaterThanOrEqual(3)
  })
})
