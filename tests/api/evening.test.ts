import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import * as rounds from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import * as table from '#shared/contracts/table.ts'
import * as tags from '#shared/contracts/tags.ts'
import { CallError } from '#src/lib/call.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { standingClock } from '#tests/support/clock.ts'
import { anEvening, goOn, openEvening, playAll, rateInHand, signUpOrganiser } from '#tests/support/evening.ts'
import { visit } from '#tests/support/visitor.ts'

let app: TestApp
const clock = standingClock()
beforeAll(async () => {
  app = await startApp({ clock })
})
afterAll(() => app.close())

const refusal = async (work: Promise<unknown>): Promise<CallError> => {
  const error = await work.then(
    () => undefined,
    (caught: unknown) => caught,
  )
  if (!(error instanceof CallError)) throw new Error('this should have been refused')
  return error
}

describe('an evening', () => {
  it('is played from draft to closing', async () => {
    const evening = await openEvening(app.url)
    const { organiser, panel, round } = evening
    const pouches = await organiser.call(tags.getTags, { params: evening.at })
    expect(pouches.part).toBe('keeper')
    await playAll(evening)
    const progress = await organiser.call(rounds.getProgress, { params: { panel, round } })
    expect(progress.servings).toEqual({ planned: 20, submitted: 20, void: 0, out: 0 })
    expect(progress.waitingFor).toEqual([])
    for (const { visitor, seat } of evening.listeners) {
      const shown = await visitor.call(seats.getSeat, { params: { seat } })
      expect(shown.step).toBe('thanks')
      expect(shown.heard).toHaveLength(4)
    }
    const before = await organiser.call(rounds.getRound, { params: { panel, round } })
    const closed = await organiser.call(rounds.closeRound, {
      params: { panel, round },
      body: {},
      version: before.version,
    })
    expect(closed.status).toBe('closed')
  })

  it('serves no unit to two people in one turn', async () => {
    const evening = await openEvening(app.url)
    const shown = await evening.organiser.call(tags.getTags, { params: evening.at })
    if (shown.part !== 'keeper') throw new Error('the organiser keeps the key here')
    expect(shown.pouches).toHaveLength(20)
    const seen = new Set(shown.pouches.map((one) => `${one.turn} ${one.maker} ${one.unit}`))
    expect(seen.size).toBe(20)
  })

  it('keeps a wrong code from changing anything, and shows it to the steward', async () => {
    const evening = await openEvening(app.url)
    await goOn(evening)
    const found = await firstInHand(evening)
    const wrong = found.code === '247' ? '248' : '247'
    const error = await refusal(
      found.visitor.call(seats.confirmCode, { params: found.at, body: { code: wrong } }),
    )
    expect(error.problem.status).toBe(422)
    expect(Object.keys(error.fields)).toEqual(['code'])
    const seat = await found.visitor.call(seats.getSeat, { params: { seat: found.at.seat } })
    expect(seat.step).toBe('enter-code')
    expect(seat.serving?.code).toBeNull()
    const shown = await evening.steward.call(table.getTable, { params: evening.at })
    expect(shown.seats.find((one) => one.id === found.at.seat)?.serving?.wrongCodes).toBe(1)
  })

  it('takes a serving once, however often and from wherever it is sent', async () => {
    const evening = await openEvening(app.url)
    await goOn(evening)
    const found = await firstInHand(evening)
    await found.visitor.call(seats.confirmCode, { params: found.at, body: { code: found.code } })
    await found.visitor.call(seats.checkSeal, { params: found.at, body: { sealed: 'yes' } })
    const answers = [
      { descriptor: 'overall-liking', value: 61, cantTell: false },
      { descriptor: 'bass-amount', value: null, cantTell: true },
      { descriptor: 'width', value: 40, cantTell: false },
    ]
    const key = randomUUID()
    const send = (idempotencyKey: string) =>
      found.visitor.call(seats.submitRatings, { params: found.at, body: { answers }, idempotencyKey })
    const both = await Promise.all([send(key), send(key)])
    expect(both.map((one) => one.outcome)).toEqual(['taken', 'taken'])
    expect((await refusal(send(randomUUID()))).problem.status).toBe(409)
    const [kept] = await app.owner.query(
      `select count(*)::int as n from submissions where serving_id = '${found.at.serving}'`,
    )
    expect(kept).toEqual([{ n: 1 }])
  })

  it('names every line that is not answered and keeps the serving open', async () => {
    const evening = await openEvening(app.url)
    await goOn(evening)
    const found = await firstInHand(evening)
    await found.visitor.call(seats.confirmCode, { params: found.at, body: { code: found.code } })
    await found.visitor.call(seats.checkSeal, { params: found.at, body: { sealed: 'unsure' } })
    const answers = [
      { descriptor: 'overall-liking', value: 130, cantTell: false },
      { descriptor: 'depth', value: 10, cantTell: false },
    ]
    const error = await refusal(
      found.visitor.call(seats.submitRatings, {
        params: found.at,
        body: { answers },
        idempotencyKey: randomUUID(),
      }),
    )
    expect(error.fields).toEqual({
      'answers.0': 'Between 0 and 100.',
      'answers.1': 'Not on this scorecard.',
      answers: 'Not answered yet: Bass amount, Width.',
    })
  })

  it('brings a void serving back at the end under another code, in a turn of its own', async () => {
    const evening = await openEvening(app.url)
    await goOn(evening)
    const found = await firstInHand(evening)
    const before = await evening.steward.call(table.getTable, { params: evening.at })
    const serving = before.seats.find((one) => one.id === found.at.seat)?.serving
    const after = await evening.steward.call(table.voidServing, {
      params: evening.at,
      body: { serving: found.at.serving, version: serving?.version ?? 0, reason: 'The tip came off' },
    })
    expect(after.sitting.turns).toBe(before.sitting.turns + 1)
    expect(after.seats.find((one) => one.id === found.at.seat)?.serving?.state).toBe('void')
    await playAll(evening)
    const seat = await found.visitor.call(seats.getSeat, { params: { seat: found.at.seat } })
    expect(seat.heard).toHaveLength(4)
    expect(seat.heard.some((one) => one.code === found.code)).toBe(false)
  })

  it('moves on once when two stewards press at the same time', async () => {
    const evening = await openEvening(app.url)
    const press = () => evening.steward.call(table.nextTurn, { params: evening.at, body: { from: 0 } })
    const both = await Promise.all([press(), press()])
    expect(both.map((one) => one.sitting.turn)).toEqual([1, 1])
  })

  it('lets a latecomer take a spare row or the row of someone who left, under codes of its own', async () => {
    const evening = await openEvening(app.url)
    await goOn(evening)
    const leaver = evening.listeners[1]
    await leaver?.visitor.call(seats.leaveSeat, { params: { seat: leaver.seat } })
    const taken = await evening.steward.call(table.addListener, {
      params: evening.at,
      body: { name: 'Gerd', insteadOf: leaver?.seat ?? '' },
      idempotencyKey: randomUUID(),
    })
    expect(taken.seats.map((one) => one.label)).toContain('Gerd')
    const spare = await evening.steward.call(table.addListener, {
      params: evening.at,
      body: { name: 'Hanne' },
      idempotencyKey: randomUUID(),
    })
    expect(spare.spareRows).toBe(1)
    const again = await refusal(
      evening.steward.call(table.addListener, {
        params: evening.at,
        body: { name: 'Ivo', insteadOf: leaver?.seat ?? '' },
        idempotencyKey: randomUUID(),
      }),
    )
    expect(Object.keys(again.fields)).toEqual(['insteadOf'])
    const keeper = await refusal(
      evening.steward.call(table.addListener, {
        params: evening.at,
        body: { name: 'Ines Falk' },
        idempotencyKey: randomUUID(),
      }),
    )
    expect(keeper.fields['name']).toContain('cannot listen')
  })

  it('keeps ratings that a phone brings after the turn went on, and marks what comes after closing', async () => {
    const evening = await openEvening(app.url)
    await goOn(evening)
    const found = await firstInHand(evening)
    await found.visitor.call(seats.confirmCode, { params: found.at, body: { code: found.code } })
    await goOn(evening)
    const answers = ['overall-liking', 'bass-amount', 'width'].map((descriptor) => ({
      descriptor,
      value: 50,
      cantTell: false,
    }))
    const late = await found.visitor.call(seats.submitRatings, {
      params: found.at,
      body: { answers },
      idempotencyKey: randomUUID(),
    })
    expect(late.outcome).toBe('taken')
    const other = await firstInHand(evening)
    await other.visitor.call(seats.confirmCode, { params: other.at, body: { code: other.code } })
    const { organiser, panel, round } = evening
    const now = await organiser.call(rounds.getRound, { params: { panel, round } })
    const warned = await refusal(
      organiser.call(rounds.closeRound, { params: { panel, round }, body: {}, version: now.version }),
    )
    expect(warned.problem.status).toBe(409)
    await organiser.call(rounds.closeRound, {
      params: { panel, round },
      body: { evenIfOut: true },
      version: now.version,
    })
    const after = await other.visitor.call(seats.submitRatings, {
      params: other.at,
      body: { answers },
      idempotencyKey: randomUUID(),
    })
    expect(after.outcome).toBe('late')
  })

  it('rests after a submission by the server’s clock', async () => {
    const evening = await openEvening(app.url)
    await goOn(evening)
    const found = await firstInHand(evening)
    const index = evening.listeners.findIndex((one) => one.seat === found.at.seat)
    const sent = await rateInHand(evening, index)
    expect(sent?.step).toBe('rest')
    clock.advance(61)
    expect((await found.visitor.call(seats.getSeat, { params: { seat: found.at.seat } })).step).toBe('sent')
  })
})

