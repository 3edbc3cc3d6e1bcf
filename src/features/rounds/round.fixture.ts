import type { Me } from '#shared/contracts/account.ts'
import type { Panel } from '#shared/contracts/panels.ts'
import type { Progress, Round } from '#shared/contracts/rounds.ts'

export const ids = {
  round: '11111111-1111-4111-8111-111111111111',
  sitting: '22222222-2222-4222-8222-222222222222',
  ines: '33333333-3333-4333-8333-333333333333',
  bo: '44444444-4444-4444-8444-444444444444',
  seat: '55555555-5555-4555-8555-555555555555',
}

export const panel: Panel = {
  slug: 'quayside-bench',
  name: 'The Quayside Bench',
  timeZone: 'UTC',
  version: 3,
  you: { memberId: ids.ines, name: 'Ines Falk', roles: ['organiser'] },
  can: { startRound: true, edit: true, seeUnits: true },
}

export const ines: Me = {
  user: { id: ids.ines, name: 'Ines Falk', email: 'ines@example.org', version: 1 },
  panels: [{ slug: panel.slug, name: panel.name, roles: ['organiser'] }],
  seats: [],
  duties: [],
  mode: 'demo',
  mailSends: true,
}

export const draftRound: Round = {
  id: ids.round,
  number: 7,
  title: 'Three under a hundred',
  question: 'Which do we like?',
  status: 'draft',
  origin: 'live',
  blinding: 'double',
  version: 4,
  units: [
    { id: ids.seat, maker: 'Lantern Reed', name: 'Dunlin' },
    { id: ids.bo, maker: 'Saltmarsh Audio', name: 'Whimbrel' },
    { id: ids.sitting, maker: 'Saltmarsh Audio', name: 'Tern One' },
  ],
  unitCount: 3,
  people: [
    { memberId: ids.ines, name: 'Ines Falk', roles: ['organiser', 'keeper'] },
    { memberId: ids.bo, name: 'Bo', roles: ['steward', 'panelist'] },
    { memberId: ids.seat, name: 'Cy', roles: ['panelist'] },
  ],
  scorecard: [
    {
      key: 'overall-liking',
      name: 'Overall liking',
      family: 'liking',
      sentence: 'How much you like the sound as a whole',
      scale: { low: 0, high: 100, step: 1 },
      sided: 'one',
      words: { low: 'dislike', middle: null, high: 'like very much' },
    },
    {
      key: 'width',
      name: 'Width',
      family: 'staging',
      sentence: 'How far sounds spread left and right',
      scale: { low: 0, high: 100, step: 1 },
      sided: 'one',
      words: { low: 'inside the head', middle: null, high: 'well outside the ears' },
    },
  ],
  primaryDescriptor: 'overall-liking',
  tracks: ['A choir in a church'],
  sourceChain: '',
  levelMatching: 'by-ear',
  hiding: 'Opaque pouches',
  publishesRows: true,
  plan: { turns: 3, minutesPerTurn: 7, minutes: 21, rows: [{ turns: [1, 2, 3] }, { turns: [1, 2, 3] }] },
  sittingId: null,
  planFingerprint: null,
  keyFingerprint: null,
  openedAt: null,
  closedAt: null,
  cancelReason: null,
  verdictSlug: null,
  draft: null,
  lacks: [],
  you: { roles: ['organiser', 'keeper'], seatId: null },
  can: {
    edit: true,
    open: true,
    cancel: true,
    close: false,
    handOutLinks: false,
    steward: false,
    tag: false,
    seeAgreement: false,
    publish: false,
  },
}

export const openRoundRecord: Round = {
  ...draftRound,
  status: 'open',
  version: 5,
  sittingId: ids.sitting,
  planFingerprint: 'a'.repeat(64),
  keyFingerprint: 'b'.repeat(64),
  openedAt: '2026-11-03T18:00:00Z',
  can: { ...draftRound.can, edit: false, open: false, close: true, handOutLinks: true, tag: true },
}

export const halfway: Progress = {
  turn: 2,
  turns: 3,
  seats: 2,
  joined: 2,
  left: 0,
  servings: { planned: 6, submitted: 3, void: 0, out: 1 },
  waitingFor: [{ seat: 'Cy', what: 'one rating' }],
}
