import { Failure } from '#src/components/ui/Failure.tsx'
import { CallError } from '#src/lib/call.ts'

interface CallFailureProps {
  error: unknown
  /** What did not happen: "The code was not taken." */
  what: string
  kept?: string
  onRetry?: () => void
}

/** A request that failed: what did not happen, what is kept, the server's own words on what to do. */
export function CallFailure({ error, what, kept, onRetry }: CallFailureProps) {
  const told = error instanceof CallError ? error : null
  return (
    <div className="mt-4">
      <Failure
        what={what}
        kept={kept}
        todo={told?.message ?? 'Try again in a moment.'}
        requestId={told?.problem.requestId || null}
        onRetry={onRetry}
      />
    </div>
  )
}
