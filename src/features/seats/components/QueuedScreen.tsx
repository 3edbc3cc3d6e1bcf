import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import type { Keeping, KeepingState } from '../keeping/keeping.ts'
import type { KeptServing } from '../keeping/kept-serving.ts'
import { keptWords } from '../kept-words.ts'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

interface QueuedScreenProps {
  seat: PanelistSeat
  keeping: Keeping
  state: KeepingState
  kept: KeptServing
}

/** Submitted on this phone, not yet with the server. It goes by itself when the network is back. */
export function QueuedScreen({ seat, keeping, state, kept }: QueuedScreenProps) {
  const refused = kept.outbox?.state === 'refused'
  return (
    <SeatFrame
      seat={seat}
      kept={keptWords(state, kept)}
      verb={
        <Button
          onClick={() => void (refused ? keeping.retry(kept.id) : keeping.flush())}
          busy={state.sending}
          busyLabel="Sending"
        >
          Send now
        </Button>
      }
    >
      <ScreenTitle>{refused ? 'The server did not take this serving' : 'Locked, and on its way'}</ScreenTitle>
      {refused ? (
        <div className="mt-4">
          <Notice kind="signal" title={kept.outbox?.words} live>
            Your answers are kept on this phone. Show this to the steward if sending again does not help.
          </Notice>
        </div>
      ) : (
        <p className="lead mt-3">
          Your answers are {state.durable ? 'saved on this phone' : 'held by this page'} and go to the server
          as soon as it can be reached. You may rest meanwhile
          {state.durable ? '' : '; do not close this page'}.
        </p>
      )}
    </SeatFrame>
  )
}