describe('a split key', () => {
  const people = [
    { name: 'Ines Falk', listens: true, duty: 'letters' as const, you: true },
    { name: 'Bram', listens: true, duty: 'codes' as const },
    { name: 'Cleo', listens: true, steward: true },
  ]
  it('shows each half to one person and both to nobody', async () => {
    const organiserOf = await signUpOrganiser(app.url)
    const evening = await openEvening(app.url, anEvening({ people, tagging: 'split' }), organiserOf)
    const half = await evening.organiser.call(tags.getTags, { params: evening.at })
    expect(half.part).toBe('letters')
    expect(JSON.stringify(half)).not.toMatch(/\b[1-9]\d\d\b/)
    const { handovers } = await evening.organiser.call(rounds.listHandovers, {
      params: { panel: evening.panel, round: evening.round },
    })
    const codesLink =
      handovers
        .find((one) => one.label.startsWith('Codes'))
        ?.url.split('/')
        .at(-1) ?? ''
    expect(
      (await refusal(evening.organiser.call(seats.join, { params: { token: codesLink } }))).problem.status,
    ).toBe(403)
    const bram = evening.listeners.find((one) => one.label === 'Bram')?.visitor ?? visit(app.url)
    await bram.call(seats.join, { params: { token: codesLink } })
    const other = await bram.call(tags.getTags, { params: evening.at })
    expect(other.part).toBe('codes')
    expect(JSON.stringify(other)).not.toContain('Dunlin')
    expect(
      (await refusal(visit(app.url).call(seats.join, { params: { token: codesLink } }))).problem.status,
    ).toBe(403)
  })
})

type Evening = Awaited<ReturnType<typeof openEvening>>

/** The first listener who holds a pouch now, and its digits as the steward reads them. */
async function firstInHand(evening: Evening) {
  const shown = await evening.steward.call(table.getTable, { params: evening.at })
  const seat = shown.seats.find((one) => one.serving?.state === 'handed')
  const listener = evening.listeners.find((one) => one.seat === seat?.id)
  if (!seat?.serving || !listener) throw new Error('nobody holds a pouch')
  return {
    visitor: listener.visitor,
    code: seat.serving.code,
    at: { seat: seat.id, serving: seat.serving.id },
  }
}
