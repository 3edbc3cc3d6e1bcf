import { CallError } from '#src/lib/call.ts'
import { Failure } from '#src/components/ui/Failure.tsx'

interface ReadFailureProps {
  error: Error
  /** What could not be read: "The verdict could not be read." */
  what: string
  onRetry: () => void
  retrying: boolean
}

/** A page's data did not come: the server's own words where there are some, and a way to try again where it helps. */
export function ReadFailure({ error, what, onRetry, retrying }: ReadFailureProps) {
  const told = error instanceof CallError ? error : null
  const final = told !== null && ['not_found', 'forbidden', 'not_signed_in'].includes(told.code)
  return (
    <Failure
      what={told?.code === 'not_found' ? told.problem.title : what}
      todo={told?.message ?? 'The answer was not in a shape that this page knows. Reload the page.'}
      requestId={told?.problem.requestId || null}
      {...(final ? {} : { onRetry, retrying })}
    />
  )
}
