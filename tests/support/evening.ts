import { randomUUID } from 'node:crypto'
import { createAccount } from '#shared/contracts/account.ts'
import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import * as table from '#shared/contracts/table.ts'
import { visit, type Visitor } from './visitor.ts'

/** An evening of four units and five listeners; the organiser keeps the key, the first listener stewards. */
export function anEvening(change: Partial<EveningDraftInput> = {}): EveningDraftInput {
  const listener = (name: string, steward = false) => ({ name, listens: true, steward })
  return {
    title: 'Four small ones',
    question: 'Which of these would we keep?',
    units: [
      { maker: 'Saltmarsh Audio', name: 'Tern One' },
      { maker: 'Lantern Reed', name: 'Dunlin' },
      { maker: 'Saltmarsh Audio', name: 'Whimbrel' },
      { maker: 'Eddy & Shoal', name: 'Avocet' },
    ],
    people: [
      { name: 'Ines Falk', listens: false, duty: 'keeper', you: true },
      listener('Bram', true),
      listener('Cleo'),
      listener('Dario'),
      listener('Edda'),
      listener('Finn'),
    ],
    scorecard: ['bass-amount', 'width'],
    tracks: ['Harbour bells, second minute'],
    levelMatching: 'by-ear',
    hiding: 'Black sleeves and the same cable',
    tagging: 'keeper',
    ...change,
  }
}

export interface OpenEvening {
  panel: string
  round: string
  sitting: string
  organiser: Visitor
  /** One browser a seat, in the order of seat numbers, consent given. */
  listeners: { visitor: Visitor; seat: string; label: string }[]
  /** The browser that holds the steward's duty: the organiser's where nobody else stewards by link. */
  steward: Visitor
  at: { panel: string; round: string; sitting: string }
}

/** Signs an organiser up, with an address of their own. */
export async function signUpOrganiser(
  url: string,
  panelName = `Bench ${randomUUID().slice(0, 8)}`,
): Promise<{ visitor: Visitor; panel: string }> {
  const visitor = visit(url)
  const me = await visitor.call(createAccount, {
    body: {
      name: 'Ines Falk',
      email: `ines-${randomUUID()}@example.org`,
      password: 'three quiet herons',
      panelName,
    },
  })
  return { visitor, panel: me.panels[0]?.slug ?? '' }
}

/** Drafts and opens an evening and seats everybody. */
export async function openEvening(
  url: string,
  draft = anEvening(),
  organiserOf?: { visitor: Visitor; panel: string },
): Promise<OpenEvening> {
  const { visitor: organiser, panel } = organiserOf ?? (await signUpOrganiser(url))
  const made = await organiser.call(rounds.createEvening, {
    params: { panel },
    body: draft,
    idempotencyKey: randomUUID(),
  })
  const opened = await organiser.call(rounds.openRound, {
    params: { panel, round: made.id },
    version: made.version,
  })
  const round = opened.id
  const { handovers } = await organiser.call(rounds.listHandovers, { params: { panel, round } })
  const listeners: OpenEvening['listeners'] = []
  for (const link of handovers.filter((one) => one.what === 'seat')) {
    const visitor = visit(url)
    await visitor.call(seats.join, { params: { token: link.url.split('/').at(-1) ?? '' } })
    await visitor.call(seats.giveConsent, {
      params: { seat: link.id },
      body: { version: seats.consentVersion, adult: true },
    })
    listeners.push({ visitor, seat: link.id, label: link.label })
  }
  const stewardLink = handovers.find((one) => one.what === 'duty' && one.label.startsWith('Steward'))
  const stewardName = stewardLink?.label.split(': ')[1]
  const steward =
    listeners.find((one) => one.label === stewardName)?.visitor ??
    (opened.you.roles.includes('steward') ? organiser : visit(url))
  if (stewardLink && steward !== organiser)
    await steward.call(seats.join, { params: { token: stewardLink.url.split('/').at(-1) ?? '' } })
  const sitting = opened.sittingId ?? ''
  return { panel, round, sitting, organiser, listeners, steward, at: { panel, round, sitting } }
}

/** Ratings that tell nothing of a unit: by seat, serving and line. */
export const anyValue = (seat: number, ordinal: number, line: number): number =>
  (seat * 17 + ordinal * 29 + line * 11) % 101

/** One listener rates what is in hand, the digits read off the steward's table; null where they hold nothing. */
export async function rateInHand(
  evening: OpenEvening,
  index: number,
  valueOf = anyValue,
  shown?: table.StewardTable,
): Promise<PanelistSeat | null> {
  const listener = evening.listeners[index]
  if (!listener) throw new RangeError('no such listener')
  const { visitor, seat } = listener
  const seen = shown ?? (await evening.steward.call(table.getTable, { params: evening.at }))
  const held = seen.seats.find((one) => one.id === seat)?.serving
  if (held?.state !== 'handed') return null
  const params = { seat, serving: held.id }
  await visitor.call(seats.confirmCode, { params, body: { code: held.code } })
  const { scorecard, serving } = await visitor.call(seats.checkSeal, { params, body: { sealed: 'yes' } })
  const answers = scorecard.map((descriptor, line) => ({
    descriptor: descriptor.key,
    value: valueOf(index, serving?.ordinal ?? 0, line),
    cantTell: false,
  }))
  const sent = await visitor.call(seats.submitRatings, {
    params,
    body: { answers, remark: '' },
    idempotencyKey: randomUUID(),
  })
  return sent.seat
}

/** "Next turn", from the turn the table is in. */
export async function goOn(evening: OpenEvening): Promise<table.StewardTable> {
  const now = await evening.steward.call(table.getTable, { params: evening.at })
  return evening.steward.call(table.nextTurn, { params: evening.at, body: { from: now.sitting.turn } })
}

/** Plays all turns with everybody rating, to the end questions. */
export async function playAll(evening: OpenEvening, valueOf = anyValue): Promise<void> {
  for (let state = await goOn(evening); !state.sitting.ended; state = await goOn(evening))
    await Promise.all(evening.listeners.map((_, index) => rateInHand(evening, index, valueOf, state)))
  for (const { visitor, seat } of evening.listeners)
    await visitor.call(seats.answerEnd, { params: { seat }, body: { recognised: 'none', recognitions: [] } })
}
