import type { Me } from '#shared/contracts/account.ts'

interface Held {
  user: Me['user']
  panels: Me['panels']
  seats: Me['seats']
  duties: { role: string; roundTitle: string; panelSlug: string; roundId: string; sittingId: string }[]
}

const pageOf: Record<string, string> = { keeper: 'tags', letters: 'tags', codes: 'tags', steward: 'table' }

export const presentMe = (held: Held, house: Pick<Me, 'mode' | 'mailSends'>): Me => ({
  user: held.user,
  panels: held.panels.map(({ slug, name, roles }) => ({ slug, name, roles })),
  seats: held.seats.map(({ id, label, roundTitle }) => ({ id, label, roundTitle })),
  duties: held.duties.map(({ role, roundTitle, panelSlug, roundId, sittingId }) => ({
    role,
    roundTitle,
    path: `/p/${panelSlug}/rounds/${roundId}/${pageOf[role]}/${sittingId}`,
  })),
  ...house,
})
