import type { ReactNode } from 'react'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { Code } from '#src/components/Code.tsx'
import { SeatLayout } from '#src/components/layout/SeatLayout.tsx'
import { Steps } from '#src/components/ui/Steps.tsx'

interface SeatFrameProps {
  seat: PanelistSeat
  children: ReactNode
  kept?: ReactNode
  verb?: ReactNode
  /** How much of the serving in hand is done, 0 to 1. */
  within?: number
}

/** A seat's screen: the code once it has been typed, where one is in the evening, the verb under the thumb. */
export function SeatFrame({ seat, children, kept, verb, within = 0 }: SeatFrameProps) {
  const { serving, round } = seat
  const started = serving !== null
  const current = started ? serving.ordinal + (serving.state === 'submitted' ? 1 : 0) : 1
  return (
    <SeatLayout
      code={serving?.code ? <Code code={serving.code} label="Code" /> : undefined}
      where={
        <>
          {started ? (
            <div className="font-semibold">
              {serving.ordinal > serving.of
                ? `Serving ${serving.ordinal}`
                : `Serving ${serving.ordinal} of ${serving.of}`}
            </div>
          ) : (
            <div className="font-semibold">{seat.label}</div>
          )}
          <div className="note">{started ? `${seat.label} · ${round.title}` : round.title}</div>
          {started && <Steps noun="Serving" current={current} total={serving.of} within={within} silent />}
        </>
      }
      kept={kept}
      verb={verb}
    >
      {children}
    </SeatLayout>
  )
}
