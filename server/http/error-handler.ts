import type { ErrorRequestHandler, RequestHandler } from 'express'
import { UniqueConstraintError } from 'sequelize'
import type { Deps } from '../deps.ts'
import { ApiError, notFound } from './api-error.ts'

/** Turns what Express, body parsers and the database throw into our own error. */
function known(error: unknown): ApiError | null {
  if (error instanceof ApiError) return error
  if (error instanceof UniqueConstraintError)
    return new ApiError('conflict', 'This exists already, or somebody was faster.')
  const type = (error as { type?: string }).type ?? ''
  const status = (error as { status?: number }).status
  const code = (error as { code?: string }).code ?? ''
  if (type === 'entity.too.large' || code === 'LIMIT_FILE_SIZE')
    return new ApiError('too_large', 'This is larger than Scrim takes.')
  if (
    type.startsWith('entity.') ||
    type === 'encoding.unsupported' ||
    type === 'charset.unsupported' ||
    type === 'request.aborted' ||
    code.startsWith('LIMIT_')
  )
    return new ApiError('malformed', 'The request’s body cannot be read.')
  if (status === 400 || error instanceof URIError)
    return new ApiError('malformed', 'This request cannot be read.')
  return null
}

export const noSuchEndpoint: RequestHandler = (_request, _response, next) => next(notFound())

/** The last in line: every failure leaves as RFC 9457 problem details, and only our own mistakes are logged as errors. */
export function errorHandler(deps: Pick<Deps, 'log'>): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) return next(error)
    const told =
      known(error) ??
      new ApiError(
        'internal',
        'Scrim failed at this. Nothing was half saved. Try again; if it stays, report the number below.',
      )
    if (told.code === 'internal')
      deps.log.error({ err: error, requestId: request.id, url: request.path }, 'a request failed')
    response
      .status(told.status)
      .set('Content-Type', 'application/problem+json')
      .set('Cache-Control', 'no-store')
      .send(
        JSON.stringify({
          type: `https://scrim.invalid/problems/${told.code}`,
          title: told.title,
          status: told.status,
          detail: told.message,
          code: told.code,
          ...(told.fields ? { fields: told.fields } : {}),
          ...(told.current === undefined ? {} : { current: told.current }),
          requestId: String(request.id),
        }),
      )
  }
}
