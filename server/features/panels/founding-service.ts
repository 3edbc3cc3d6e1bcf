import { Op, QueryTypes } from 'sequelize'
import { putOnRecord } from '#server/features/record/service.ts'
import type { Context } from '#server/http/context.ts'
import { Member } from '#server/models/member.ts'
import { Panel } from '#server/models/panel.ts'
import { enterScope } from './access-service.ts'
import { slugOf } from './slug.ts'
import { isTimeZone } from './time-zone.ts'

/** Whoever founds a panel may do all of its work; the blind then looks at what they hold in each round. */
export const founderRoles = ['organiser', 'keeper', 'steward', 'panelist', 'editor']

/** A new panel with its founder. Panels may share a name: the address gets a number then. */
export async function foundPanel(
  context: Context,
  founder: { id: string; name: string; email: string },
  { name, timeZone }: { name: string; timeZone: string },
): Promise<Panel> {
  const { random } = context.deps
  const panel = await Panel.create({
    id: random.id(),
    slug: await freeSlug(context, slugOf(name)),
    name,
    timeZone: isTimeZone(timeZone) ? timeZone : 'UTC',
    createdAt: context.now,
  })
  const acting: Context = { ...context, actor: { ...context.actor, userId: founder.id } }
  await enterScope(acting, panel.id)
  await Member.create({
    panelId: panel.id,
    id: random.id(),
    userId: founder.id,
    displayName: founder.name,
    email: founder.email,
    roles: founderRoles,
    createdAt: context.now,
  })
  await putOnRecord(acting, 'panel founded')
  return panel
}

/** `bench`, else `bench-2`, `bench-3` … Two panels founded at the same time wait for each other. */
async function freeSlug(context: Context, wanted: string): Promise<string> {
  await context.deps.sequelize.query('select pg_advisory_xact_lock(731, 3)', { type: QueryTypes.SELECT })
  const taken = await Panel.findAll({
    attributes: ['slug'],
    where: { [Op.or]: [{ slug: wanted }, { slug: { [Op.like]: `${wanted}-%` } }] },
  })
  const slugs = new Set(taken.map(({ slug }) => slug))
  if (!slugs.has(wanted)) return wanted
  let number = 2
  while (slugs.has(`${wanted}-${number}`)) number += 1
  return `${wanted}-${number}`
}
