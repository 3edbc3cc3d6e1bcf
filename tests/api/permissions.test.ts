import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '#shared/contracts/all.ts'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { storeImport } from '#shared/contracts/imports.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import * as table from '#shared/contracts/table.ts'
import { putPhoto, removePhoto, saveUnitFacts } from '#shared/contracts/verdicts.ts'
import { addressOf } from '#src/lib/call.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { oldSheet, permissions, type Asked, type Row } from '#tests/support/permission-table.ts'
import {
  actors,
  browserOf,
  buildWorld,
  partsAt,
  phases,
  prepare,
  type Phase,
  type World,
} from '#tests/support/permission-world.ts'
import { factsOfUnit } from '#tests/support/publishing.ts'
import type { Visitor } from '#tests/support/visitor.ts'

let app: TestApp
let world: World
beforeAll(async () => {
  app = await startApp()
  world = await buildWorld(app.url)
})
afterAll(() => app.close())

/** Asks as this browser would; returns the status alone, and ends a stream that opens. */
async function statusOf(
  visitor: Visitor,
  endpoint: Endpoint,
  parts: Record<string, string>,
  { body, version }: Asked,
): Promise<number> {
  const away = new AbortController()
  const json = endpoint.kind === 'json' && endpoint.method !== 'GET'
  const answer = await visitor.fetch(addressOf(endpoint, { params: parts as never }), {
    method: endpoint.method,
    signal: away.signal,
    headers: {
      ...(json ? { 'Content-Type': 'application/json' } : {}),
      ...(endpoint.versioned ? { 'If-Match': `"${version ?? 1}"` } : {}),
      ...(endpoint.idempotent ? { 'Idempotency-Key': randomUUID() } : {}),
    },
    ...(json ? { body: JSON.stringify(body ?? {}) } : body instanceof FormData ? { body } : {}),
  })
  if (endpoint.kind === 'events') away.abort()
  else await answer.arrayBuffer()
  return answer.status
}

const named = (statuses: readonly number[]) =>
  Object.fromEntries(actors.map((actor, index) => [actor, statuses[index]]))

describe('the permission table', () => {
  it('has a row for every endpoint of the contracts', () => {
    const listed = new Set(permissions.map((one) => one.endpoint.id))
    expect(endpoints.map((one) => one.id).filter((id) => !listed.has(id))).toEqual([])
  })

  it('gives a stranger 404 wherever an address names another panel’s panel, round or seat', () => {
    for (const { endpoint, statuses } of permissions)
      if (endpoint.audience !== 'anyone' && /:(panel|round|seat)\b/.test(endpoint.path))
        expect(statuses[actors.indexOf('stranger')], endpoint.id).toBe(404)
  })

  it('gives nobody who has neither an account nor a link anything but what is for anyone', () => {
    for (const { endpoint, statuses } of permissions)
      if (endpoint.audience !== 'anyone') expect([401, 404], endpoint.id).toContain(statuses[0])
  })
})

/** The stranger puts their own panel before another's round; a neighbour at the table tries the panelist's seat. */
async function refusesMixedIds(endpoint: Endpoint, phase: Phase, ask: Row['ask']): Promise<void> {
  const asked = await ask(world, 'stranger')
  const parts = { ...partsAt(world, phase), ...asked.parts }
  if (/:panel\b.*:round\b/.test(endpoint.path)) {
    const mixed = { ...parts, panel: world.elsewhere.panel }
    expect(await statusOf(browserOf(world, 'stranger'), endpoint, mixed, asked), 'own panel').toBe(404)
  }
  if (/:seat\b/.test(endpoint.path)) {
    const neighbour = world.evening.listeners[1]?.visitor as Visitor
    expect(await statusOf(neighbour, endpoint, parts, asked), 'a neighbour').toBe(404)
  }
}

