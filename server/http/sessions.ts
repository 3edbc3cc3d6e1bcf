import pgSimple from 'connect-pg-simple'
import session from 'express-session'
import pg from 'pg'
import type { Env } from '../env.ts'

const days = 30

/** Sessions live in PostgreSQL: any web process may answer the next request. `stop` ends the pool. */
export function sessions(env: Env, pruneEverySeconds: number | false) {
  const pool = new pg.Pool({ connectionString: env.databaseUrl, max: 4, application_name: 'scrim sessions' })
  pool.on('error', () => undefined) // a lost idle connection is replaced at the next query
  const Store = pgSimple(session)
  const store = new Store({
    pool,
    tableName: 'sessions',
    createTableIfMissing: false,
    pruneSessionInterval: pruneEverySeconds,
  })
  const middleware = session({
    store,
    name: 'scrim',
    secret: env.secret,
    resave: false,
    saveUninitialized: false,
    rolling: false,
    proxy: env.proxies > 0,
    cookie: { httpOnly: true, sameSite: 'lax', secure: env.tls, maxAge: days * 24 * 3600 * 1000, path: '/' },
  })
  return {
    middleware,
    stop: async () => {
      store.close()
      await pool.end()
    },
  }
}
