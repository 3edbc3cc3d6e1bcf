import { randomUUID } from 'node:crypto'
import sharp from 'sharp'
import * as account from '#shared/contracts/account.ts'
import * as analysis from '#shared/contracts/analysis.ts'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import * as imports from '#shared/contracts/imports.ts'
import * as panels from '#shared/contracts/panels.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import * as table from '#shared/contracts/table.ts'
import * as tags from '#shared/contracts/tags.ts'
import * as verdicts from '#shared/contracts/verdicts.ts'
import { browserOf, deskOf, eveningFor, inHand, roundVersion } from './permission-world.ts'
import { factsOfUnit } from './publishing.ts'
import type { Actor, Phase, World } from './permission-world.ts'

export interface Asked {
  parts?: Record<string, string>
  body?: unknown
  version?: number
}
export interface Row {
  endpoint: Endpoint
  phase: Phase
  /** One status an actor, in the order of `actors`. */
  statuses: readonly number[]
  ask(world: World, actor: Actor): Asked | Promise<Asked>
}

type Ask = Row['ask']
/** nobody, stranger, panelist, steward, keeper, organiser */
type Statuses = readonly [number, number, number, number, number, number]
const row = (endpoint: Endpoint, phase: Phase, statuses: Statuses, ask: Ask = () => ({})): Row => ({
  endpoint,
  phase,
  statuses,
  ask,
})
const all = (status: number): Statuses => [status, status, status, status, status, status]
const says =
  (body: unknown): Ask =>
  () => ({ body })

const signedIn: Statuses = [401, 200, 401, 401, 401, 200]
const ofPanel: Statuses = [401, 404, 401, 401, 401, 200]
const ofRound: Statuses = [404, 404, 200, 200, 200, 200]
const ofDraft: Statuses = [404, 404, 404, 404, 404, 200]
const watching: Statuses = [404, 404, 403, 200, 200, 200]
const handingOut: Statuses = [404, 404, 403, 200, 403, 200]
const stewarding: Statuses = [404, 404, 403, 200, 403, 403]
const tagging: Statuses = [404, 404, 403, 403, 200, 403]
const organising: Statuses = [404, 404, 403, 403, 403, 200]
const frozen: Statuses = [404, 404, 403, 403, 403, 409]
const notNow: Statuses = [404, 404, 403, 403, 403, 403]
const sitting: Statuses = [404, 404, 200, 404, 404, 404]
const sittingNotNow: Statuses = [404, 404, 403, 404, 404, 404]

const ratingsFile = 'panelist,unit,descriptor,score\na,x,Width,10\na,y,Width,60\nb,x,Width,20\nb,y,Width,50\n'
export const oldSheet = { title: 'An old sheet', question: 'Which was wider?', text: ratingsFile }
const another = eveningFor(['Wren', 'Robin', 'Siskin'])
const editOf =
  (which: (world: World) => string, body?: unknown): Ask =>
  async (world) => ({ version: await roundVersion(world, which(world)), body })
const open = (world: World) => world.evening.round
const draft = (world: World) => world.draft
const toCancel = (world: World) => world.toCancel.round
const neighbour = (world: World) => world.evening.listeners[1]?.seat ?? ''
const self = (world: World) => world.evening.listeners[0]?.seat ?? ''
const firstUnit = async (world: World) => {
  const unit = (await deskOf(world)).units[0]
  return {
    parts: { unit: unit?.id ?? '', photo: unit?.photo?.id ?? randomUUID() },
    version: unit?.version ?? 0,
  }
}
const holding =
  (body: (code: string) => unknown): Ask =>
  async (world) => {
    const { id, code } = await inHand(world, 0)
    return { parts: { serving: id }, body: body(code) }
  }
const answers = ['overall-liking', 'warmth'].map((descriptor) => ({ descriptor, value: 50, cantTell: false }))
const newPassword = 'five loud terns'
const picture: Ask = async (world) => {
  const bytes = await sharp({ create: { width: 4, height: 3, channels: 3, background: 'teal' } })
    .png()
    .toBuffer()
  const body = new FormData()
  body.append('photo', new Blob([new Uint8Array(bytes)], { type: 'image/png' }), 'unit.png')
  return { ...(await firstUnit(world)), body }
}
const published: Ask = async (world) => ({
  parts: { slug: (await deskOf(world)).published?.slug ?? 'none-1' },
})
const voiding: Ask = async (world) => {
  const { id, version } = await inHand(world, 1)
  return { body: { serving: id, version, reason: 'Dropped' } }
}
const pouch: Ask = async ({ browsers, evening }) => {
  const shown = await browsers.keeper.call(tags.getTags, { params: evening.at })
  return { body: { serving: shown.part === 'keeper' ? shown.pouches[0]?.serving : '' } }
}

