import { queryOptions } from '@tanstack/react-query'
import type { z } from 'zod'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { call, type CallInput } from './call.ts'

/** Where an answer lies in the cache: the endpoint's id, then its parameters and query. */
export const keyOf = <E extends Endpoint>(endpoint: E, input: Pick<CallInput<E>, 'params' | 'query'> = {}) =>
  [endpoint.id, input.params ?? {}, input.query ?? {}] as const

/**
 * Query options for a reading endpoint. Two features that ask for the same record with `ask` share one answer in the
 * cache without knowing each other.
 *
 * @example
 * const roundQuery = (panel: string, round: string) => ask(getRound, { params: { panel, round } })
 */
export const ask = <E extends Endpoint>(endpoint: E, input: Pick<CallInput<E>, 'params' | 'query'> = {}) =>
  queryOptions<z.output<E['response']>>({
    queryKey: keyOf(endpoint, input),
    queryFn: ({ signal }) => call(endpoint, { ...input, signal }),
  })
