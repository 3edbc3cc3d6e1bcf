import { endpoints } from '#shared/contracts/all.ts'
import { createAccount } from '#shared/contracts/account.ts'
import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import * as table from '#shared/contracts/table.ts'
import { paths } from '#src/app/paths.ts'
import type { TestApp } from './app.ts'
import { listen, visitRecorded, type RecordedVisitor } from './recorder.ts'

/** Words that stand nowhere but in this round's units. */
export const markers = [
  'Zyxmaker',
  'Qwovunit',
  'Vexmaker',
  'Jubbunit',
  'Fripmaker',
  'Snarkunit',
  '7654321',
  'zorkprice',
]

export type OrganiserAs = 'keeper' | 'steward' | 'panelist'

/** An evening whose organiser holds `as` beside organising. */
function draftFor(as: OrganiserAs): EveningDraftInput {
  const others = ['Bram', 'Cleo', 'Dario'].map((name) => ({
    name,
    listens: true,
    steward: as !== 'steward' && name === 'Bram',
  }))
  const keeper = { name: 'Kaat', listens: false, duty: 'keeper' as const }
  const you = {
    name: 'Ines Falk',
    you: true,
    listens: as === 'panelist',
    steward: as === 'steward',
    duty: as === 'keeper' ? ('keeper' as const) : ('none' as const),
  }
  return {
    title: 'Three in the dark',
    question: 'Which one stays?',
    units: [
      { maker: 'Zyxmaker', name: 'Qwovunit' },
      { maker: 'Vexmaker', name: 'Jubbunit' },
      { maker: 'Fripmaker', name: 'Snarkunit' },
    ],
    people: as === 'keeper' ? [you, ...others] : [you, keeper, ...others],
    scorecard: ['warmth'],
    tracks: ['Harbour bells'],
    levelMatching: 'measured',
    hiding: 'Sleeves',
    tagging: 'keeper',
  }
}

export interface BlindEvening {
  organiser: RecordedVisitor
  steward: RecordedVisitor
  panelist: RecordedVisitor
  /** Ids and codes of the round, read behind the application's back. */
  unitIds: string[]
  codes: string[]
  inner: string[]
  mails: string[]
}

/** Opens an evening, lets `between` work on the tables, plays a turn and a half, and sweeps every address as everybody. */
export async function blindEvening(
  app: TestApp,
  as: OrganiserAs,
  between: (round: string) => Promise<void> = async () => undefined,
): Promise<BlindEvening> {
  const organiser = visitRecorded(app.url)
  const me = await organiser.call(createAccount, {
    body: {
      name: 'Ines Falk',
      email: `ines-${as}@example.org`,
      password: 'three quiet herons',
      panelName: 'Quayside',
    },
  })
  const panel = me.panels[0]?.slug ?? ''
  const made = await organiser.call(rounds.createEvening, { params: { panel }, body: draftFor(as) })
  await priceAll(app)
  const opened = await organiser.call(rounds.openRound, {
    params: { panel, round: made.id },
    version: made.version,
  })
  const at = { panel, round: opened.id, sitting: opened.sittingId ?? '' }
  await between(opened.id)
  const { handovers } = await organiser.call(rounds.listHandovers, { params: at })
  const seatLinks = handovers.filter((one) => one.what === 'seat')
  const stewardLink = handovers.find((one) => one.label.startsWith('Steward'))
  const join = async (visitor: RecordedVisitor, url: string | undefined) =>
    visitor.call(seats.join, { params: { token: url?.split('/').at(-1) ?? '' } })
  const sitting = [...seatLinks.filter((one) => one.label !== 'Ines Falk')]
  const listeners: { visitor: RecordedVisitor; seat: string }[] = []
  for (const link of sitting) {
    const visitor = visitRecorded(app.url)
    await join(visitor, link.url)
    await visitor.call(seats.giveConsent, {
      params: { seat: link.id },
      body: { version: seats.consentVersion, adult: true },
    })
    listeners.push({ visitor, seat: link.id })
  }
  const own = seatLinks.find((one) => one.label === 'Ines Falk')
  if (own)
    await organiser.call(seats.giveConsent, {
      params: { seat: own.id },
      body: { version: seats.consentVersion, adult: true },
    })
  const steward = as === 'steward' ? organiser : visitRecorded(app.url)
  if (as !== 'steward') await join(steward, stewardLink?.url)
  const panelist = listeners.at(-1) as (typeof listeners)[number]
  const inner = await innerIds(app, opened.id)
  const streams = [
    await listen(panelist.visitor, `/api/seats/${panelist.seat}/events`),
    await listen(steward, `/api/panels/${panel}/rounds/${at.round}/events`),
  ]
  await sweep([organiser, steward, panelist.visitor], { ...at, seat: panelist.seat, ...inner })
  let state = await steward.call(table.nextTurn, { params: at, body: { from: 0 } })
  for (const { visitor, seat } of listeners) {
    const held = state.seats.find((one) => one.id === seat)?.serving
    if (held?.state !== 'handed') continue
    const params = { seat, serving: held.id }
    await visitor
      .call(seats.confirmCode, { params, body: { code: '987' === held.code ? '986' : '987' } })
      .catch(() => undefined)
    await visitor.call(seats.confirmCode, { params, body: { code: held.code } })
    await visitor.call(seats.checkSeal, { params, body: { sealed: 'yes' } })
    const answers = ['overall-liking', 'warmth'].map((descriptor) => ({
      descriptor,
      value: 50,
      cantTell: false,
    }))
    await visitor.call(seats.submitRatings, {
      params,
      body: { answers, remark: 'quiet' },
      idempotencyKey: `key-${held.code}-${seat}`,
    })
  }
  await sweep([organiser, steward, panelist.visitor], { ...at, seat: panelist.seat, ...inner })
  state = await steward.call(table.nextTurn, { params: at, body: { from: 1 } })
  const toVoid = state.seats.find((one) => one.serving?.state === 'handed')?.serving
  if (toVoid)
    await steward.call(table.voidServing, {
      params: at,
      body: { serving: toVoid.id, version: toVoid.version, reason: 'Dropped' },
    })
  await steward.call(table.addListener, { params: at, body: { name: 'Late Lena' } })
  await steward.call(table.reportIncident, { params: at, body: { kind: 'other', text: 'A door slammed' } })
  await sweep([organiser, steward, panelist.visitor], { ...at, seat: panelist.seat, ...inner })
  await panelist.visitor.call(seats.leaveSeat, { params: { seat: panelist.seat } })
  for (const stream of streams) await stream.stop()
  await app.runJobs()
  const mails = app.sent.map(
    (message) => `${message.to}\n${message.subject}\n${message.text}\n${message.html ?? ''}`,
  )
  return {
    organiser,
    steward,
    panelist: panelist.visitor,
    unitIds: inner.units,
    codes: inner.codes,
    inner: inner.all,
    mails,
  }
}

