import { putOnRecord } from '#server/features/record/service.ts'
import { fieldError } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { mayEditPanel } from '#server/policies/panel.ts'
import { enterPanel, type PanelAccess } from './access-service.ts'
import { isTimeZone } from './time-zone.ts'

/** Renames a panel or moves its time zone; its address stays. `stale` where somebody was faster: nothing changes then. */
export async function changePanel(
  context: Context,
  slug: string,
  { name, timeZone }: { name: string; timeZone: string },
): Promise<PanelAccess & { stale: boolean }> {
  const access = await enterPanel(context, slug)
  const { panel, member } = access
  permit(mayEditPanel({ roles: member.roles }), { detail: 'The organisers of a panel change it.' })
  if (!isTimeZone(timeZone))
    throw fieldError('timeZone', 'Choose a time zone from the list, like Europe/Dublin.')
  await panel.reload({ lock: true })
  if (panel.version !== context.version) return { ...access, stale: true }
  await panel.update({ name, timeZone, version: panel.version + 1 })
  await putOnRecord(context, 'panel changed')
  return { ...access, stale: false }
}
