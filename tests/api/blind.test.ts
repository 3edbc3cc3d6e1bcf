import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { blindEvening, markers, type BlindEvening, type OrganiserAs } from '#tests/support/blind-evening.ts'
import { standingClock } from '#tests/support/clock.ts'
import type { Told } from '#tests/support/recorder.ts'
import { seededChance } from '#tests/support/seeded-chance.ts'

/** The only answers in which an organiser may meet a unit's name or id from opening to closing. */
const organiserMayMeetUnits = ['createEvening', 'openRound', 'getRound', 'listUnits']
/** The keeper's own page joins codes and units: that is what a keeper is for. */
const keeperMayMeetTheKey = ['getTags']

const apps: TestApp[] = []
const freshApp = async (): Promise<TestApp> => {
  const app = await startApp({
    clock: standingClock(),
    random: seededChance('the same in both'),
    address: 'http://scrim.test',
  })
  apps.push(app)
  return app
}
afterAll(() => Promise.all(apps.map((app) => app.close())))

/** Answers that hold a marker word or a unit's id. */
const leaks = (told: readonly Told[], unitIds: readonly string[]): Told[] =>
  told.filter((one) => [...markers, ...unitIds].some((word) => one.text.includes(word)))
const names = (told: readonly Told[]): string[] => [...new Set(told.map((one) => one.endpoint))].sort()

/** An answer that joins a unit with a code, a row, a seat or a serving. */
const joins = (told: readonly Told[], evening: BlindEvening): Told[] =>
  leaks(told, evening.unitIds).filter(
    (one) =>
      evening.inner.some((id) => one.text.includes(id)) ||
      evening.codes.some((code) => new RegExp(`"${code}"`).test(one.text)),
  )

describe.each<OrganiserAs>(['keeper', 'steward', 'panelist'])(
  'from opening to closing, with an organiser who is also %s',
  (as) => {
    let evening: BlindEvening
    beforeAll(async () => {
      evening = await blindEvening(await freshApp(), as)
    })

    it('a panelist meets no word and no id of a unit, at any address', () => {
      expect(evening.panelist.told.length).toBeGreaterThan(100)
      expect(names(leaks(evening.panelist.told, evening.unitIds))).toEqual([])
    })

    it('a steward meets none either', () => {
      const told =
        as === 'steward'
          ? evening.steward.told.filter((one) => !organiserMayMeetUnits.includes(one.endpoint))
          : evening.steward.told
      expect(names(leaks(told, evening.unitIds))).toEqual([])
    })

    it('an organiser meets units only where the constant says, and never joined with a code, row, seat or serving', () => {
      const allowed =
        as === 'keeper' ? [...organiserMayMeetUnits, ...keeperMayMeetTheKey] : organiserMayMeetUnits
      expect(
        names(leaks(evening.organiser.told, evening.unitIds)).filter((name) => !allowed.includes(name)),
      ).toEqual([])
      const joined = joins(evening.organiser.told, evening).filter(
        (one) => as !== 'keeper' || !keeperMayMeetTheKey.includes(one.endpoint),
      )
      expect(names(joined)).toEqual([])
    })

    it('no mail names a unit', () => {
      for (const mail of evening.mails)
        for (const word of [...markers, ...evening.unitIds]) expect(mail).not.toContain(word)
    })
  },
)

/** Exchanges two units throughout the key and changes nothing else. */
const otherKey = (app: TestApp) => async (round: string) => {
  await app.owner.query(
    `with two as (select min(unit_id::text)::uuid as a, max(unit_id::text)::uuid as b from round_units where round_id = '${round}')
     update key_entries k set unit_id = case when k.unit_id = two.a then two.b else two.a end
       from two where k.unit_id in (two.a, two.b)`,
  )
}
const plantName = (app: TestApp) => async (round: string) => {
  await app.owner.query(`update seats set label = 'Qwovunit' where round_id = '${round}' and number = 1`)
}
/** A leak that only the key could tell: a seat's label says which unit its first serving hides. */
const plantFirst = (app: TestApp) => async (round: string) => {
  await app.owner.query(
    `update seats s set label = s.label || ' ' || (
        select substr(md5(u.name), 1, 4) from row_places p join key_entries k on k.row_place_id = p.id join units u on u.id = k.unit_id
         where p.row_id = s.row_id and p.code_set = 'served' and p.position = 1)
      where s.round_id = '${round}'`,
  )
}
const texts = (told: readonly Told[], url: string): string[] =>
  told.map((one) => `${one.endpoint} ${one.status} ${one.text.replaceAll(url, '')}`)

describe('two rounds that differ only in the key', () => {
  it('answer a panelist and a steward alike, to the last letter', async () => {
    const [first, second] = [await freshApp(), await freshApp()]
    const one = await blindEvening(first, 'keeper')
    const other = await blindEvening(second, 'keeper', otherKey(second))
    expect(texts(other.panelist.told, second.url)).toEqual(texts(one.panelist.told, first.url))
    expect(texts(other.steward.told, second.url)).toEqual(texts(one.steward.told, first.url))
  })
})

describe('a planted leak', () => {
  it('is found where a unit’s name stands on the steward’s table', async () => {
    const app = await freshApp()
    const evening = await blindEvening(app, 'panelist', plantName(app))
    expect(names(leaks(evening.steward.told, evening.unitIds))).toContain('getTable')
  })
  it('is found where only the key could have told', async () => {
    const [first, second] = [await freshApp(), await freshApp()]
    const one = await blindEvening(first, 'keeper', plantFirst(first))
    const other = await blindEvening(second, 'keeper', async (round) => {
      await otherKey(second)(round)
      await plantFirst(second)(round)
    })
    expect(texts(other.steward.told, second.url)).not.toEqual(texts(one.steward.told, first.url))
  })
})