/** Who gets what from every endpoint; rows of a phase are tried from the top, and each row by the least entitled first. */
export const permissions: readonly Row[] = [
  row(account.getMe, 'open', all(200)),
  row(account.renameAccount, 'open', signedIn, async (world, actor) => {
    const { user } = await browserOf(world, actor).call(account.getMe)
    return { version: user?.version ?? 1, body: { name: user?.name ?? 'Nobody' } }
  }),
  row(account.askReset, 'open', all(200), says({ email: 'somebody@example.org' })),
  row(account.useReset, 'open', all(404), says({ password: newPassword })),
  row(account.getMailbox, 'open', all(200)),

  row(panels.getPanel, 'open', ofPanel),
  row(panels.changePanel, 'open', ofPanel, async ({ browsers, panel }) => {
    const { version, name, timeZone } = await browsers.organiser.call(panels.getPanel, { params: { panel } })
    return { version, body: { name, timeZone } }
  }),
  row(panels.listRounds, 'open', ofPanel),
  row(panels.listUnits, 'open', ofPanel),
  row(panels.listMembers, 'open', ofPanel),
  row(imports.previewImport, 'open', ofPanel, says({ text: ratingsFile })),
  row(imports.storeImport, 'open', ofPanel, says(oldSheet)),

  row(rounds.createEvening, 'draft', ofPanel, says(another)),
  row(rounds.getRound, 'draft', ofDraft),
  row(rounds.getPublicRound, 'draft', all(404)),
  row(rounds.listHandovers, 'draft', [404, 404, 404, 404, 404, 403]),
  row(analysis.getAgreement, 'draft', [404, 404, 404, 404, 404, 403]),
  row(rounds.changeEvening, 'draft', ofDraft, editOf(draft, another)),
  row(rounds.openRound, 'draft', ofDraft, editOf(draft)),
  row(rounds.getRound, 'open', ofRound),
  row(rounds.getPublicRound, 'open', all(200)),
  row(rounds.getRoundFile, 'open', all(404)),
  row(rounds.changeEvening, 'open', frozen, editOf(open, another)),
  row(rounds.openRound, 'open', frozen, editOf(open)),
  row(rounds.draftAgain, 'open', notNow),
  row(rounds.getProgress, 'open', watching),
  row(rounds.roundEvents, 'open', watching),
  row(rounds.listHandovers, 'open', handingOut),
  row(rounds.renewLink, 'open', handingOut, (world) => ({ parts: { link: self(world) } })),
  row(seats.answerEnd, 'played', sitting, says({ recognised: 'none', recognitions: [] })),
  row(rounds.closeRound, 'played', organising, async (world) => ({
    version: await roundVersion(world, open(world)),
    body: { evenIfOut: true },
  })),
  row(rounds.getRound, 'closed', ofRound),
  row(rounds.closeRound, 'closed', notNow, editOf(open, {})),
  row(rounds.cancelRound, 'closed', notNow, editOf(open, { reason: 'Too late' })),
  row(rounds.listHandovers, 'closed', notNow),
  row(rounds.renewLink, 'closed', notNow, (world) => ({ parts: { link: self(world) } })),
  row(rounds.cancelRound, 'cancelled', organising, editOf(toCancel, { reason: 'The cable broke' })),
  row(rounds.getRound, 'cancelled', ofRound),
  row(rounds.getPublicRound, 'cancelled', all(200)),
  row(rounds.getRoundFile, 'cancelled', all(200)),
  row(rounds.draftAgain, 'cancelled', organising),
  row(analysis.getAgreement, 'cancelled', notNow),

  row(tags.getTags, 'open', tagging),
  row(tags.markTagged, 'open', tagging, pouch),
  row(table.getTable, 'open', stewarding),
  row(table.nextTurn, 'open', stewarding, says({ from: 0 })),

  row(seats.join, 'open', all(404)),
  // The key's link opens once: whoever comes after its keeper is told, and gets nothing.
  row(seats.join, 'open', [403, 403, 403, 403, 200, 403], ({ tokens }) => ({
    parts: { token: tokens.keeper },
  })),
  row(seats.getSeat, 'open', sitting),
  row(seats.seatEvents, 'open', sitting),
  row(seats.giveConsent, 'open', sitting, says({ version: seats.consentVersion, adult: true })),
  row(
    seats.confirmCode,
    'open',
    sitting,
    holding((code) => ({ code })),
  ),
  row(
    seats.checkSeal,
    'open',
    sitting,
    holding(() => ({ sealed: 'yes' })),
  ),
  row(
    seats.submitRatings,
    'open',
    sitting,
    holding(() => ({ answers })),
  ),
  row(seats.getSeatReport, 'open', sittingNotNow),
  row(seats.leaveSeat, 'open', sitting),

  row(table.seatReturns, 'open', stewarding, (world) => ({ body: { seat: self(world) } })),
  row(table.voidServing, 'open', stewarding, voiding),
  row(table.seatLeaves, 'open', stewarding, (world) => ({ body: { seat: neighbour(world) } })),
  row(table.seatReturns, 'open', stewarding, (world) => ({ body: { seat: neighbour(world) } })),
  row(table.addListener, 'open', stewarding, says({ name: 'Late Lena' })),
  row(table.reportIncident, 'open', stewarding, says({ kind: 'other', text: 'A door slammed' })),
  row(table.getTable, 'closed', notNow),
  row(tags.getTags, 'closed', notNow),

  row(analysis.getAgreement, 'open', notNow),
  row(analysis.getReveal, 'open', notNow),
  row(verdicts.getVerdictDraft, 'open', notNow),
  row(verdicts.saveVerdict, 'open', notNow, says({ headline: 'Early', summary: '' })),
  row(verdicts.saveUnitFacts, 'open', notNow, says(factsOfUnit)),
  row(verdicts.publishVerdict, 'open', notNow, says({})),
  row(verdicts.getVerdict, 'open', all(404)),
  row(verdicts.getVerdictFile, 'open', all(404)),
  row(seats.getSeatReport, 'closed', sitting),
  row(analysis.getAgreement, 'closed', organising),
  row(analysis.getReveal, 'closed', ofRound),
  row(verdicts.getVerdictDraft, 'closed', organising),
  row(verdicts.saveVerdict, 'closed', organising, async (world) => ({
    version: (await deskOf(world)).version,
    body: { headline: 'Three waders', summary: '' },
  })),
  row(verdicts.saveUnitFacts, 'closed', organising, async (world) => ({
    ...(await firstUnit(world)),
    body: factsOfUnit,
  })),
  row(verdicts.putPhoto, 'closed', organising, picture),
  row(verdicts.getPhoto, 'closed', ofDraft, firstUnit),
  row(verdicts.removePhoto, 'closed', organising, firstUnit),
  row(verdicts.putPhoto, 'closed', organising, picture),
  row(verdicts.publishVerdict, 'published', organising, says({})),
  row(verdicts.getPhoto, 'published', all(200), firstUnit),
  row(verdicts.listVerdicts, 'published', all(200)),
  row(verdicts.getVerdict, 'published', all(200), published),
  row(verdicts.getVerdictFile, 'published', all(200), published),

  row(seats.forgetSeat, 'leaving', sitting),
  // The keeper alone may never sit at the table whose key they know.
  row(seats.join, 'leaving', [200, 200, 200, 200, 403, 200], ({ tokens }) => ({
    parts: { token: tokens.seat },
  })),
  row(
    account.replacePassword,
    'leaving',
    signedIn,
    says({ current: 'three quiet herons', next: newPassword }),
  ),
  row(account.endSession, 'leaving', all(200), says({})),
  row(account.createSession, 'leaving', all(200), ({ spare }) => ({ body: spare })),
  row(account.createAccount, 'leaving', all(200), () => ({
    body: { name: 'New', email: `${randomUUID()}@example.org`, password: newPassword, panelName: 'New pier' },
  })),
]
