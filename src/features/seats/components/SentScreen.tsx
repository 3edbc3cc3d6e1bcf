import { useEffect, useMemo, useState, type ReactNode } from 'react'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { numberWord } from '#src/lib/counts.ts'
import { nextServing, ordinalWord, untilWords } from '../step-screen.ts'
import { HandOverLinks } from './HandOver.tsx'
import { LeaveButton } from './LeaveButton.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

/** Ticks once a second while a time is awaited; the difference to the server's clock is taken when its answer came. */
function useRest(until: string | null, serverTime: string): string | null {
  const [now, setNow] = useState(() => Date.now())
  const ahead = useMemo(() => Date.parse(serverTime) - Date.now(), [serverTime])
  const words = until === null ? null : untilWords(Date.parse(until), now + ahead)
  const running = words !== null
  useEffect(() => {
    if (!running) return
    const timer = setInterval(() => setNow(Date.now()), 1000)
    return () => clearInterval(timer)
  }, [running])
  return words
}

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
  const rest = useRest(seat.restUntil, seat.serverTime)
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
