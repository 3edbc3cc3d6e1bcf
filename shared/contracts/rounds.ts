import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'
import { blindings, roundRoles, roundStatuses } from '#shared/domain/round-status.ts'
import { endpoint } from './endpoint.ts'
import { eveningDraft, levelMatchings } from './evening-draft.ts'
import { atPanel } from './panels.ts'
import { descriptor } from './scorecard.ts'
import { fingerprint, id, instant, line, slug } from './text.ts'

export const atRound = atPanel.extend({ round: id })

export const roundPerson = z.strictObject({
  memberId: id,
  name: z.string(),
  roles: z.array(z.enum(roundRoles)),
})

/** One listener's thread through the evening: the turns in which they hear something; no unit, no code. */
export const planRow = z.strictObject({ turns: z.array(z.number().int()) })

/** The organiser's view. `units` is null while the organiser stewards or listens in the open round. */
export const round = z.strictObject({
  id,
  number: z.number().int(),
  title: z.string(),
  question: z.string(),
  status: z.enum(roundStatuses),
  origin: z.enum(['live', 'imported']),
  blinding: z.enum(blindings),
  version: z.number().int(),
  units: z.array(z.strictObject({ id, maker: z.string(), name: z.string() })).nullable(),
  unitCount: z.number().int(),
  people: z.array(roundPerson),
  scorecard: z.array(descriptor),
  primaryDescriptor: z.string(),
  tracks: z.array(z.string()),
  sourceChain: z.string(),
  levelMatching: z.enum(levelMatchings),
  hiding: z.string(),
  publishesRows: z.boolean(),
  plan: z.strictObject({
    turns: z.number().int(),
    minutesPerTurn: z.number().int(),
    minutes: z.number().int(),
    rows: z.array(planRow),
  }),
  sittingId: id.nullable(),
  planFingerprint: fingerprint.nullable(),
  keyFingerprint: fingerprint.nullable(),
  openedAt: instant.nullable(),
  closedAt: instant.nullable(),
  cancelReason: z.string().nullable(),
  verdictSlug: slug.nullable(),
  /** The typed draft, to fill the form again; null once the round is open or for those who may not see units. */
  draft: z.unknown().nullable(),
  lacks: z.array(z.string()),
  you: z.strictObject({ roles: z.array(z.enum(roundRoles)), seatId: id.nullable() }),
  can: z.strictObject({
    edit: z.boolean(),
    open: z.boolean(),
    cancel: z.boolean(),
    close: z.boolean(),
    handOutLinks: z.boolean(),
    steward: z.boolean(),
    tag: z.boolean(),
    seeAgreement: z.boolean(),
    publish: z.boolean(),
  }),
})
export type Round = z.infer<typeof round>

/** Progress is counted in servings; nothing of what was rated. */
export const progress = z.strictObject({
  turn: z.number().int(),
  turns: z.number().int(),
  seats: z.number().int(),
  joined: z.number().int(),
  left: z.number().int(),
  servings: z.strictObject({
    planned: z.number().int(),
    submitted: z.number().int(),
    void: z.number().int(),
    out: z.number().int(),
  }),
  /** Who still owes a rating or the end questions, by seat label. */
  waitingFor: z.array(z.strictObject({ seat: z.string(), what: z.string() })),
})
export type Progress = z.infer<typeof progress>

/** A link to hand over on paper or screen, with its QR code as SVG. */
export const handover = z.strictObject({
  what: z.enum(['seat', 'duty']),
  label: z.string(),
  id,
  url: z.string(),
  qr: z.string(),
  opened: z.boolean(),
})
export type Handover = z.infer<typeof handover>

