import { afterEach, beforeEach, expect, it, vi } from 'vitest'
import { follow } from './follow.ts'

class FakeSource {
  static readonly CLOSED = 2
  static made: FakeSource[] = []
  readyState = 0
  onopen: (() => void) | null = null
  onmessage: (() => void) | null = null
  onerror: (() => void) | null = null
  readonly address: string
  closed = false
  constructor(address: string) {
    this.address = address
    FakeSource.made.push(this)
  }
  addEventListener() {}
  close() {
    this.closed = true
  }
}

const newest = () => FakeSource.made.at(-1)!

beforeEach(() => {
  FakeSource.made = []
  vi.useFakeTimers()
  vi.stubGlobal('EventSource', FakeSource)
})
afterEach(() => {
  vi.useRealTimers()
  vi.unstubAllGlobals()
})

it('tells of each event, and of what was missed once the stream is back', () => {
  const changed = vi.fn()
  const connected = vi.fn()
  const stop = follow('/api/events', { changed, connected })
  newest().onopen?.()
  newest().onmessage?.()
  expect(changed).toHaveBeenCalledTimes(2)
  expect(connected).toHaveBeenLastCalledWith(true)
  newest().onerror?.()
  expect(connected).toHaveBeenLastCalledWith(false)
  stop()
  expect(newest().closed).toBe(true)
})

it('opens a stream anew that the server had refused, and none after it was stopped', () => {
  const stop = follow('/api/events', { changed: vi.fn(), connected: vi.fn() })
  newest().readyState = FakeSource.CLOSED
  newest().onerror?.()
  vi.advanceTimersByTime(15_000)
  expect(FakeSource.made).toHaveLength(2)
  newest().readyState = FakeSource.CLOSED
  newest().onerror?.()
  stop()
  vi.advanceTimersByTime(60_000)
  expect(FakeSource.made).toHaveLength(2)
})

it('says that nothing is followed where the browser has no events', () => {
  vi.stubGlobal('EventSource', undefined)
  const connected = vi.fn()
  follow('/api/events', { changed: vi.fn(), connected })()
  expect(connected).toHaveBeenCalledWith(false)
})
