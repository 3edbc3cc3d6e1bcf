import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import express, { type Router } from 'express'
import { notFound } from './api-error.ts'

/** The built browser application: hashed files for ever, the page itself never kept. */
export function pages(clientFolder: string): Router {
  const router = express.Router()
  router.use(
    '/assets',
    express.static(join(clientFolder, 'assets'), {
      immutable: true,
      maxAge: '1y',
      index: false,
      fallthrough: true,
    }),
  )
  router.use('/assets', (_request, _response, next) => next(notFound()))
  router.use(express.static(clientFolder, { index: false, maxAge: '1h' }))
  router.get('/{*any}', (request, response, next) => {
    if (request.path.startsWith('/api/') || !request.accepts('html')) return next(notFound())
    const page = join(clientFolder, 'index.html')
    if (!existsSync(page)) return next(notFound('The pages are not built yet.'))
    response.set('Cache-Control', 'no-cache').type('html').send(readFileSync(page))
  })
  return router
}