describe('somebody who has a round of their own', () => {
  const tries = async (visitor: Visitor, endpoint: Endpoint, parts: Record<string, string>, body?: unknown) =>
    statusOf(visitor, endpoint, parts, { body })

  it('reaches nothing of another panel by its sitting, seat, serving or link', async () => {
    const { elsewhere, evening } = world
    const { at: own, steward, organiser, listeners } = elsewhere
    const seat = evening.listeners[0]?.seat ?? ''
    const foreign = { ...own, sitting: evening.sitting }
    const { seats: shown } = await evening.steward.call(table.getTable, { params: evening.at })
    const serving = shown[0]?.serving?.id ?? ''
    const me = { seat: listeners[0]?.seat ?? '', serving }
    const visitor = listeners[0]?.visitor as Visitor
    expect({
      table: await tries(steward, table.getTable, foreign),
      turn: await tries(steward, table.nextTurn, foreign, { from: 0 }),
      leaves: await tries(steward, table.seatLeaves, own, { seat }),
      returns: await tries(steward, table.seatReturns, own, { seat }),
      latecomer: await tries(steward, table.addListener, own, { name: 'Late Lena', insteadOf: seat }),
      incident: await tries(steward, table.reportIncident, own, { kind: 'other', seat, text: 'A slam' }),
      voided: await tries(steward, table.voidServing, own, { serving, version: 1, reason: 'Dropped' }),
      link: await tries(organiser, rounds.renewLink, { ...own, link: seat }),
      code: await tries(visitor, seats.confirmCode, me, { code: '247' }),
      seal: await tries(visitor, seats.checkSeal, me, { sealed: 'yes' }),
      ratings: await tries(visitor, seats.submitRatings, me, {
        answers: [{ descriptor: 'overall-liking', value: 50, cantTell: false }],
      }),
    }).toEqual({
      table: 404,
      turn: 404,
      leaves: 404,
      returns: 404,
      latecomer: 404,
      incident: 404,
      voided: 404,
      link: 404,
      code: 404,
      seal: 404,
      ratings: 404,
    })
  })

  it('writes to no unit of another panel from a closed round of their own', async () => {
    const { browsers, panel, evening, elsewhere } = world
    const params = { panel: elsewhere.panel }
    const { round } = await browsers.stranger.call(storeImport, {
      params,
      body: oldSheet,
      idempotencyKey: randomUUID(),
    })
    const { units } = await browsers.organiser.call(rounds.getRound, {
      params: { panel, round: evening.round },
    })
    const parts = { ...params, round, unit: units?.[0]?.id ?? '' }
    expect(parts.unit).not.toBe('')
    const photo = new FormData()
    photo.append('photo', new Blob(['no picture']), 'unit.png')
    expect([
      await tries(browsers.stranger, saveUnitFacts, parts, factsOfUnit),
      await tries(browsers.stranger, putPhoto, parts, photo),
      await tries(browsers.stranger, removePhoto, parts),
    ]).toEqual([404, 404, 404])
  })
})

const titles: Record<Phase, string> = {
  draft: 'while the round is a draft',
  open: 'while the round is open',
  played: 'when everybody has rated',
  closed: 'when the round is closed',
  published: 'when the verdict is published',
  cancelled: 'when a round is cancelled',
  leaving: 'when everybody goes home',
}

describe.each(phases)('%s: who may do what', (phase) => {
  beforeAll(async () => {
    await prepare[phase]?.(world)
  })
  const rows = permissions.filter((one) => one.phase === phase)
  it.each(rows.map((row, nth) => [`${nth + 1}. ${row.endpoint.summary} (${row.endpoint.id})`, row] as const))(
    `${titles[phase]}: %s`,
    async (_name, { endpoint, statuses, ask }) => {
      await refusesMixedIds(endpoint, phase, ask)
      const got: number[] = []
      for (const actor of actors) {
        const asked = await ask(world, actor)
        const parts = { ...partsAt(world, phase), ...asked.parts }
        got.push(await statusOf(browserOf(world, actor), endpoint, parts, asked))
      }
      expect(named(got)).toEqual(named(statuses))
    },
  )
})
