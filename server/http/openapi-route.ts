import type { RequestHandler } from 'express'
import { openApi } from './openapi.ts'

let kept: string | undefined

/** Made at the first question and kept: contracts do not change while a process runs. */
export const openApiRoute: RequestHandler = (_request, response) => {
  kept ??= JSON.stringify(openApi())
  response.set('Cache-Control', 'no-cache').type('application/json').send(kept)
}
