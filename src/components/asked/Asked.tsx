import type { UseQueryResult } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { Waiting } from '#src/components/ui/Waiting.tsx'
import { CallError } from '#src/lib/call.ts'
import { Problem } from './Problem.tsx'

interface AskedProps<T> {
  query: UseQueryResult<T>
  /** What is read, for a screen reader: "Reading the rounds". */
  waiting: string
  children: (data: T) => ReactNode
}

const isRefusal = (error: unknown): boolean => error instanceof CallError && error.problem.status < 500

/**
 * What was asked for, while it is awaited, when it is there, and when it could not be had. A refusal (not signed in, not
 * found) goes to the page's error boundary; an unreachable server keeps what is known and offers to try again.
 */
export function Asked<T>({ query, waiting, children }: AskedProps<T>) {
  if (query.data !== undefined)
    return (
      <>
        {query.error && !isRefusal(query.error) && (
          <Problem
            error={query.error}
            kept="What you see is from before."
            onRetry={() => void query.refetch()}
            retrying={query.isFetching}
          />
        )}
        {children(query.data)}
      </>
    )
  if (query.error) {
    if (isRefusal(query.error)) throw query.error
    return <Problem error={query.error} onRetry={() => void query.refetch()} retrying={query.isFetching} />
  }
  return <Waiting label={waiting} />
}
