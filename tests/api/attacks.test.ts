import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createSession } from '#shared/contracts/account.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import * as table from '#shared/contracts/table.ts'
import { getTags } from '#shared/contracts/tags.ts'
import { getVerdict } from '#shared/contracts/verdicts.ts'
import { CallError } from '#src/lib/call.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { anEvening, goOn, openEvening, playAll, signUpOrganiser } from '#tests/support/evening.ts'
import { publishEvening } from '#tests/support/publishing.ts'
import { visit } from '#tests/support/visitor.ts'

let app: TestApp
beforeAll(async () => {
  app = await startApp()
})
afterAll(() => app.close())

const statusOf = (work: Promise<unknown>): Promise<number> =>
  work.then(
    () => 200,
    (error: unknown) => (error instanceof CallError ? error.problem.status : 0),
  )

describe('somebody who wants to know what a code hides', () => {
  it('learns nothing of an open round from the key of another that shares one of its units', async () => {
    const organiserOf = await signUpOrganiser(app.url)
    const open = await openEvening(app.url, anEvening(), organiserOf)
    const people = [...anEvening().people, { name: 'Gerd', listens: true }]
    const units = [
      anEvening().units[0]!,
      { maker: 'Invented', name: 'Bollard' },
      { maker: 'Invented', name: 'Thole' },
    ]
    const other = await openEvening(app.url, anEvening({ title: 'Another', units, people }), organiserOf)
    await playAll(other)
    const slug = await publishEvening(other)
    const key = (await (await visit(app.url).fetch(`/api/verdicts/${slug}/files/key.json`)).json()) as {
      draw: { excludedCodes: number[]; excludedPairs: unknown[] }
    }
    const [rows] = await app.owner.query(
      `select distinct p.code::int as code from row_places p join rows w on w.id = p.row_id where w.round_id = '${open.round}' order by 1`,
    )
    const all = (rows as { code: number }[]).map((one) => one.code)
    expect([...key.draw.excludedCodes].sort((a, b) => a - b)).toEqual(all)
    expect(key.draw.excludedPairs).toEqual([])
  })

  it('cannot use a seat and the key in one browser, in whichever order they were come by', async () => {
    const evening = await openEvening(app.url)
    const { email } = (
      await app.owner.query(`select u.email from users u order by u.created_at desc limit 1`)
    )[0][0] as { email: string }
    const listener = evening.listeners[1]!
    await goOn(evening)
    const shown = await evening.steward.call(table.getTable, { params: evening.at })
    const held = shown.seats.find((one) => one.id === listener.seat)?.serving
    await listener.visitor.call(createSession, { body: { email, password: 'three quiet herons' } })
    expect(await statusOf(listener.visitor.call(getTags, { params: evening.at }))).toBe(403)
    const params = { seat: listener.seat, serving: held?.id ?? randomUUID() }
    expect(
      await statusOf(
        listener.visitor.call(seats.confirmCode, { params, body: { code: held?.code ?? '417' } }),
      ),
    ).toBe(403)
  })

  it('is put out by a renewed link to the key, and the verdict says that it was opened before', async () => {
    const people = [
      { name: 'Ines Falk', you: true, listens: true, steward: true },
      { name: 'Kaat', listens: false, duty: 'keeper' as const },
      ...['Bram', 'Cleo', 'Dario', 'Edda', 'Finn', 'Gerd'].map((name) => ({ name, listens: true })),
    ]
    const evening = await openEvening(app.url, anEvening({ people }))
    const at = { panel: evening.panel, round: evening.round }
    const { handovers } = await evening.organiser.call(rounds.listHandovers, { params: at })
    const link = handovers.find((one) => one.label.startsWith('Code keeper'))!
    const open = (url: string) => ({ params: { token: url.split('/').at(-1) ?? '' } })
    const [thief, kaat] = [visit(app.url), visit(app.url)]
    await thief.call(seats.join, open(link.url))
    expect(await statusOf(kaat.call(seats.join, open(link.url)))).toBe(403)
    const renewed = await evening.organiser.call(rounds.renewLink, { params: { ...at, link: link.id } })
    await kaat.call(seats.join, open(renewed.url))
    expect(await statusOf(kaat.call(getTags, { params: evening.at }))).toBe(200)
    expect(await statusOf(thief.call(getTags, { params: evening.at }))).toBe(404)
    await playAll(evening)
    const slug = await publishEvening(evening)
    const verdict = await visit(app.url).call(getVerdict, { params: { slug } })
    expect(verdict.labels).toContain('A link to the key was opened, and then renewed, during the round')
  })

  it('sees no second code of a row: who left cannot come back onto a row that was taken over', async () => {
    const evening = await openEvening(app.url)
    await goOn(evening)
    const seat = evening.listeners[2]!.seat
    await evening.steward.call(table.seatLeaves, { params: evening.at, body: { seat } })
    const after = await evening.steward.call(table.addListener, {
      params: evening.at,
      body: { name: 'Gerd', insteadOf: seat },
    })
    expect(after.seats.find((one) => one.id === seat)?.serving).toBeNull()
    expect(
      await statusOf(evening.steward.call(table.seatReturns, { params: evening.at, body: { seat } })),
    ).toBe(409)
  })

  it('never sees a void serving share its turn with a latecomer’s row', async () => {
    const evening = await openEvening(app.url)
    const shown = await goOn(evening)
    const serving = shown.seats.find((one) => one.serving?.state === 'handed')?.serving
    await evening.steward.call(table.voidServing, {
      params: evening.at,
      body: { serving: serving?.id ?? '', version: serving?.version ?? 0, reason: 'Fell' },
    })
    for (const name of ['Gerd', 'Hanne'])
      await evening.steward.call(table.addListener, { params: evening.at, body: { name } })
    const [clashes] = await app.owner.query(
      `select v.turn, k.unit_id from servings v join seats s on s.id = v.seat_id join key_entries k on k.row_place_id = v.row_place_id
        where s.round_id = '${evening.round}' and v.state <> 'void' group by 1, 2 having count(*) > 1`,
    )
    expect(clashes).toEqual([])
    const [shared] = await app.owner.query(
      `select 1 from servings v join seats s on s.id = v.seat_id
        where s.round_id = '${evening.round}' and v.repeats_serving_id is not null
          and exists (select 1 from servings o join seats t on t.id = o.seat_id where t.round_id = s.round_id and o.turn = v.turn and o.id <> v.id)`,
    )
    expect(shared).toEqual([])
  })
})

it('a round that publishes no rows publishes none, in no file and in no picture', async () => {
  const people = [...anEvening().people, { name: 'Gerd', listens: true }]
  const evening = await openEvening(app.url, anEvening({ publishesRows: false, people }))
  await playAll(evening)
  const slug = await publishEvening(evening)
  const verdict = await visit(app.url).call(getVerdict, { params: { slug } })
  expect(JSON.stringify(verdict)).not.toContain('"listener":')
  expect(verdict.files.map((file) => file.name)).toEqual(['plan.json', 'key.json'])
  const told = await evening.organiser.call(rounds.getRound, {
    params: { panel: evening.panel, round: evening.round },
  })
  expect(told.publishesRows).toBe(false)
})
