import type { PanelistSeat } from '#shared/contracts/seats.ts'
import type { KeptServing } from './keeping/kept-serving.ts'

export type SeatScreen =
  | 'coming-up'
  | 'consent'
  | 'waiting'
  | 'enter-code'
  | 'seal'
  | 'rate'
  | 'queued'
  | 'sent'
  | 'end-questions'
  | 'thanks'
  | 'report'
  | 'closed'
  | 'left'

/**
 * The screen for what the server says and what this phone keeps. The server leads; only a submission that waits in this
 * phone's outbox is ahead of it.
 */
export function screenFor(
  seat: PanelistSeat,
  { readAbout, kept }: { readAbout: boolean; kept: KeptServing | undefined },
): SeatScreen {
  switch (seat.step) {
    case 'consent':
      return readAbout ? 'consent' : 'coming-up'
    case 'rate':
      return kept?.outbox ? 'queued' : 'rate'
    case 'seal':
      return kept?.outbox ? 'queued' : 'seal'
    case 'rest':
      return 'sent'
    case 'closed':
      return seat.can.seeReport ? 'report' : 'closed'
    default:
      return seat.step
  }
}

/** Which turn's serving is being waited for: "your first of five", "your third of five". */
export function nextServing(seat: PanelistSeat): { ordinal: number; of: number } | null {
  const of = seat.plan.servings
  const behind = Math.max(seat.serving?.ordinal ?? 0, ...seat.heard.map(({ ordinal }) => ordinal))
  return behind < of ? { ordinal: behind + 1, of } : null
}

const ordinals = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth', 'seventh', 'eighth']

/** "first", "second" … for a sentence; beyond eight "number 9". */
export const ordinalWord = (ordinal: number): string => ordinals[ordinal - 1] ?? `number ${ordinal}`
