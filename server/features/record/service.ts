import type { Context } from '#server/http/context.ts'
import { AuditEvent } from '#server/models/audit-event.ts'

/** Puts on the panel's record who did what. `facts` holds ids and numbers, never a rating and never the key. */
export async function putOnRecord(
  context: Context,
  action: string,
  about: { roundId?: string; facts?: Record<string, string | number | boolean> } = {},
): Promise<void> {
  if (context.panelId === undefined) throw new Error('The record belongs to a panel: enter one first.')
  await AuditEvent.create({
    panelId: context.panelId,
    id: context.deps.random.id(),
    roundId: about.roundId ?? null,
    actor:
      context.actor.userId ??
      (context.actor.seatIds[0]
        ? `seat ${context.actor.seatIds[0]}`
        : `link ${context.actor.dutyIds[0] ?? ''}`),
    action,
    facts: about.facts ?? {},
    at: context.now,
  })
}
