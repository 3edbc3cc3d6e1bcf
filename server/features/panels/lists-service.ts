import { Op, QueryTypes } from 'sequelize'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import { Member } from '#server/models/member.ts'
import { mayKnowUnitsInUse, maySeePanelUnits } from '#server/policies/panel.ts'
import type { RoundFacts } from '#server/policies/round.ts'
import { enterPanel } from './access-service.ts'

export interface RoundRow {
  id: string
  number: number
  title: string
  status: RoundFacts['status']
  origin: RoundFacts['origin']
  blinding: 'double' | 'single' | 'split' | 'imported'
  listeners: number
  changedAt: Date
  verdictSlug: string | null
}
export interface UnitRow {
  id: string
  maker: string
  name: string
  provenance: string | null
  disclosure: string | null
  priceMinor: string | null
  priceCurrency: string | null
  priceOn: string | null
  rounds: number
}
/** What the actor holds in the open rounds that use a unit. */
type HeldUnitRow = UnitRow & { held: RoundFacts[] }

const roundsOf = `
  select r.id, r.number, r.title, r.status, r.origin, r.blinding, r.changed_at as "changedAt",
    (case
      when r.origin = 'imported' then
        (select count(distinct i.listener) from imported_ratings i where i.round_id = r.id)
      when r.opened_at is null then
        (select count(*) from round_roles d where d.round_id = r.id and d.role = 'panelist')
      else (select count(*) from seats s where s.round_id = r.id)
    end)::int as listeners,
    (select v.slug from verdicts v where v.round_id = r.id order by v.version desc limit 1) as "verdictSlug"
  from rounds r where r.panel_id = $1 order by r.number desc`

// Whoever came by one link still holds what else the same person holds.
const unitsOf = `
  with people as (
    select $2::uuid as member_id
    union select member_id from round_roles where id = any($3::uuid[])
    union select member_id from seats where id = any($4::uuid[]) and member_id is not null
  ), holding as (
    select d.round_id, d.role from round_roles d join people using (member_id)
    union select s.round_id, 'panelist' from seats s
      where s.id = any($4::uuid[]) or s.member_id in (select member_id from people)
  ), held as (
    select r.id as round_id, json_build_object('status', r.status, 'origin', r.origin, 'roles', json_agg(h.role)) as facts
    from rounds r join holding h on h.round_id = r.id
    where r.panel_id = $1 and r.status = 'open' group by r.id
  )
  select u.id, u.maker, u.name, u.provenance, u.disclosure, u.price_minor as "priceMinor",
    u.price_currency as "priceCurrency", u.price_on as "priceOn",
    (select count(*) from round_units n where n.unit_id = u.id)::int as rounds,
    (select coalesce(json_agg(held.facts), '[]') from round_units n join held using (round_id) where n.unit_id = u.id)
      as held
  from units u where u.panel_id = $1 order by lower(u.maker), lower(u.name), u.id`

export async function roundsOfPanel(context: Context, slug: string): Promise<RoundRow[]> {
  const { panel } = await enterPanel(context, slug)
  return context.deps.sequelize.query<RoundRow>(roundsOf, { bind: [panel.id], type: QueryTypes.SELECT })
}

const called = (unit: UnitRow): string => `${unit.maker}\n${unit.name}`.toLowerCase()

/**
 * The panel's units without those that the actor may not know of now. Another specimen of the same name would tell as
 * much: it is withheld with them.
 */
export async function unitsOfPanel(
  context: Context,
  slug: string,
): Promise<{ units: UnitRow[]; withheld: number }> {
  const { panel, member } = await enterPanel(context, slug)
  permit(maySeePanelUnits({ roles: member.roles }), { detail: 'The organisers of a panel see its units.' })
  const { seatIds, dutyIds } = context.actor
  const all = await context.deps.sequelize.query<HeldUnitRow>(unitsOf, {
    bind: [panel.id, member.id, [...dutyIds], [...seatIds]],
    type: QueryTypes.SELECT,
  })
  const kept = new Set(all.filter(({ held }) => !held.every(mayKnowUnitsInUse)).map(called))
  const units = all.filter((unit) => !kept.has(called(unit)))
  return { units, withheld: all.length - units.length }
}

export async function membersOfPanel(context: Context, slug: string): Promise<Member[]> {
  const { panel } = await enterPanel(context, slug)
  return Member.findAll({
    // Listeners of an imported file are numbers in a table, not people to write to.
    where: { panelId: panel.id, removedAt: null, [Op.not]: { roles: { [Op.contains]: ['imported'] } } },
    order: [
      ['displayName', 'asc'],
      ['id', 'asc'],
    ],
  })
}
