import { QueryClient } from '@tanstack/react-query'
import { CallError } from './call.ts'

const mostRetries = 2

/** A refusal stays a refusal: only an unreachable or failing server is asked again, twice. */
export const mayRetry = (failures: number, error: unknown): boolean => {
  if (failures >= mostRetries) return false
  return error instanceof CallError ? error.problem.status >= 500 : false
}

/** Answers count as fresh for five seconds; writes are never repeated by themselves. */
export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: { retry: mayRetry, staleTime: 5_000 },
      mutations: { retry: false },
    },
  })
