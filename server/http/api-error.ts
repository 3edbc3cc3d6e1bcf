import { statusOf, type ErrorCode } from '#shared/contracts/errors.ts'

const titles: Record<ErrorCode, string> = {
  malformed: 'This request cannot be read',
  not_signed_in: 'Sign in first',
  forbidden: 'Not yours to do',
  not_found: 'Not found',
  conflict: 'Something changed meanwhile',
  too_large: 'Too large',
  invalid: 'Please check what you entered',
  too_many: 'Too many tries',
  internal: 'Scrim failed',
  unavailable: 'Not available just now',
}

/** An answer that is not a success. `fields` are keyed by input name, `units.0.name` for one in a list. */
export class ApiError extends Error {
  readonly code: ErrorCode
  readonly fields: Record<string, string> | undefined
  readonly current: unknown
  constructor(
    code: ErrorCode,
    detail: string,
    more: { fields?: Record<string, string>; current?: unknown } = {},
  ) {
    super(detail)
    this.code = code
    this.fields = more.fields
    this.current = more.current
  }
  get status(): number {
    return statusOf[this.code]
  }
  get title(): string {
    return titles[this.code]
  }
}

/** Also says "you may not know that it exists". */
export const notFound = (what = 'There is nothing at this address, or it is not yours to see.'): ApiError =>
  new ApiError('not_found', what)

/** One fault at one field. */
export const fieldError = (field: string, message: string): ApiError =>
  new ApiError('invalid', message, { fields: { [field]: message } })

/** A stale edit: carries the record as it stands now. */
export const staleEdit = (current: unknown): ApiError =>
  new ApiError(
    'conflict',
    'Somebody changed this after you opened it. Look at both versions, then save again.',
    { current },
  )