export const createEvening = endpoint('POST /api/panels/:panel/rounds', {
  id: 'createEvening',
  audience: 'panel',
  summary: 'Draft an evening',
  params: atPanel,
  body: eveningDraft,
  response: round,
  idempotent: true,
})
export const getRound = endpoint('GET /api/panels/:panel/rounds/:round', {
  id: 'getRound',
  audience: 'round',
  summary: 'One round, as its organiser or its other people see it',
  params: atRound,
  response: round,
})
export const changeEvening = endpoint('PUT /api/panels/:panel/rounds/:round', {
  id: 'changeEvening',
  audience: 'round',
  summary: 'Change a draft',
  params: atRound,
  body: eveningDraft,
  response: round,
  versioned: true,
})
export const openRound = endpoint('POST /api/panels/:panel/rounds/:round/open', {
  id: 'openRound',
  audience: 'round',
  summary: 'Draw rows and codes, freeze the plan, publish both fingerprints',
  params: atRound,
  response: round,
  versioned: true,
})
export const cancelRound = endpoint('POST /api/panels/:panel/rounds/:round/cancel', {
  id: 'cancelRound',
  audience: 'round',
  summary: 'Cancel a draft or an open round; the reason is public',
  params: atRound,
  body: z.strictObject({ reason: line(limits.reason, 'Say why.') }),
  response: round,
  versioned: true,
})
export const closeRound = endpoint('POST /api/panels/:panel/rounds/:round/close', {
  id: 'closeRound',
  audience: 'round',
  summary: 'Close: the ratings file is fixed, then the key opens and the statistics are computed',
  params: atRound,
  body: z.strictObject({ evenIfOut: z.boolean().default(false) }),
  response: round,
  versioned: true,
})
export const draftAgain = endpoint('POST /api/panels/:panel/rounds/:round/draft-again', {
  id: 'draftAgain',
  audience: 'round',
  summary: 'Copy a cancelled round’s plan into a new draft',
  params: atRound,
  response: round,
  idempotent: true,
})
export const getProgress = endpoint('GET /api/panels/:panel/rounds/:round/progress', {
  id: 'getProgress',
  audience: 'round',
  summary: 'How many servings are in',
  params: atRound,
  response: progress,
})
export const listHandovers = endpoint('GET /api/panels/:panel/rounds/:round/links', {
  id: 'listHandovers',
  audience: 'round',
  summary: 'Links and QR codes for seats and duties',
  params: atRound,
  response: z.strictObject({ handovers: z.array(handover) }),
})
export const renewLink = endpoint('POST /api/panels/:panel/rounds/:round/links/:link', {
  id: 'renewLink',
  audience: 'round',
  summary: 'Make a new link for a seat or duty; the old one stops working',
  params: atRound.extend({ link: id }),
  response: handover,
})
export const roundEvents = endpoint('GET /api/panels/:panel/rounds/:round/events', {
  id: 'roundEvents',
  audience: 'round',
  summary: 'Server-sent events that say only which seat changed',
  params: atRound,
  response: z.strictObject({ changed: z.string() }),
  kind: 'events',
})

/** What anybody may read of a round that is or was open: never a unit before closing. */
export const publicRound = z.strictObject({
  id,
  panelName: z.string(),
  title: z.string(),
  question: z.string(),
  status: z.enum(roundStatuses),
  blinding: z.enum(blindings),
  openedAt: instant.nullable(),
  closedAt: instant.nullable(),
  cancelledAt: instant.nullable(),
  cancelReason: z.string().nullable(),
  unitCount: z.number().int(),
  listeners: z.number().int(),
  scorecard: z.array(descriptor),
  primaryDescriptor: z.string(),
  tracks: z.array(z.string()),
  levelMatching: z.string(),
  hiding: z.string(),
  turns: z.number().int(),
  planFingerprint: fingerprint,
  keyFingerprint: fingerprint,
  verdictSlug: slug.nullable(),
  /** A cancelled round opens its key once no open round uses its units. */
  keyIsPublic: z.boolean(),
})
export type PublicRound = z.infer<typeof publicRound>
export const getPublicRound = endpoint('GET /api/rounds/:round', {
  id: 'getPublicRound',
  audience: 'anyone',
  summary: 'The public page of a round',
  params: z.strictObject({ round: id }),
  response: publicRound,
})
export const getRoundFile = endpoint('GET /api/rounds/:round/files/:file', {
  id: 'getRoundFile',
  audience: 'anyone',
  summary: 'plan.json or key.json of a cancelled round, once no open round uses its units',
  params: z.strictObject({ round: id, file: z.enum(['plan.json', 'key.json']) }),
  response: z.string(),
  kind: 'file',
})
