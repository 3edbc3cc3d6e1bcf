import type { Server } from 'node:http'
import type { Logger } from 'pino'

type Step = { name: string; end: () => unknown }

/** Requests under way get this long to finish; event streams never would. */
const drainMs = 250
/** Whatever hangs, the process is gone by then: the start script counts on less than a second. */
const allMs = 800

/** Ends what was started: the server first, then all that carries it, the database last. */
export function stopper(log: Logger) {
  const steps: { first: Step[]; then: Step[]; last: Step[] } = { first: [], then: [], last: [] }
  let ending: Promise<void> | undefined
  const add = (when: keyof typeof steps) => (name: string, end: Step['end']) =>
    void steps[when].push({ name, end })
  const end = (when: keyof typeof steps) =>
    Promise.all(
      steps[when].map(async ({ name, end }) => {
        try {
          await end()
        } catch (error) {
          log.warn({ err: error }, `${name} did not end well`)
        }
      }),
    )
  const stop = (code: number): Promise<void> =>
    (ending ??= (async () => {
      setTimeout(() => process.exit(code), allMs).unref()
      for (const when of ['first', 'then', 'last'] as const) await end(when)
      process.exit(code)
    })())
  const drained = (server: Server): Promise<void> =>
    new Promise((resolve) => {
      server.close(() => resolve())
      server.closeIdleConnections()
      setTimeout(() => server.closeAllConnections(), drainMs).unref()
    })
  return { first: add('first'), then: add('then'), last: add('last'), stop, drained }
}
