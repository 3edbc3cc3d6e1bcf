/** A clock that stands until a test moves it. */
export interface TestClock {
  now(): Date
  /** Moves it on by so many seconds. */
  advance(seconds: number): void
  set(instant: string): void
}

/** @param start when it stands at first, ISO 8601 */
export function standingClock(start = '2031-03-14T19:30:00Z'): TestClock {
  let time = Date.parse(start)
  return {
    now: () => new Date(time),
    advance: (seconds) => void (time += seconds * 1000),
    set: (instant) => void (time = Date.parse(instant)),
  }
}
