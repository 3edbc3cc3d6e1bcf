import { SeatLayout } from '#src/components/layout/SeatLayout.tsx'
import { Failure } from '#src/components/ui/Failure.tsx'
import { CallError } from '#src/lib/call.ts'
import { ScreenTitle } from './ScreenTitle.tsx'

const refused: readonly string[] = ['not_signed_in', 'forbidden', 'not_found', 'malformed', 'invalid']

interface SeatAwayProps {
  error: unknown
  /** Whether this phone keeps ratings that were not sent. */
  keeps: boolean
  onRetry: () => void
  retrying: boolean
}

/** The seat could not be read: it is not open on this phone, or the server is away. */
export function SeatAway({ error, keeps, onRetry, retrying }: SeatAwayProps) {
  const told = error instanceof CallError ? error : null
  const gone = told !== null && refused.includes(told.code)
  const kept = keeps ? 'What you rated is kept on this phone.' : undefined
  return (
    <SeatLayout>
      <ScreenTitle>{gone ? 'This seat is not open on this phone' : 'Scrim could not be reached'}</ScreenTitle>
      <div className="mt-4">
        {gone ? (
          <Failure
            what="The seat’s link opens it."
            todo="Scan the code on your card again, or ask the steward for your seat’s link. It may have been opened on another phone since."
            kept={kept}
            requestId={told.problem.requestId || null}
          />
        ) : (
          <Failure
            what="The seat could not be read."
            todo={told?.message ?? 'Try again in a moment.'}
            kept={kept}
            requestId={told?.problem.requestId || null}
            onRetry={onRetry}
            retrying={retrying}
          />
        )}
      </div>
    </SeatLayout>
  )
}
