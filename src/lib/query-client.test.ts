import { expect, it } from 'vitest'
import type { ErrorCode } from '#shared/contracts/errors.ts'
import { statusOf } from '#shared/contracts/errors.ts'
import { CallError } from './call.ts'
import { mayRetry } from './query-client.ts'

const refused = (code: ErrorCode) =>
  new CallError({ type: 'about:blank', title: '', detail: '', status: statusOf[code], code, requestId: '' })

it('asks again when the server failed or was away, twice at most', () => {
  expect(mayRetry(0, refused('unavailable'))).toBe(true)
  expect(mayRetry(1, refused('internal'))).toBe(true)
  expect(mayRetry(2, refused('internal'))).toBe(false)
})

it.each(['malformed', 'not_signed_in', 'forbidden', 'not_found', 'conflict', 'invalid', 'too_many'] as const)(
  'takes “%s” for an answer',
  (code) => expect(mayRetry(0, refused(code))).toBe(false),
)
