import type { ReactNode } from 'react'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { useServerClock } from '#src/hooks/useServerClock.ts'
import { numberWord } from '#src/lib/counts.ts'
import { untilWords } from '#src/lib/until-words.ts'
import { nextServing, ordinalWord } from '../step-screen.ts'
import { HandOverLinks } from './HandOver.tsx'
import { LeaveButton } from './LeaveButton.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

/** The serving is with the server: rest, then the others, then the next one. */
export function SentScreen({
  seat,
  notices,
  kept,
}: {
  seat: PanelistSeat
  notices: ReactNode
  kept: ReactNode
}) {
  const now = useServerClock(seat.serverTime, seat.restUntil !== null)
  const rest = seat.restUntil === null ? null : untilWords(Date.parse(seat.restUntil), now)
  const next = nextServing(seat)
  return (
    <SeatFrame seat={seat} kept={kept}>
      {notices}
      <ScreenTitle>Sent. Rest your ears</ScreenTitle>
      {rest !== null ? (
        <p className="mt-4">
          <span className="text-40 font-semibold" role="timer" aria-label={`Rest, ${rest} left`}>
            {rest}
          </span>
          <span className="block text-muted">
            Take the earphones out and back into the pouch. No music meanwhile.
          </span>
        </p>
      ) : (
        <p className="lead mt-3">
          Take the earphones out and back into the pouch. The others may still be at it.
        </p>
      )}
      <p className="mt-4">
        {next
          ? `Next: your ${ordinalWord(next.ordinal)} of ${numberWord(next.of)}. This screen changes by itself.`
          : 'That was your last serving. A few questions follow when the table is through.'}
      </p>
      <HandOverLinks seat={seat} />
      <div className="mt-6">
        <LeaveButton seat={seat} />
      </div>
    </SeatFrame>
  )
}
