import type { ResponseOf } from '#shared/contracts/endpoint.ts'
import type { listMembers, listUnits, Panel, RoundLine } from '#shared/contracts/panels.ts'

type UnitLine = ResponseOf<typeof listUnits>['units'][number]
type MemberLine = ResponseOf<typeof listMembers>['members'][number]

interface PanelRow {
  slug: string
  name: string
  timeZone: string
  version: number
}
interface MemberRow {
  id: string
  displayName: string
  userId: string | null
  roles: readonly string[]
}
interface UnitRow {
  id: string
  maker: string
  name: string
  provenance: string | null
  disclosure: string | null
  /** BIGINT comes as text; cents of any price there is fit into a number. */
  priceMinor: string | null
  priceCurrency: string | null
  priceOn: string | null
  rounds: number
}
type RoundRow = Omit<RoundLine, 'changedAt'> & { changedAt: Date }

export const presentPanel = (panel: PanelRow, you: MemberRow, can: Panel['can']): Panel => ({
  slug: panel.slug,
  name: panel.name,
  timeZone: panel.timeZone,
  version: panel.version,
  you: { memberId: you.id, name: you.displayName, roles: [...you.roles] },
  can,
})

export const presentRoundLine = (row: RoundRow): RoundLine => ({
  ...row,
  changedAt: row.changedAt.toISOString(),
})

export const presentUnitLine = (row: UnitRow): UnitLine => ({
  id: row.id,
  maker: row.maker,
  name: row.name,
  provenance: row.provenance,
  disclosure: row.disclosure,
  price:
    row.priceMinor === null || row.priceCurrency === null || row.priceOn === null
      ? null
      : { minor: Number(row.priceMinor), currency: row.priceCurrency, on: row.priceOn },
  rounds: row.rounds,
})

export const presentMemberLine = (row: MemberRow): MemberLine => ({
  id: row.id,
  name: row.displayName,
  roles: [...row.roles],
  signsIn: row.userId !== null,
})
