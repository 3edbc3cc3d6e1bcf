import { Failure } from '#src/components/ui/Failure.tsx'
import { CallError } from '#src/lib/call.ts'

interface ProblemProps {
  error: unknown
  /** What is not lost: "What you typed is still here." */
  kept?: string
  onRetry?: () => void
  retrying?: boolean
}

/** A refusal or a failure in the server's own words, with the request's number. */
export function Problem({ error, kept, onRetry, retrying }: ProblemProps) {
  if (!(error instanceof CallError))
    return <Failure what="Something in this page failed." todo="Load the page again." kept={kept} />
  return (
    <Failure
      what={error.problem.title}
      todo={error.problem.detail}
      kept={kept}
      requestId={error.problem.requestId}
      onRetry={onRetry}
      retrying={retrying}
    />
  )
}
