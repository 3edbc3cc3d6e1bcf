import { expect, it } from 'vitest'
import { createSameKey } from './same-key.ts'

it('keeps the key while the same thing is sent again, and changes it with what is sent', () => {
  let made = 0
  const keyFor = createSameKey(() => `key ${++made}`)
  expect(keyFor({ title: 'a' })).toBe('key 1')
  expect(keyFor({ title: 'a' })).toBe('key 1')
  expect(keyFor({ title: 'b' })).toBe('key 2')
})