const rowsOf = async <T>(app: TestApp, sql: string): Promise<T[]> => (await app.owner.query(sql))[0] as T[]

/** A price and a photograph's id are marks of a unit too. */
async function priceAll(app: TestApp): Promise<void> {
  await app.owner.query(
    `update units set price_minor = 7654321, price_currency = 'EUR', price_on = '2031-01-01', lender = 'zorkprice', disclosure = 'zorkprice'`,
  )
}

async function innerIds(app: TestApp, round: string) {
  const ids = async (sql: string): Promise<string[]> =>
    (await rowsOf<{ id: string }>(app, sql)).map((one) => one.id)
  const units = await ids(`select unit_id as id from round_units where round_id = '${round}'`)
  const codes = await ids(
    `select p.code as id from row_places p join rows w on w.id = p.row_id where w.round_id = '${round}'`,
  )
  const all = [
    ...(await ids(`select id from rows where round_id = '${round}'`)),
    ...(await ids(`select id from seats where round_id = '${round}'`)),
    ...(await ids(
      `select v.id from servings v join seats s on s.id = v.seat_id where s.round_id = '${round}'`,
    )),
    ...(await ids(
      `select p.id from row_places p join rows w on w.id = p.row_id where w.round_id = '${round}'`,
    )),
  ]
  return { units, codes, all }
}

/** Every GET endpoint of the contract list and every page, as each of these browsers. */
async function sweep(
  visitors: readonly RecordedVisitor[],
  known: { panel: string; round: string; sitting: string; seat: string; units: string[]; all: string[] },
): Promise<void> {
  const values: Record<string, string> = {
    panel: known.panel,
    round: known.round,
    sitting: known.sitting,
    seat: known.seat,
    unit: known.units[0] ?? '',
    photo: randomUUIDLike,
    slug: 'none-1',
    file: 'key.json',
    token: 'no-such-token',
    link: known.seat,
    serving: known.all[0] ?? '',
    number: '1',
  }
  const fill = (path: string): string =>
    path.replace(/:([a-z]\w*)/gi, (_, name: string) => values[name] ?? 'x')
  const addresses = [
    ...endpoints.filter((one) => one.method === 'GET' && one.kind !== 'events').map((one) => fill(one.path)),
    ...Object.values(paths).map((path) => fill(path.pattern)),
    '/api/openapi.json',
  ]
  for (const visitor of new Set(visitors))
    for (const address of addresses)
      await visitor.fetch(address, {
        headers: { Accept: address.startsWith('/api') ? 'application/json' : 'text/html' },
      })
}
const randomUUIDLike = '11111111-1111-4111-8111-111111111111'
