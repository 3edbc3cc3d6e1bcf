import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createAccount, getMe } from '#shared/contracts/account.ts'
import * as contract from '#shared/contracts/panels.ts'
import type { RoundStatus } from '#shared/domain/round-status.ts'
import { CallError } from '#src/lib/call.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { visit, type Visitor } from '#tests/support/visitor.ts'

let app: TestApp
let ines: Visitor
let wanda: Visitor
let stranger: Visitor
const panel = { panel: 'quayside-bench' }
let panelId = ''
const members: Record<'ines' | 'wanda', string> = { ines: '', wanda: '' }

const account = (name: string, panelName: string) => ({
  name,
  email: `${name.toLowerCase()}@example.org`,
  password: 'three quiet herons',
  panelName,
})
const statusOf = (work: Promise<unknown>): Promise<number> =>
  work.then(
    () => 200,
    (error: unknown) => (error instanceof CallError ? error.problem.status : 0),
  )

async function sql<T = Record<string, unknown>>(text: string, bind: unknown[] = []): Promise<T[]> {
  const [rows] = await app.owner.query(text, { bind })
  return rows as T[]
}

/** A round with one unit, straight into the tables: what this file asks is how lists are read. */
async function aRound(
  number: number,
  status: RoundStatus,
  unit: { maker: string; name: string },
  roles: [keyof typeof members, string][],
): Promise<{ round: string; unit: string }> {
  const [round, unitId, card] = [randomUUID(), randomUUID(), randomUUID()]
  await sql('insert into scorecards (panel_id, id, name, created_at) values ($1, $2, $3, now())', [
    panelId,
    card,
    'S',
  ])
  await sql('insert into units (panel_id, id, maker, name, created_at) values ($1, $2, $3, $4, now())', [
    panelId,
    unitId,
    unit.maker,
    unit.name,
  ])
  const opened = status !== 'draft'
  await sql(
    `insert into rounds (panel_id, id, number, title, question, status, origin, blinding, mode, scorecard_id,
       primary_descriptor, plan, plan_fingerprint, key_fingerprint, created_at, opened_at, changed_at)
     values ($1, $2, $3, $4, 'Which?', $5, 'live', 'double', 'evening', $6, 'liking', '{}', $7, $7, now(), $8, now())`,
    [
      panelId,
      round,
      number,
      `Round ${number}`,
      status,
      card,
      opened ? '0'.repeat(64) : null,
      opened ? new Date() : null,
    ],
  )
  await sql('insert into round_units values ($1, $2, $3)', [panelId, round, unitId])
  for (const [who, role] of roles)
    await sql(
      'insert into round_roles (panel_id, id, round_id, member_id, role) values ($1, $2, $3, $4, $5)',
      [panelId, randomUUID(), round, members[who], role],
    )
  return { round, unit: unitId }
}

beforeAll(async () => {
  app = await startApp()
  ;[ines, wanda, stranger] = [visit(app.url), visit(app.url), visit(app.url)]
  await ines.call(createAccount, { body: account('Ines', 'Quayside Bench') })
  await wanda.call(createAccount, { body: account('Wanda', 'Another Bench') })
  await stranger.call(createAccount, { body: account('Stranger', 'A third') })
  const first = await ines.call(contract.getPanel, { params: panel })
  members.ines = first.you.memberId
  members.wanda = randomUUID()
  panelId = (await sql<{ id: string }>('select id from panels where slug = $1', [panel.panel]))[0]?.id ?? ''
  await sql(
    `insert into members (panel_id, id, user_id, display_name, roles, created_at)
     select $1, $2, id, name, '{organiser,steward}', now() from users where email = 'wanda@example.org'`,
    [panelId, members.wanda],
  )
  await sql(
    `insert into members (panel_id, id, display_name, roles, created_at) values ($1, $2, 'Aled Marsh', '{panelist}', now())`,
    [panelId, randomUUID()],
  )
})
afterAll(() => app.close())

describe('a panel', () => {
  it('is there for its members and for nobody else', async () => {
    expect(await ines.call(contract.getPanel, { params: panel })).toMatchObject({
      slug: 'quayside-bench',
      name: 'Quayside Bench',
      can: { startRound: true, edit: true, seeUnits: true },
    })
    for (const list of [contract.getPanel, contract.listRounds, contract.listUnits, contract.listMembers]) {
      expect(await statusOf(stranger.call(list, { params: panel }))).toBe(404)
      expect(await statusOf(visit(app.url).call(list, { params: panel }))).toBe(401)
    }
  })

  it('changes name and time zone, keeps its address, and refuses a zone that there is not', async () => {
    const change = (timeZone: string, version: number) =>
      ines.call(contract.changePanel, { params: panel, body: { name: 'The Bench', timeZone }, version })
    await expect(change('Middle/Nowhere', 1)).rejects.toMatchObject({
      problem: { status: 422, fields: { timeZone: expect.any(String) as string } },
    })
    expect(await change('Europe/Dublin', 1)).toMatchObject({
      slug: 'quayside-bench',
      name: 'The Bench',
      timeZone: 'Europe/Dublin',
      version: 2,
    })
    await expect(change('Europe/Oslo', 1)).rejects.toMatchObject({
      problem: { status: 409, current: { name: 'The Bench', timeZone: 'Europe/Dublin', version: 2 } },
    })
  })

  it('is changed by its organisers only', async () => {
    await sql(`update members set roles = '{steward}' where id = $1`, [members.wanda])
    const body = { name: 'Mine', timeZone: 'UTC' }
    expect(await statusOf(wanda.call(contract.changePanel, { params: panel, body, version: 2 }))).toBe(403)
    expect(await statusOf(wanda.call(contract.listUnits, { params: panel }))).toBe(403)
    expect((await wanda.call(contract.getPanel, { params: panel })).can).toEqual({
      startRound: false,
      edit: false,
      seeUnits: false,
    })
    await sql(`update members set roles = '{organiser,steward}' where id = $1`, [members.wanda])
  })

  it('lists its people, those who never sign in among them', async () => {
    const { members: people } = await ines.call(contract.listMembers, { params: panel })
    expect(people.map(({ name, signsIn }) => [name, signsIn])).toEqual([
      ['Aled Marsh', false],
      ['Ines', true],
      ['Wanda', true],
    ])
  })
})

