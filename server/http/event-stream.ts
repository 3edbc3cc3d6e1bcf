import type { Request, Response, Router } from 'express'
import type { Endpoint, ParamsOf } from '#shared/contracts/endpoint.ts'
import { inTransaction } from '../db/transaction.ts'
import type { Deps } from '../deps.ts'
import type { Change } from './changes.ts'
import type { Context } from './context.ts'
import { contextOf } from './mount.ts'
import { readInput } from './parse.ts'

const heartbeat = 20_000

/**
 * Mounts a stream of server-sent events. `enter` decides whether this actor may listen and returns what a change is
 * called for them, or null for a change that is not theirs to hear of.
 */
export function mountEvents<E extends Endpoint>(
  router: Router,
  deps: Deps,
  endpoint: E,
  enter: (params: ParamsOf<E>, context: Context) => Promise<(change: Change) => string | null>,
): void {
  router.get(endpoint.path, async (request: Request, response: Response) => {
    const context = contextOf(deps, endpoint, request, response)
    const { params } = readInput(endpoint, request)
    const name = await inTransaction(deps.sequelize, { userId: context.actor.userId }, () =>
      enter(params as never, context),
    )
    response.set({
      'Content-Type': 'text/event-stream',
      'Cache-Control': 'no-store',
      'X-Accel-Buffering': 'no',
    })
    response.flushHeaders()
    response.write('retry: 3000\n\n')
    const leave = deps.changes.listen((change) => {
      const changed = name(change)
      if (changed !== null) response.write(`data: ${JSON.stringify({ changed })}\n\n`)
    })
    const beat = setInterval(() => response.write(': still here\n\n'), heartbeat)
    request.on('close', () => {
      clearInterval(beat)
      leave()
    })
  })
}
