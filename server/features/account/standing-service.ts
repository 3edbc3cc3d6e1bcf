import { QueryTypes } from 'sequelize'
import type { Context } from '#server/http/context.ts'
import { User } from '#server/models/user.ts'

export interface SeatHere {
  id: string
  label: string
  roundTitle: string
}
export interface DutyHere {
  role: string
  roundTitle: string
  panelSlug: string
  roundId: string
  sittingId: string
}
export interface PanelHere {
  slug: string
  name: string
  roles: string[]
}

/** A person, or nobody, with what they hold here: by membership, and by links that this browser opened. */
export interface Standing {
  user: { id: string; name: string; email: string; version: number } | null
  panels: PanelHere[]
  seats: SeatHere[]
  duties: DutyHere[]
}

const panelsOf = `
  select p.slug, p.name, m.roles from members m join panels p on p.id = m.panel_id
  where m.user_id = $1 and m.removed_at is null order by p.name, p.slug`

const seatsOf = `
  select s.id, s.label, r.title as "roundTitle" from seats s join rounds r on r.id = s.round_id
  where s.id = any($1::uuid[]) and r.status <> 'cancelled' order by r.opened_at desc, s.number`

const dutiesOf = `
  select distinct d.role, r.title as "roundTitle", p.slug as "panelSlug", r.id as "roundId", s.id as "sittingId", s.name
  from round_roles d
  join rounds r on r.id = d.round_id and r.status = 'open'
  join panels p on p.id = d.panel_id
  join members m on m.id = d.member_id and m.removed_at is null
  join sittings s on s.round_id = r.id
  where d.role in ('keeper', 'letters', 'codes', 'steward') and (d.id = any($1::uuid[]) or m.user_id = $2)
  order by r.title, s.name, d.role`

export async function lookAround(context: Context, userId: string | null): Promise<Standing> {
  const { sequelize } = context.deps
  const { seatIds, dutyIds } = context.actor
  const user = userId === null ? null : await User.findByPk(userId)
  const select = { type: QueryTypes.SELECT } as const
  return {
    user: user && { id: user.id, name: user.name, email: user.email, version: user.version },
    panels: user ? await sequelize.query<PanelHere>(panelsOf, { ...select, bind: [user.id] }) : [],
    seats:
      seatIds.length > 0 ? await sequelize.query<SeatHere>(seatsOf, { ...select, bind: [[...seatIds]] }) : [],
    duties:
      dutyIds.length > 0 || user
        ? await sequelize.query<DutyHere>(dutiesOf, { ...select, bind: [[...dutyIds], user?.id ?? null] })
        : [],
  }
}
