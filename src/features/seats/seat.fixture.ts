import type { Descriptor } from '#shared/contracts/scorecard.ts'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { lexiconEntry, liking, shortScorecard, type LexiconEntry } from '#shared/domain/lexicon.ts'

const scale = { low: 0, high: 100, step: 1 }

/** A lexicon entry as a scorecard's line. */
export const lineOf = ({
  key,
  name,
  family,
  sentence,
  sided,
  low,
  middle,
  high,
}: LexiconEntry): Descriptor => ({
  key,
  name,
  family,
  sentence,
  sided,
  scale,
  words: { low, middle, high },
})

/** The lines with these keys, overall liking first. */
export const scorecardOf = (keys: readonly string[]): Descriptor[] =>
  [liking, ...keys.map((key) => lexiconEntry(key)).filter((entry) => entry !== undefined)].map(lineOf)

export const seatId = '6f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b'
export const otherSeatId = '7f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b'
export const servingId = '8f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b'

/** A seat that has agreed and waits for the first turn; `part` overrides. */
export const seatFixture = (part: Partial<PanelistSeat> = {}): PanelistSeat => ({
  id: seatId,
  label: 'Seat 3',
  round: {
    id: '9f2b1a2e-3c4d-4e5f-8a9b-0c1d2e3f4a5b',
    title: 'Autumn evening',
    question: 'Which of these would you keep listening to?',
    panelName: 'The Quayside Bench',
    status: 'open',
  },
  plan: { servings: 4, turns: 4, minutesPerTurn: 7, minutes: 40 },
  scorecard: scorecardOf(shortScorecard),
  tracks: ['Harbour at Six, the second verse'],
  blinding: 'double',
  publishesRows: true,
  consented: true,
  left: false,
  turn: 1,
  step: 'waiting',
  serving: null,
  heard: [],
  restUntil: null,
  serverTime: '2026-03-12T19:00:00Z',
  otherSeats: [],
  can: { seeReport: false },
  ...part,
})

/** The serving in hand; its code is known once it was typed. */
export const servingFixture = (
  part: Partial<NonNullable<PanelistSeat['serving']>> = {},
): NonNullable<PanelistSeat['serving']> => ({
  id: servingId,
  ordinal: 1,
  of: 4,
  turn: 1,
  state: 'confirmed',
  code: '417',
  sealChecked: true,
  ...part,
})
