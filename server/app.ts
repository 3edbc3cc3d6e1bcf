import express, { type Express } from 'express'
import passport from 'passport'
import { setUpPassport } from './auth/passport.ts'
import type { Deps } from './deps.ts'
import { features } from './features/index.ts'
import { errorHandler, noSuchEndpoint } from './http/error-handler.ts'
import { mounter } from './http/mount.ts'
import { openApiRoute } from './http/openapi-route.ts'
import { pages } from './http/pages.ts'
import { limited } from './http/rate-limits.ts'
import { requestId } from './http/request-id.ts'
import { sameOrigin } from './http/same-origin.ts'
import { securityHeaders } from './http/security-headers.ts'
import { sessions } from './http/sessions.ts'
import { initModels } from './models/index.ts'

export interface App {
  express: Express
  stop(): Promise<void>
}

const writes = (method: string): boolean => method !== 'GET' && method !== 'HEAD'

/** The whole application over what it is given. Routes answer under `/api`; everything else is the page. */
export function createApp(deps: Deps, options: { pruneSessionsEvery?: number | false } = {}): App {
  initModels(deps.sequelize)
  setUpPassport()
  const kept = sessions(deps.env, options.pruneSessionsEvery ?? 900)
  const app = express()
  app.disable('x-powered-by')
  app.set('trust proxy', deps.env.proxies)
  app.set('query parser', 'simple')
  app.use(requestId)
  app.use(securityHeaders(deps.env))

  const api = express.Router()
  api.use(kept.middleware)
  api.use(passport.session())
  api.use('/api', limited(deps.limits.write, writes))
  api.use(
    ['/api/session', '/api/account/password'],
    limited(deps.limits.signIn, writes, { failuresOnly: true }),
  )
  api.use('/api/password-resets', limited(deps.limits.signIn, writes))
  api.post('/api/account', limited(deps.limits.signIn, writes))
  api.use('/api/join', limited(deps.limits.join, writes))
  api.use('/api', sameOrigin)
  const mount = mounter(api, deps)
  for (const feature of features) feature(mount, api, deps)
  api.get('/api/openapi.json', openApiRoute)
  api.use('/api', noSuchEndpoint)

  app.use('/api', (_request, response, next) => {
    response.set('Vary', 'Cookie')
    next()
  })
  app.use((request, response, next) =>
    request.path.startsWith('/api/') ? api(request, response, next) : next(),
  )
  if (deps.clientFolder) app.use(pages(deps.clientFolder))
  app.use(noSuchEndpoint)
  app.use(errorHandler(deps))
  return { express: app, stop: kept.stop }
}
