import { randomUUID } from 'node:crypto'
import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import * as rounds from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import { addListener, getTable } from '#shared/contracts/table.ts'
import { getVerdict } from '#shared/contracts/verdicts.ts'
import { paths, type PathName } from '#src/app/paths.ts'
import { faultsOf } from '#tests/support/accessibility.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { useBrowser, type Screen } from '#tests/support/browser.ts'
import { anEvening, goOn, openEvening, playAll, signUpOrganiser } from '#tests/support/evening.ts'
import { publishEvening } from '#tests/support/publishing.ts'
import { takeSession } from '#tests/support/signed-in.ts'
import { visit, type Visitor } from '#tests/support/visitor.ts'

const browser = useBrowser()
const within = { timeout: 60_000 }
let app: TestApp

type Person = 'reader' | 'organiser' | 'steward' | 'keeper' | 'entering' | 'rating' | 'latecomer' | 'finished'
const browsers = {} as Record<Exclude<Person, 'reader'>, Visitor>
/** What addresses are filled with, by the name of their part; `playing` is an open round, `past` a published one. */
const known = {
  panel: '',
  draft: '',
  playing: '',
  past: '',
  sitting: '',
  slug: '',
  number: '',
  seats: { entering: '', rating: '', latecomer: '', finished: '' },
}

const listener = (name: string, steward = false) => ({ name, listens: true, steward })
const people = [
  { name: 'Ines Falk', listens: false, you: true },
  { name: 'Kaat', listens: false, duty: 'keeper' as const },
  listener('Bram', true),
  ...['Cleo', 'Dario', 'Edda', 'Finn', 'Gerd'].map((name) => listener(name)),
]
const draftOf = (title: string) => anEvening({ title, people })

beforeAll(async () => {
  app = await startApp({ pages: true })
  const organiserOf = await signUpOrganiser(app.url, 'The Quayside Bench')
  const { visitor: organiser, panel } = organiserOf
  const past = await openEvening(app.url, draftOf('Four small ones'), organiserOf)
  await playAll(past)
  const slug = await publishEvening(past)
  const draft = await organiser.call(rounds.createEvening, {
    params: { panel },
    body: draftOf('Still being written'),
    idempotencyKey: randomUUID(),
  })
  const playing = await openEvening(app.url, draftOf('Tonight'), organiserOf)
  const links = async () =>
    (await organiser.call(rounds.listHandovers, { params: { panel, round: playing.round } })).handovers
  const keeper = visit(app.url)
  const joinBy = async (visitor: Visitor, label: string) => {
    const link = (await links()).find((one) => one.label.startsWith(label))
    await visitor.call(seats.join, { params: { token: link?.url.split('/').at(-1) ?? '' } })
    return link?.id ?? ''
  }
  await joinBy(keeper, 'Code keeper')
  const latecomer = visit(app.url)
  await playing.steward.call(addListener, {
    params: playing.at,
    body: { name: 'Hanne' },
    idempotencyKey: randomUUID(),
  })
  known.seats.latecomer = await joinBy(latecomer, 'Hanne')
  await goOn(playing)
  const shown = await playing.steward.call(getTable, { params: playing.at })
  const holding = playing.listeners.filter(({ seat, label }) => {
    const held = shown.seats.find((one) => one.id === seat)?.serving
    return label !== 'Bram' && held?.state === 'handed'
  })
  const [entering, rating] = holding as [(typeof holding)[0], (typeof holding)[0]]
  const held = shown.seats.find((one) => one.id === rating.seat)?.serving
  const params = { seat: rating.seat, serving: held?.id ?? '' }
  await rating.visitor.call(seats.confirmCode, { params, body: { code: held?.code ?? '' } })
  await rating.visitor.call(seats.checkSeal, { params, body: { sealed: 'yes' } })
  const finished = past.listeners[1] as (typeof past.listeners)[0]
  Object.assign(known.seats, { entering: entering.seat, rating: rating.seat, finished: finished.seat })
  const { number } = await organiser.call(getVerdict, { params: { slug } })
  Object.assign(known, {
    panel,
    slug,
    number: String(number),
    draft: draft.id,
    playing: playing.round,
    past: past.round,
    sitting: playing.sitting,
  })
  Object.assign(browsers, {
    organiser,
    keeper,
    latecomer,
    steward: playing.steward,
    entering: entering.visitor,
    rating: rating.visitor,
    finished: finished.visitor,
  })
}, 300_000)
afterAll(() => app.close())

interface Stop {
  as: Person
  /** The heading that the page has once its data is there. */
  heading: string | RegExp
  /** Something else that comes with the data, where the heading stands before it. */
  text?: string | RegExp
  round?: () => string
  note?: string
  allow?: RegExp
}
const playing = () => known.playing
const past = () => known.past
const draft = () => known.draft
const headline = 'Small ones, heard on one evening'

