import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { DemoMessage } from '#server/models/demo-message.ts'

const newest = 200

/** Newest first. Outside the demo there is no such place. */
export async function messagesTakenIn(context: Context): Promise<DemoMessage[]> {
  if (context.deps.env.mode !== 'demo') throw notFound()
  return DemoMessage.findAll({
    order: [
      ['receivedAt', 'desc'],
      ['id', 'asc'],
    ],
    limit: newest,
  })
}
