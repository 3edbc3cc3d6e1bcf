import { afterAll, beforeAll, expect, it } from 'vitest'
import { fingerprint } from '#shared/allocation/key-files.ts'
import * as rounds from '#shared/contracts/rounds.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { openEvening, signUpOrganiser, anEvening } from '#tests/support/evening.ts'
import { visit } from '#tests/support/visitor.ts'

let app: TestApp
beforeAll(async () => {
  app = await startApp()
})
afterAll(() => app.close())

it('a cancelled round says why at once and opens its key only when no open round uses its units', async () => {
  const organiserOf = await signUpOrganiser(app.url)
  const first = await openEvening(app.url, anEvening(), organiserOf)
  const second = await openEvening(app.url, anEvening({ title: 'Once more' }), organiserOf)
  const { organiser, panel } = first
  const cancel = async (round: string, reason: string) => {
    const { version } = await organiser.call(rounds.getRound, { params: { panel, round } })
    return organiser.call(rounds.cancelRound, { params: { panel, round }, version, body: { reason } })
  }
  await cancel(first.round, 'Two pouches were mixed up')
  const reader = visit(app.url)
  const told = await reader.call(rounds.getPublicRound, { params: { round: first.round } })
  expect([told.status, told.cancelReason, told.keyIsPublic]).toEqual([
    'cancelled',
    'Two pouches were mixed up',
    false,
  ])
  expect((await reader.fetch(`/api/rounds/${first.round}/files/key.json`)).status).toBe(404)
  await cancel(second.round, 'Nobody came')
  const key = await (await reader.fetch(`/api/rounds/${first.round}/files/key.json`)).text()
  expect(fingerprint(key)).toBe(told.keyFingerprint)
})

it('opening mails both fingerprints to who can be written to, and drafting again copies a cancelled plan', async () => {
  const evening = await openEvening(app.url)
  await app.runJobs()
  const { organiser, panel, round } = evening
  const shown = await organiser.call(rounds.getRound, { params: { panel, round } })
  const mail = app.sent.find((message) => message.text.includes(shown.keyFingerprint ?? 'none'))
  expect(mail?.text).toContain(shown.planFingerprint)
  await organiser.call(rounds.cancelRound, {
    params: { panel, round },
    version: shown.version,
    body: { reason: 'A fuse' },
  })
  const again = await organiser.call(rounds.draftAgain, { params: { panel, round } })
  expect([again.status, again.title, again.unitCount]).toEqual(['draft', shown.title, 4])
})
