import { expect, it } from 'vitest'
import { kept } from './kept.ts'

it('keeps what was written over a reload, until it is forgotten', () => {
  kept<{ n: number }>('try').write({ n: 3 })
  expect(kept<{ n: number }>('try').read()).toEqual({ n: 3 })
  kept('try').forget()
  expect(kept('try').read()).toBeUndefined()
})

it('breaks nothing where the browser refuses storage or holds nonsense', () => {
  const refusing = kept<number>('try', () => {
    throw new DOMException('denied')
  })
  refusing.write(1)
  expect(refusing.read()).toBeUndefined()
  window.sessionStorage.setItem('scrim.odd', '{')
  expect(kept('odd').read()).toBeUndefined()
})
