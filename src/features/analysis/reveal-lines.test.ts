import { describe, expect, it } from 'vitest'
import { threadPath, xOf, yOf } from './reveal-lines.ts'

const stage = { width: 228, rowHeight: 100, scale: { low: 0, high: 100 } }

describe('threads of the reveal', () => {
  it('stand at the ends of the scale within the picture', () => {
    expect(xOf(0, stage)).toBe(14)
    expect(xOf(100, stage)).toBe(214)
    expect(xOf(45, { ...stage, scale: { low: 40, high: 50 } })).toBe(114)
  })

  it('run only through units that are out from under the cloth', () => {
    const two = threadPath([0, 100, 50], 2, stage)
    expect(two.startsWith(`M14,${yOf(0, stage)}`)).toBe(true)
    expect(two.endsWith(`214,${yOf(1, stage)}`)).toBe(true)
    expect(threadPath([0, 100, 50], 0, stage)).toBe('')
  })

  it('break where a listener could not tell', () => {
    expect(threadPath([10, null, 50], 3, stage).match(/M/g)).toHaveLength(2)
  })
})
