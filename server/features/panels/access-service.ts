import { setScope } from '#server/db/transaction.ts'
import { notFound } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { Member } from '#server/models/member.ts'
import { Panel } from '#server/models/panel.ts'

export interface PanelAccess {
  panel: Panel
  member: Member
}

/** From here on the request belongs to this panel. */
export async function enterScope(context: Context, panelId: string): Promise<void> {
  context.panelId = panelId
  const { sequelize } = context.deps
  await setScope(sequelize, { panelId, userId: context.actor.userId })
}

/**
 * The panel at this address and the actor's membership in it.
 * @throws not_found for a panel that is not there and for one of which the actor is no member
 */
export async function enterPanel(context: Context, slug: string): Promise<PanelAccess> {
  const panel = context.actor.userId === null ? null : await Panel.findOne({ where: { slug } })
  const member =
    panel &&
    (await Member.findOne({ where: { panelId: panel.id, userId: context.actor.userId, removedAt: null } }))
  if (!panel || !member) throw notFound()
  await enterScope(context, panel.id)
  return { panel, member }
}
