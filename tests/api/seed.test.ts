import { createHash } from 'node:crypto'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { seedDemo } from '#seeders/index.ts'
import { demoSlug } from '#seeders/panel.ts'
import { Analysis } from '#server/models/analysis.ts'
import { AuditEvent } from '#server/models/audit-event.ts'
import { Round } from '#server/models/round.ts'
import { Seat } from '#server/models/seat.ts'
import { Serving } from '#server/models/serving.ts'
import { Verdict } from '#server/models/verdict.ts'
import { inTransaction } from '#server/db/transaction.ts'
import * as account from '#shared/contracts/account.ts'
import { listRounds } from '#shared/contracts/panels.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import { getSeat, join } from '#shared/contracts/seats.ts'
import { getTable } from '#shared/contracts/table.ts'
import { getTags } from '#shared/contracts/tags.ts'
import { getVerdict, listVerdicts, type PublicVerdict } from '#shared/contracts/verdicts.ts'
import { demoSignIns } from '#shared/domain/demo-sign-ins.ts'
import { parseRatingsFile } from '#shared/domain/ratings-file.ts'
import { analyse } from '#shared/stats/analyse.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { standingClock } from '#tests/support/clock.ts'
import { visit, type Visitor } from '#tests/support/visitor.ts'

const six = 'six-small-ones-one-long-evening-4'
let app: TestApp
let again: TestApp
const clock = standingClock('2031-03-14T11:00:00Z')

beforeAll(async () => {
  app = await startApp({ clock })
  again = await startApp({ clock })
  await Promise.all([seedDemo(app.deps), seedDemo(again.deps)])
})
afterAll(() => Promise.all([app.close(), again.close()]))

const within = <T>(one: TestApp, work: () => Promise<T>): Promise<T> =>
  inTransaction(one.deps.sequelize, {}, work)

async function signedIn(place: number): Promise<Visitor> {
  const visitor = visit(app.url)
  const { email = '', password = '' } = demoSignIns[place] ?? {}
  await visitor.call(account.createSession, { body: { email, password } })
  return visitor
}

async function openEvening(visitor: Visitor): Promise<{ panel: string; round: string; sitting: string }> {
  const { rounds: all } = await visitor.call(listRounds, { params: { panel: demoSlug } })
  const open = all.find((one) => one.status === 'open')
  const at = { panel: demoSlug, round: open?.id ?? '' }
  const { sittingId } = await visitor.call(rounds.getRound, { params: at })
  return { ...at, sitting: sittingId ?? '' }
}

it('the demo holds a round in every state, an imported one and an informal one', async () => {
  const all = await within(app, () => Round.findAll())
  expect(new Set(all.map((one) => one.status))).toEqual(
    new Set(['draft', 'open', 'closed', 'published', 'cancelled']),
  )
  expect(all.filter((one) => one.origin === 'imported')).toHaveLength(1)
  const verdicts = await within(app, () => Verdict.findAll())
  expect(verdicts.map((one) => (one.content as PublicVerdict).label.words)).toContain('Informal')
})

it('a second start seeds nothing', async () => {
  const counted = () =>
    within(app, async () => [await Round.count(), await AuditEvent.count(), await Seat.count()])
  const before = await counted()
  await seedDemo(app.deps)
  expect(await counted()).toEqual(before)
})

it('two seedings on the same day give the same ids, draws and ratings', async () => {
  const facts = (one: TestApp) =>
    within(one, async () =>
      (await Round.findAll({ order: [['number', 'asc']] })).map((round) => [
        round.id,
        round.planFingerprint,
        round.keyFingerprint,
        round.ratingsFingerprint,
      ]),
    )
  expect(await facts(again)).toEqual(await facts(app))
})

it('the published files are the ones that were fingerprinted, and the published numbers follow from them', async () => {
  const reader = visit(app.url)
  const verdict = await reader.call(getVerdict, { params: { slug: six }, query: {} })
  const file = async (name: string) => (await reader.fetch(`/api/verdicts/${six}/files/${name}`)).text()
  const digest = (text: string) => createHash('sha256').update(text, 'utf8').digest('hex')
  expect(digest(await file('plan.json'))).toBe(verdict.fingerprints.plan)
  expect(digest(await file('key.json'))).toBe(verdict.fingerprints.key)
  const ratings = await file('ratings.csv')
  expect(digest(ratings)).toBe(verdict.fingerprints.ratings)

  const { rows, problems } = parseRatingsFile(ratings)
  expect(problems).toEqual([])
  const anew = analyse(rows, { seed: verdict.method.seed })
  for (const result of verdict.results) {
    const told = anew.descriptors[result.descriptor.name]
    for (const unit of result.units) expect(unit.adjusted?.mean).toBe(told?.units[unit.unit]?.adjustedMean)
  }
})