/** Every address, as who opens it; a page with several faces has several stops. */
const stops: Record<PathName, readonly Stop[]> = {
  home: [{ as: 'reader', heading: 'Verdicts', text: headline }],
  how: [{ as: 'reader', heading: /Several people listen/ }],
  verdict: [{ as: 'reader', heading: headline }],
  verdictNumber: [{ as: 'reader', heading: headline }],
  publicRound: [{ as: 'reader', heading: 'Tonight', round: playing }],
  signIn: [{ as: 'reader', heading: 'Sign in' }],
  signUp: [{ as: 'reader', heading: 'Create an account and a panel' }],
  forgot: [{ as: 'reader', heading: 'Choose a new password' }],
  reset: [{ as: 'reader', heading: 'Choose a new password' }],
  // A link that works goes on to the seat at once: what stays at this address is one that does not.
  join: [{ as: 'reader', heading: 'This link does not work any more', allow: /status of 404/ }],
  seat: [
    { as: 'latecomer', heading: /./, note: 'before taking part' },
    { as: 'entering', heading: 'Type the three digits on your pouch', note: 'digits' },
    { as: 'rating', heading: 'First, as a whole', note: 'rating' },
    { as: 'finished', heading: 'What you heard, beside the panel', note: 'own report' },
  ],
  account: [{ as: 'organiser', heading: 'Ines Falk' }],
  panel: [{ as: 'organiser', heading: 'The Quayside Bench', text: 'Tonight' }],
  units: [{ as: 'organiser', heading: 'Units', text: 'Dunlin' }],
  people: [{ as: 'organiser', heading: 'People', text: 'Cleo' }],
  settings: [{ as: 'organiser', heading: 'Settings' }],
  rounds: [{ as: 'organiser', heading: 'Rounds', text: 'Tonight' }],
  newRound: [{ as: 'organiser', heading: 'Start an evening' }],
  importRound: [{ as: 'organiser', heading: 'Bring ratings you already have' }],
  editRound: [{ as: 'organiser', heading: 'Change the evening', round: draft }],
  plan: [
    { as: 'organiser', heading: 'Still being written', round: draft, note: 'a draft' },
    { as: 'organiser', heading: 'Tonight', round: playing, note: 'an open round' },
  ],
  progress: [
    { as: 'organiser', heading: 'Tonight', round: playing, note: 'an open round' },
    { as: 'organiser', heading: 'Four small ones', round: past, note: 'a closed round' },
  ],
  links: [{ as: 'organiser', heading: 'Hand out the links', round: playing, text: 'Cleo' }],
  table: [{ as: 'steward', heading: 'Run sheet', round: playing }],
  tags: [{ as: 'keeper', heading: 'Tag the pouches', round: playing }],
  agreement: [{ as: 'organiser', heading: 'Four small ones', round: past, text: /Krippendorff/ }],
  reveal: [{ as: 'organiser', heading: 'Reveal: Four small ones', round: past }],
  publish: [{ as: 'organiser', heading: 'The published verdict', round: past }],
  mailbox: [{ as: 'reader', heading: 'Mailbox' }],
}

const screens = new Map<Person, Screen>()
async function screenOf(person: Person): Promise<Screen> {
  const made =
    screens.get(person) ?? (await browser.open({ baseURL: app.url, name: person, colorScheme: 'light' }))
  if (!screens.has(person) && person !== 'reader') await takeSession(made.context, app.url, browsers[person])
  screens.set(person, made)
  return made
}

function addressOf(name: PathName, stop: Stop): string {
  const seat = stop.as in known.seats ? known.seats[stop.as as keyof typeof known.seats] : ''
  const { panel, sitting, slug, number } = known
  const values = {
    panel,
    sitting,
    slug,
    number,
    seat,
    round: stop.round?.() ?? '',
    token: 'no-such-token-at-all',
  }
  return paths[name].pattern.replace(/:(\w+)/g, (_, part: keyof typeof values) => values[part])
}

const background = (page: Page): Promise<string> =>
  page.evaluate(() => getComputedStyle(document.body).backgroundColor)

describe('every address', () => {
  it('has a stop in this table', () => {
    for (const name of Object.keys(paths) as PathName[]) expect(stops[name]?.length, name).toBeGreaterThan(0)
  })

  const all = (Object.keys(paths) as PathName[]).flatMap((name) =>
    (stops[name] ?? []).map(
      (stop) => [`${name}${stop.note ? `, ${stop.note}` : ''}, as ${stop.as}`, name, stop] as const,
    ),
  )
  it.each(all)('has nothing for axe to find, in light and at dusk: %s', async (_title, name, stop) => {
    const { page, allow } = await screenOf(stop.as)
    if (stop.allow) allow(stop.allow)
    await page.emulateMedia({ colorScheme: 'light' })
    await page.goto(addressOf(name, stop))
    await page.getByRole('heading', { level: 1, name: stop.heading }).waitFor(within)
    if (stop.text) await page.getByRole('main').getByText(stop.text).first().waitFor(within)
    expect(await page.getByRole('link').first().getAttribute('href'), 'the first link').toBe('#matter')
    expect(await page.locator('main#matter').count(), 'where it leads').toBe(1)
    expect(await faultsOf(page), 'light').toEqual([])
    const light = await background(page)
    await page.emulateMedia({ colorScheme: 'dark' })
    // The reveal is dusk in both.
    if (name !== 'reveal') await expect.poll(() => background(page), within).not.toBe(light)
    expect(await faultsOf(page), 'dusk').toEqual([])
  })
})
