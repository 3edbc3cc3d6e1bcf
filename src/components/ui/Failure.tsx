import type { ReactNode } from 'react'
import { Button } from './Button.tsx'
import { Icon } from '../Icon.tsx'

interface FailureProps {
  /** What happened: "The round could not be read." */
  what: ReactNode
  /** What is kept: "Your ratings are on this phone." */
  kept?: ReactNode
  /** What to do: "Check the network, then try again." */
  todo?: ReactNode
  /** The request's number, for asking about it. */
  requestId?: string | null
  onRetry?: () => void
  retryLabel?: string
  retrying?: boolean
}

/** Something went wrong: what, what is kept, what to do, the request's number. */
export function Failure({
  what,
  kept,
  todo,
  requestId,
  onRetry,
  retryLabel = 'Try again',
  retrying,
}: FailureProps) {
  return (
    <div className="notice" data-kind="signal" role="alert">
      <Icon name="alert" />
      <div>
        <p className="notice-title">{what}</p>
        {kept && <p>{kept}</p>}
        {todo && <p>{todo}</p>}
        {onRetry && (
          <Button kind="secondary" onClick={onRetry} busy={retrying} busyLabel="Trying again">
            {retryLabel}
          </Button>
        )}
        {requestId && <p className="note">Request {requestId}</p>}
      </div>
    </div>
  )
}