it('fourteen listeners agree on width and warmth, hardly on depth, and split in two on liking', async () => {
  const verdict = await visit(app.url).call(getVerdict, { params: { slug: six }, query: {} })
  const told = (name: string) => verdict.results.find((one) => one.descriptor.name === name)
  expect(verdict.method.listeners).toBe(14)
  expect(verdict.units).toHaveLength(6)
  for (const name of ['Width', 'Warmth'])
    expect(told(name)?.agreement.sentence).toBe('Listeners agree between well and as one')
  expect(told('Depth')?.agreement.sentence).toContain('Listeners hardly agree')
  const liked = told('Overall liking')?.units.find((one) => one.unit === 'Dunlin')
  const scores = (liked?.scores ?? []).map((one) => one.value).sort((a, b) => a - b)
  const gaps = scores.slice(1).map((score, index) => score - (scores[index] ?? 0))
  expect(Math.max(...gaps)).toBeGreaterThan(20)
  expect(told('Overall liking')?.sentence).toContain('No difference found')
})

it('every unit of a published round says who paid', async () => {
  const reader = visit(app.url)
  const { verdicts } = await reader.call(listVerdicts, {})
  expect(verdicts.length).toBeGreaterThanOrEqual(3)
  const { units } = await reader.call(getVerdict, { params: { slug: six }, query: {} })
  expect(new Set(units.map((one) => one.provenance))).toEqual(new Set(['bought', 'loan', 'gift']))
  for (const unit of units) {
    expect(unit.disclosure).not.toBe('')
    expect(unit.price?.on).toMatch(/^2031-0[12]-/)
    if (unit.provenance === 'loan') expect(unit.returnOn).toMatch(/^2031-0[34]-/)
  }
})

it('a visitor can organise, tag and steward the evening on the table, and sit in it by a link', async () => {
  const [ines, tomas, wanda] = [await signedIn(0), await signedIn(1), await signedIn(2)]
  const at = await openEvening(ines)
  const pouches = await tomas.call(getTags, { params: at })
  expect(pouches.part).toBe('keeper')
  const table = await wanda.call(getTable, { params: at })
  expect(table.sitting.turn).toBe(3)
  const states = table.seats.map((seat) => seat.serving?.state ?? 'rests')
  expect(states).toEqual(expect.arrayContaining(['submitted', 'confirmed', 'handed']))
  expect(table.seats.some((seat) => (seat.serving?.wrongCodes ?? 0) > 0)).toBe(true)

  const { handovers } = await ines.call(rounds.listHandovers, {
    params: { panel: at.panel, round: at.round },
  })
  const link = handovers.find((one) => one.what === 'seat' && !one.opened)
  const listener = visit(app.url)
  const { path } = await listener.call(join, { params: { token: link?.url.split('/').at(-1) ?? '' } })
  const seat = await listener.call(getSeat, { params: { seat: path.split('/').at(-1) ?? '' } })
  expect(seat.step).toBe('consent')
})

it('what was written in one go looks as if phones had sent it', async () => {
  const shapes = await within(app, async () => {
    const shapesOf = async (status: 'open' | 'published') => {
      const found = await Round.findAll({ where: { status, origin: 'live' } })
      const seats = await Seat.findAll({ where: { roundId: found.map((one) => one.id) } })
      const sent = await Serving.findAll({
        where: { seatId: seats.map((one) => one.id), state: 'submitted' },
      })
      return new Set(
        sent.map((one) => {
          const { confirmedAt, submittedAt, restUntil, handedAt } = one
          const rest = (restUntil?.getTime() ?? 0) - (submittedAt?.getTime() ?? 0)
          return JSON.stringify([rest, Boolean(confirmedAt && handedAt && confirmedAt >= handedAt)])
        }),
      )
    }
    return { byPhone: await shapesOf('open'), inOneGo: await shapesOf('published') }
  })
  expect(shapes.inOneGo).toEqual(shapes.byPhone)
})

it('no rating of the cancelled round and of the open one was ever put in sum', async () => {
  const hidden = await within(app, async () => {
    const found = await Round.findAll({ where: { status: ['open', 'cancelled'] } })
    return Analysis.count({ where: { roundId: found.map((one) => one.id) } })
  })
  expect(hidden).toBe(0)
})
