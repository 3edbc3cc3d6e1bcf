import type { RequestHandler } from 'express'
import { rateLimit } from 'express-rate-limit'
import { ApiError } from './api-error.ts'

/** How many requests of a kind one caller may make in how many seconds. */
export interface RateLimits {
  signIn: { most: number; seconds: number }
  join: { most: number; seconds: number }
  write: { most: number; seconds: number }
}

export const usualLimits: RateLimits = {
  signIn: { most: 10, seconds: 300 },
  join: { most: 60, seconds: 300 },
  write: { most: 600, seconds: 60 },
}

/** A limit by network address, counted in this process. With `failuresOnly` whoever succeeds is not counted. */
export const limited = (
  { most, seconds }: { most: number; seconds: number },
  counts: (method: string) => boolean,
  { failuresOnly = false }: { failuresOnly?: boolean } = {},
): RequestHandler =>
  rateLimit({
    windowMs: seconds * 1000,
    limit: most,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    skipSuccessfulRequests: failuresOnly,
    skip: (request) => !counts(request.method),
    handler: (_request, _response, next) =>
      next(
        new ApiError('too_many', `Too many tries. Wait ${Math.ceil(seconds / 60)} minutes, then try again.`),
      ),
  })
