import { createHash, randomUUID } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { crc32, deflateSync } from 'node:zlib'
import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { verifyFiles } from '#shared/allocation/verify.ts'
import { getAgreement, getReveal, type Agreement } from '#shared/contracts/analysis.ts'
import { previewImport, storeImport } from '#shared/contracts/imports.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import { getSeatReport } from '#shared/contracts/seats.ts'
import * as contract from '#shared/contracts/verdicts.ts'
import { CallError } from '#src/lib/call.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { anEvening, openEvening, playAll, type OpenEvening } from '#tests/support/evening.ts'
import { visit } from '#tests/support/visitor.ts'

let app: TestApp
let evening: OpenEvening
let at: { panel: string; round: string }

beforeAll(async () => {
  app = await startApp()
  const draft = anEvening()
  evening = await openEvening(app.url, {
    ...draft,
    people: [...draft.people, { name: 'Gerd', listens: true }],
  })
  at = { panel: evening.panel, round: evening.round }
  await playAll(evening)
  const round = await evening.organiser.call(rounds.getRound, { params: at })
  await evening.organiser.call(rounds.closeRound, { params: at, body: {}, version: round.version })
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

const facts = {
  provenance: 'bought' as const,
  disclosure: 'Bought by the panel.',
  price: { minor: 5400, currency: 'EUR', on: '2031-03-01' },
}

async function fillDesk(): Promise<contract.VerdictDraft> {
  const { organiser } = evening
  let desk = await organiser.call(contract.getVerdictDraft, { params: at })
  desk = await organiser.call(contract.saveVerdict, {
    params: at,
    version: desk.version,
    body: { headline: 'Four small ones, one evening', summary: 'Six of us listened.' },
  })
  for (const unit of desk.units)
    desk = await organiser.call(contract.saveUnitFacts, {
      params: { ...at, unit: unit.id },
      version: unit.version,
      body: facts,
    })
  return desk
}

describe('after closing', () => {
  it('shows agreement to the organiser, with names, and to no listener', async () => {
    const shown = await evening.organiser.call(getAgreement, { params: at })
    expect(shown.label).toEqual({ key: 'small-panel', words: 'Small panel', fewest: 6 })
    expect(shown.listeners.map((one) => one.name)).toContain('Cleo')
    expect(shown.labels).toEqual(['Levels matched by ear', 'The steward also listened'])
    expect(shown.results.map((one) => one.descriptor.key)).toEqual(['overall-liking', 'bass-amount', 'width'])
    expect(
      (await refusal(evening.listeners[2]!.visitor.call(getAgreement, { params: at }))).problem.status,
    ).toBe(403)
  })

  it('shows each listener their own ratings beside the panel’s', async () => {
    const { visitor, seat } = evening.listeners[0]!
    const report = await visitor.call(getSeatReport, { params: { seat } })
    expect(report.units).toHaveLength(4)
    expect(report.units[0]?.ratings.every((one) => one.n === 6 && one.panelMedian !== null)).toBe(true)
  })

  it('draws the units out for the room', async () => {
    const reveal = await evening.organiser.call(getReveal, { params: at })
    expect(reveal.units).toHaveLength(4)
    expect(reveal.threads).toHaveLength(6)
    expect(reveal.units.flatMap((one) => one.codes)).toHaveLength(24)
  })

  it('asks what is missing before publishing, then stands in public with files that verify', async () => {
    const { organiser } = evening
    const early = await refusal(
      organiser.call(contract.publishVerdict, { params: at, body: {}, idempotencyKey: randomUUID() }),
    )
    expect(Object.keys(early.fields)).toContain('units.0.provenance')
    expect((await fillDesk()).missing).toEqual([])
    const key = randomUUID()
    const press = () => organiser.call(contract.publishVerdict, { params: at, body: {}, idempotencyKey: key })
    const [first, second] = [await press(), await press()]
    expect(second).toEqual(first)
    const reader = visit(app.url)
    const verdict = await reader.call(contract.getVerdict, { params: { slug: first.slug } })
    expect(verdict.version).toBe(1)
    expect(JSON.stringify(verdict)).not.toMatch(/Bram|Cleo|Dario|Edda|Finn|Gerd|Ines/)
    const text = async (name: string) =>
      (await reader.fetch(`/api/verdicts/${first.slug}/files/${name}`)).text()
    const [planText, keyText, ratingsText] = [
      await text('plan.json'),
      await text('key.json'),
      await text('ratings.csv'),
    ]
    const { plan, key: keyPrint, ratings } = verdict.fingerprints
    expect(createHash('sha256').update(ratingsText).digest('hex')).toBe(ratings)
    const checks = verifyFiles({
      planText,
      keyText,
      ratingsText,
      fingerprints: { plan: plan!, key: keyPrint!, ratings: ratings! },
    })
    expect(checks.filter((check) => !check.ok)).toEqual([])
    expect(ratingsText).not.toMatch(/Bram|Cleo|seat/)
    const listed = await reader.call(contract.listVerdicts)
    expect(listed.verdicts.map((one) => one.slug)).toContain(first.slug)
  })

  it('gives the same figures when its public file is brought back as an import', async () => {
    const { organiser } = evening
    const { verdicts } = await visit(app.url).call(contract.listVerdicts)
    const text = await (
      await visit(app.url).fetch(`/api/verdicts/${verdicts[0]!.slug}/files/ratings.csv`)
    ).text()
    const preview = await organiser.call(previewImport, { params: { panel: at.panel }, body: { text } })
    expect([preview.rows, preview.faultCount, preview.panelists]).toEqual([72, 0, 6])
    const { round } = await organiser.call(storeImport, {
      params: { panel: at.panel },
      body: { title: 'Back again', question: 'The same?', text, primaryDescriptor: 'Overall liking' },
      idempotencyKey: randomUUID(),
    })
    const [own, back] = [
      await organiser.call(getAgreement, { params: at }),
      await organiser.call(getAgreement, { params: { panel: at.panel, round } }),
    ]
    expect(back.labels[0]).toContain('Imported')
    // Listeners get new numbers, so sums run in another order: equal to ten digits, not to the last bit.
    const models = (shown: Agreement): unknown =>
      JSON.parse(
        JSON.stringify(
          shown.results.map((one) => [one.descriptor.name, one.model]),
          (_, value: unknown) => (typeof value === 'number' ? Number(value.toPrecision(10)) : value),
        ),
      )
    expect(models(back)).toEqual(models(own))
  })

  it('publishes a correction as a new version and keeps the old one', async () => {
    const { organiser } = evening
    const desk = await organiser.call(contract.getVerdictDraft, { params: at })
    await organiser.call(contract.saveVerdict, {
      params: at,
      version: desk.version,
      body: { headline: 'Four small ones, mended', summary: desk.summary },
    })
    expect(
      Object.keys(
        (
          await refusal(
            organiser.call(contract.publishVerdict, { params: at, body: {}, idempotencyKey: randomUUID() }),
          )
        ).fields,
      ),
    ).toEqual(['correction'])
    const { slug, version } = await organiser.call(contract.publishVerdict, {
      params: at,
      body: { correction: 'The headline named the wrong number.' },
      idempotencyKey: randomUUID(),
    })
    expect(version).toBe(2)
    const old = await visit(app.url).call(contract.getVerdict, { params: { slug }, query: { version: 1 } })
    expect(old.headline).toBe('Four small ones, one evening')
    expect(old.corrections).toHaveLength(1)
  })
})

/** A blank black-and-white PNG of so many pixels a side, written by hand: few bytes, many pixels. */
function blankPng(side: number): Buffer {
  const chunk = (type: string, data: Buffer): Buffer => {
    const body = Buffer.concat([Buffer.from(type, 'latin1'), data])
    const ends = Buffer.alloc(8)
    ends.writeUInt32BE(data.length, 0)
    ends.writeUInt32BE(crc32(body), 4)
    return Buffer.concat([ends.subarray(0, 4), body, ends.subarray(4)])
  }
  const header = Buffer.alloc(13)
  header.writeUInt32BE(side, 0)
  header.writeUInt32BE(side, 4)
  header.set([1, 0, 0, 0, 0], 8)
  const rows = deflateSync(Buffer.alloc(side * (side / 8 + 1)))
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])
  return Buffer.concat([
    signature,
    chunk('IHDR', header),
    chunk('IDAT', rows),
    chunk('IEND', Buffer.alloc(0)),
  ])
}

