import type { RequestHandler } from 'express'
import { ApiError } from './api-error.ts'

/**
 * Refuses a write that another site may have caused. Passes on `Sec-Fetch-Site: same-origin` or on an `Origin` equal
 * to the host that was asked; a write that carries neither is refused.
 */
export const sameOrigin: RequestHandler = (request, _response, next) => {
  if (request.method === 'GET' || request.method === 'HEAD' || request.method === 'OPTIONS') return next()
  if (request.get('sec-fetch-site') === 'same-origin') return next()
  const origin = request.get('origin')
  const host = request.get('host')
  const equal = origin !== undefined && URL.canParse(origin) && new URL(origin).host === host
  next(equal ? undefined : new ApiError('forbidden', 'This write did not come from Scrim’s own pages.'))
}
