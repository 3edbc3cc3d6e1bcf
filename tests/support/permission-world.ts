import { randomUUID } from 'node:crypto'
import { createAccount } from '#shared/contracts/account.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import { getTable } from '#shared/contracts/table.ts'
import { getVerdictDraft, type VerdictDraft } from '#shared/contracts/verdicts.ts'
import { anEvening, openEvening, playAll, signUpOrganiser, type OpenEvening } from './evening.ts'
import { fillDesk } from './publishing.ts'
import { visit, type Visitor } from './visitor.ts'

/** In the order of the table's columns. The stranger runs another panel; the last three but one came by links. */
export const actors = ['nobody', 'stranger', 'panelist', 'steward', 'keeper', 'organiser'] as const
export type Actor = (typeof actors)[number]

/** What the round has come to when a row of the table is tried, in the order in which it comes. */
export const phases = ['draft', 'open', 'played', 'closed', 'published', 'cancelled', 'leaving'] as const
export type Phase = (typeof phases)[number]

export interface World {
  url: string
  panel: string
  evening: OpenEvening
  draft: string
  toCancel: OpenEvening
  /** Another panel with an open evening of its own. */
  elsewhere: OpenEvening
  browsers: Record<Exclude<Actor, 'nobody'>, Visitor>
  /** Links that were handed out while the round was open. */
  tokens: { seat: string; keeper: string }
  /** An account that none of the actors uses otherwise. */
  spare: { email: string; password: string }
}

/** A third person keeps the key, a fourth stewards: nobody holds two parts. */
const people = [
  { name: 'Ines Falk', listens: false, you: true },
  { name: 'Kaat', listens: false, duty: 'keeper' as const },
  { name: 'Sten', listens: false, steward: true },
  { name: 'Bram', listens: true },
  { name: 'Cleo', listens: true },
]
export const eveningFor = (names: readonly string[]) =>
  anEvening({ people, units: names.map((name) => ({ maker: `${name} works`, name })), scorecard: ['warmth'] })

const tokenOf = (link: { url: string } | undefined): string => link?.url.split('/').at(-1) ?? ''
const names = ['Knot', 'Godwit', 'Dunlin']

/** Finds a link of this round by the beginning of its label: a listener's name, "Steward", "Code keeper". */
async function linksOf(evening: OpenEvening): Promise<(label: string) => string> {
  const { handovers } = await evening.organiser.call(rounds.listHandovers, { params: evening.at })
  return (label) => tokenOf(handovers.find((one) => one.label.startsWith(label)))
}

export async function buildWorld(url: string): Promise<World> {
  const organiserOf = await signUpOrganiser(url)
  const { visitor: organiser, panel } = organiserOf
  const evening = await openEvening(url, eveningFor(names), organiserOf)
  const toCancel = await openEvening(url, eveningFor(['Ruff', 'Stint', 'Snipe']), organiserOf)
  const made = await organiser.call(rounds.createEvening, {
    params: { panel },
    body: eveningFor(['Curlew', 'Plover', 'Sanderling']),
    idempotencyKey: randomUUID(),
  })
  const elsewhere = await openEvening(url, eveningFor(names))
  const [panelist, neighbour] = evening.listeners.map((one) => one.visitor) as [Visitor, Visitor]
  const keeper = visit(url)
  const [here, there] = [await linksOf(evening), await linksOf(toCancel)]
  const tokens = { seat: here(evening.listeners[1]?.label ?? ''), keeper: here('Code keeper') }
  await keeper.call(seats.join, { params: { token: tokens.keeper } })
  // Each holds the same part in the round that will be cancelled.
  for (const [visitor, label] of [
    [panelist, 'Bram'],
    [neighbour, 'Cleo'],
    [evening.steward, 'Steward'],
    [keeper, 'Code keeper'],
  ] as const)
    await visitor.call(seats.join, { params: { token: there(label) } })
  const spare = { email: 'ruta@example.org', password: 'a boat in the fog' }
  await visit(url).call(createAccount, { body: { ...spare, name: 'Ruta Vint', panelName: 'North Pier' } })
  const browsers = { stranger: elsewhere.organiser, panelist, steward: evening.steward, keeper, organiser }
  return { url, panel, evening, draft: made.id, toCancel, elsewhere, browsers, tokens, spare }
}

export const browserOf = (world: World, actor: Actor): Visitor =>
  actor === 'nobody' ? visit(world.url) : world.browsers[actor]

/** Parts of addresses: the round of this phase, the panelist's seat, ids of nothing where a row gives no other. */
export function partsAt(world: World, phase: Phase): Record<string, string> {
  const { evening, toCancel, draft, panel } = world
  const at = phase === 'cancelled' ? toCancel.at : evening.at
  const nothing = Object.fromEntries(
    ['serving', 'unit', 'photo', 'token', 'link'].map((name) => [name, randomUUID()]),
  )
  return {
    ...nothing,
    slug: 'no-such-verdict-1',
    file: 'plan.json',
    ...at,
    panel,
    seat: evening.listeners[0]?.seat ?? '',
    ...(phase === 'draft' ? { round: draft } : {}),
  }
}

export const roundVersion = async ({ browsers, panel }: World, round: string): Promise<number> =>
  (await browsers.organiser.call(rounds.getRound, { params: { panel, round } })).version

/** The serving that this listener holds now, as the steward reads it. */
export async function inHand({ evening }: World, listener: number) {
  const shown = await evening.steward.call(getTable, { params: evening.at })
  const serving = shown.seats.find((one) => one.id === evening.listeners[listener]?.seat)?.serving
  if (!serving) throw new Error('this listener holds nothing now')
  return serving
}

export const deskOf = ({ browsers, evening }: World): Promise<VerdictDraft> =>
  browsers.organiser.call(getVerdictDraft, { params: { panel: evening.panel, round: evening.round } })

/** What must have happened before the rows of a phase are tried. */
export const prepare: Partial<Record<Phase, (world: World) => Promise<void>>> = {
  played: ({ evening }) => playAll(evening),
  published: ({ browsers, evening }) => fillDesk(browsers.organiser, evening.at),
}
