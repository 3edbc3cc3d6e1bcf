import autocannon from 'autocannon'
import { startApp } from '#tests/support/app.ts'

/** Requests that everybody makes, sixteen at a time for five seconds each, on an empty database. */
const app = await startApp({ pages: true })
try {
  for (const path of ['/', '/api/me', '/api/verdicts']) {
    const { requests, latency, non2xx } = await autocannon({
      url: `${app.url}${path}`,
      connections: 16,
      duration: 5,
      headers: { accept: path === '/' ? 'text/html' : 'application/json' },
    })
    const refused = non2xx > 0 ? `, ${non2xx} refused` : ''
    console.log(
      `  ${path}: ${Math.round(requests.average)} a second, median ${latency.p50} ms, 99 of 100 under ${latency.p99} ms${refused}`,
    )
  }
} finally {
  await app.close()
}
