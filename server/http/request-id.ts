import { randomUUID } from 'node:crypto'
import type { RequestHandler } from 'express'

declare module 'http' {
  interface IncomingMessage {
    id: string | number | object
  }
}

/** A number for each request: it stands in the log, in the answer's header and in every problem. */
export const requestId: RequestHandler = (request, response, next) => {
  request.id = randomUUID()
  response.set('X-Request-Id', String(request.id))
  next()
}
