import { z } from 'zod'

/** The one table from an error's code to its HTTP status. */
export const statusOf = {
  malformed: 400,
  not_signed_in: 401,
  forbidden: 403,
  not_found: 404,
  conflict: 409,
  too_large: 413,
  invalid: 422,
  too_many: 429,
  internal: 500,
  unavailable: 503,
} as const
export type ErrorCode = keyof typeof statusOf

/** RFC 9457 problem details with our code, the fields at fault (keyed by input name) and the request's number. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  code: z.enum(Object.keys(statusOf) as [ErrorCode, ...ErrorCode[]]),
  fields: z.record(z.string(), z.string()).optional(),
  requestId: z.string(),
  /** On a stale edit: the record as it stands now. */
  current: z.unknown().optional(),
})
export type Problem = z.infer<typeof problem>
