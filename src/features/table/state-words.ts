import type { StewardTable } from '#shared/contracts/table.ts'
import { untilWords } from '#src/lib/until-words.ts'

export type TableSeat = StewardTable['seats'][number]

export interface SeatState {
  words: string
  /** signal needs the steward, done is over for this turn, open is under way, quiet needs nobody. */
  kind: 'signal' | 'done' | 'open' | 'quiet'
}

const quiet = (words: string): SeatState => ({ words, kind: 'quiet' })
const open = (words: string): SeatState => ({ words, kind: 'open' })
const signal = (words: string): SeatState => ({ words, kind: 'signal' })
const done = (words: string): SeatState => ({ words, kind: 'done' })

const wrongTimes = (times: number): string =>
  times === 1 ? 'typed a wrong code' : `typed a wrong code ${times} times`

function servingState(serving: NonNullable<TableSeat['serving']>, now: number): SeatState {
  switch (serving.state) {
    case 'waiting':
      return quiet('pouch not tagged yet')
    case 'tagged':
      return open('pouch is ready')
    case 'handed':
      return serving.wrongCodes > 0
        ? signal(`${wrongTimes(serving.wrongCodes)}: check the pouch`)
        : open('hand over, digits not typed yet')
    case 'confirmed':
      if (serving.seal === 'no') return signal('no seal: help, or set it aside')
      return open(serving.seal === null ? 'has the pouch, seal check' : 'listening and rating')
    case 'submitted': {
      const rest = serving.restUntil === null ? null : untilWords(Date.parse(serving.restUntil), now)
      return done(rest === null ? 'sent' : `sent, rests ${rest}`)
    }
    case 'void':
      return quiet('set aside')
    case 'missed':
      return quiet('missed')
  }
}

/** What one seat is doing, in the steward's words. `now` is the server's time in milliseconds. */
export function seatState(seat: TableSeat, sitting: StewardTable['sitting'], now: number): SeatState {
  if (seat.left) return quiet('has left')
  if (!seat.joined) return signal('has not opened the seat yet')
  if (sitting.ended) return seat.endAnswered ? done('all answered') : open('at the end questions')
  if (sitting.turn === 0) return quiet('here')
  if (seat.resting || seat.serving === null) return quiet('rests this turn')
  return servingState(seat.serving, now)
}

/** What is done at a seat in this turn, as ticks: the code was read back, the seal was found. */
export function ticksOf({ serving }: TableSeat): string[] {
  if (!serving || (serving.state !== 'confirmed' && serving.state !== 'submitted')) return []
  return serving.seal === 'yes' || serving.seal === 'unsure'
    ? ['code read back', serving.seal === 'yes' ? 'seal' : 'seal unsure']
    : ['code read back']
}

/** The serving of a seat that may still be set aside: handed over or in hand, not yet sent. */
export const mayVoid = (seat: TableSeat): boolean =>
  seat.serving !== null && (seat.serving.state === 'handed' || seat.serving.state === 'confirmed')

/** The verb that moves the table on. */
export function turnVerb({ turn, turns }: Pick<StewardTable['sitting'], 'turn' | 'turns'>): string {
  if (turn === 0) return 'Start turn 1'
  return turn < turns ? `Next turn: ${turn + 1} of ${turns}` : 'End the listening'
}
