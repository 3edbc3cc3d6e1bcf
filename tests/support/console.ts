import { format } from 'node:util'
import { afterEach, beforeEach, expect, vi } from 'vitest'

const unexpected: string[] = []
let expected: RegExp[] = []

/** Lets the running test write console errors that match; all others fail it. */
export function allowConsoleErrors(...patterns: RegExp[]): void {
  expected.push(...patterns)
}

/** From here on a console error that a test did not expect fails it. */
export function failOnConsoleErrors(): void {
  beforeEach(() => {
    vi.spyOn(console, 'error').mockImplementation((...args: unknown[]) => {
      const line = format(...args)
      if (!expected.some((pattern) => pattern.test(line))) unexpected.push(line)
    })
  })
  afterEach(() => {
    const said = unexpected.splice(0)
    expected = []
    expect(said, 'console errors that the test did not expect').toEqual([])
  })
}
