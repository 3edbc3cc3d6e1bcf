import type { StewardTable } from '#shared/contracts/table.ts'
import type { TableSeat } from './state-words.ts'

export const tableAt = {
  panel: 'quayside-bench',
  round: '9f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b',
  sitting: '5f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b',
}

export const seatIdOf = (number: number): string => `6f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a${50 + number}`

/** A serving in a seat's hands; `part` overrides. */
export const tableServing = (
  part: Partial<NonNullable<TableSeat['serving']>> = {},
): NonNullable<TableSeat['serving']> => ({
  id: '8f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b',
  code: '417',
  state: 'confirmed',
  version: 3,
  wrongCodes: 0,
  seal: 'yes',
  restUntil: null,
  ...part,
})

export const tableSeat = (number: number, part: Partial<TableSeat> = {}): TableSeat => ({
  id: seatIdOf(number),
  label: `Seat ${number}`,
  number,
  joined: true,
  left: false,
  serving: tableServing({
    id: `8f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a${50 + number}`,
    code: String(416 + number),
  }),
  resting: false,
  endAnswered: false,
  ...part,
})

/** A table of three in its second turn of four. */
export const tableFixture = (part: Partial<StewardTable> = {}): StewardTable => ({
  round: { id: tableAt.round, title: 'Autumn evening', status: 'open', blinding: 'double' },
  sitting: {
    id: tableAt.sitting,
    name: 'Marrow Sound, Tuesday',
    turn: 2,
    turns: 4,
    version: 5,
    ended: false,
  },
  seats: [tableSeat(1), tableSeat(2), tableSeat(3)],
  notSent: ['Seat 1', 'Seat 2', 'Seat 3'],
  spareRows: 1,
  serverTime: '2026-03-12T19:00:00Z',
  youListen: false,
  can: { nextTurn: true, addListener: true, end: true },
  ...part,
})