describe('a photograph', () => {
  const send = async (bytes: Buffer, name: string): Promise<Response> => {
    const desk = await evening.organiser.call(contract.getVerdictDraft, { params: at })
    const form = new FormData()
    form.set('photo', new Blob([new Uint8Array(bytes)], { type: 'image/jpeg' }), name)
    return evening.organiser.fetch(
      `/api/panels/${at.panel}/rounds/${at.round}/units/${desk.units[0]!.id}/photo`,
      { method: 'PUT', body: form },
    )
  }
  const picture = (width: number, height: number) =>
    sharp({ create: { width, height, channels: 3, background: '#a52' } })

  it('is told by its content, made smaller and loses its metadata', async () => {
    const bytes = await picture(3000, 1000)
      .withExif({ IFD0: { Artist: 'Marrow Sound' } })
      .jpeg()
      .toBuffer()
    const answer = await send(bytes, 'whatever.txt')
    expect(answer.status).toBe(200)
    const { photo } = ((await answer.json()) as contract.VerdictDraft).units[0]!
    expect([photo?.width, photo?.height]).toEqual([1600, 533])
    const kept = Buffer.from(await (await evening.organiser.fetch(photo!.url)).arrayBuffer())
    expect((await sharp(kept).metadata()).exif).toBeUndefined()
  })
  it('is refused where it is a renamed program, and where it has 400 million pixels', async () => {
    expect((await send(readFileSync(process.execPath).subarray(0, 200_000), 'photo.jpg')).status).toBe(422)
    const huge = blankPng(20_000)
    const answer = await send(huge, 'huge.png')
    expect(answer.status).toBe(422)
    expect(((await answer.json()) as { fields: object }).fields).toHaveProperty('photo')
  })
})