describe('the panel’s lists', () => {
  it('show rounds newest first, with how many listen', async () => {
    await aRound(1, 'draft', { maker: 'Lantern Reed', name: 'Knot' }, [
      ['ines', 'organiser'],
      ['ines', 'panelist'],
      ['wanda', 'panelist'],
    ])
    await aRound(2, 'open', { maker: 'Saltmarsh Audio', name: 'Dunlin' }, [['ines', 'organiser']])
    const { rounds } = await ines.call(contract.listRounds, { params: panel })
    expect(rounds.map(({ number, status, listeners }) => [number, status, listeners])).toEqual([
      [2, 'open', 0],
      [1, 'draft', 2],
    ])
    expect(rounds.every(({ verdictSlug }) => verdictSlug === null)).toBe(true)
  })

  it('keep the units of an open round from its steward, and another specimen of the same name', async () => {
    const open = await aRound(3, 'open', { maker: 'Eddy & Shoal', name: 'Avocet' }, [
      ['ines', 'organiser'],
      ['wanda', 'steward'],
    ])
    const older = await aRound(4, 'published', { maker: 'eddy & shoal', name: 'AVOCET' }, [
      ['ines', 'organiser'],
    ])
    const seen = await wanda.call(contract.listUnits, { params: panel })
    expect(seen.withheld).toBe(2)
    expect(seen.units.map(({ id }) => id)).not.toContain(open.unit)
    expect(JSON.stringify(seen).toLowerCase()).not.toContain('avocet')
    expect(seen.units.map(({ name }) => name).sort()).toEqual(['Dunlin', 'Knot'])
    const all = await ines.call(contract.listUnits, { params: panel })
    expect(all.withheld).toBe(0)
    expect(all.units.map(({ id }) => id)).toEqual(expect.arrayContaining([open.unit, older.unit]))

    await sql(`update rounds set status = 'closed' where id = $1`, [open.round])
    expect((await wanda.call(contract.listUnits, { params: panel })).withheld).toBe(0)
  })

  it('keep them from a panelist, but not from a listening organiser who typed them', async () => {
    await aRound(5, 'open', { maker: 'Saltmarsh Audio', name: 'Whimbrel' }, [
      ['ines', 'organiser'],
      ['ines', 'panelist'],
      ['wanda', 'panelist'],
    ])
    expect((await wanda.call(contract.listUnits, { params: panel })).withheld).toBe(1)
    expect((await ines.call(contract.listUnits, { params: panel })).withheld).toBe(0)
  })

  it('show a unit’s price with its currency and day, and how many rounds used it', async () => {
    await sql(
      `update units set price_minor = 12950, price_currency = 'EUR', price_on = '2026-03-12', provenance = 'bought'
       where panel_id = $1 and name = 'Knot'`,
      [panelId],
    )
    const { units } = await ines.call(contract.listUnits, { params: panel })
    expect(units.find(({ name }) => name === 'Knot')).toMatchObject({
      maker: 'Lantern Reed',
      provenance: 'bought',
      price: { minor: 12950, currency: 'EUR', on: '2026-03-12' },
      rounds: 1,
    })
    expect(units.find(({ name }) => name === 'Dunlin')?.price).toBeNull()
  })
})

describe('what somebody has to do', () => {
  it('is listed with its page while the round is open, and gone when it is closed', async () => {
    const { round } = await aRound(6, 'open', { maker: 'Eddy & Shoal', name: 'Godwit' }, [
      ['ines', 'organiser'],
      ['ines', 'keeper'],
      ['wanda', 'steward'],
    ])
    const sitting = randomUUID()
    await sql('insert into sittings (panel_id, id, round_id, name, turns) values ($1, $2, $3, $4, 4)', [
      panelId,
      sitting,
      round,
      'Tonight',
    ])
    const dutiesOf = async (visitor: Visitor) => (await visitor.call(getMe)).duties
    const at = `/p/quayside-bench/rounds/${round}`
    expect(await dutiesOf(ines)).toEqual([
      { role: 'keeper', roundTitle: 'Round 6', path: `${at}/tags/${sitting}` },
    ])
    expect(await dutiesOf(wanda)).toEqual([
      { role: 'steward', roundTitle: 'Round 6', path: `${at}/table/${sitting}` },
    ])
    expect(await dutiesOf(stranger)).toEqual([])
    expect(await dutiesOf(visit(app.url))).toEqual([])
    await sql(`update rounds set status = 'closed' where id = $1`, [round])
    expect(await dutiesOf(wanda)).toEqual([])
  })
})
