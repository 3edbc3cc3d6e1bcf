import { randomUUID } from 'node:crypto'
import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { getRound } from '#shared/contracts/rounds.ts'
import * as seats from '#shared/contracts/seats.ts'
import { getTable, seatLeaves, type StewardTable } from '#shared/contracts/table.ts'
import { addressOf } from '#src/lib/call.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { useBrowser, type Screen } from '#tests/support/browser.ts'
import { headed } from '#tests/support/signed-in.ts'
import { visit, type Visitor } from '#tests/support/visitor.ts'
import { handoversFrom, organise, press, rateAll, seen, sitDown, takePouch, units } from './evening-people.ts'

const browser = useBrowser()
let app: TestApp
beforeAll(async () => {
  app = await startApp({ pages: true, worker: true })
})
afterAll(() => app.close())

const within = { timeout: 60_000 }

const verb = /turn: 1|first turn|Next turn|End the listening|Start/

describe('an evening, from sign-up to verdict', () => {
  let organiser: Screen
  let keeper: Screen
  const phones: { name: string; screen: Screen; seat: string }[] = []
  const others: { name: string; visitor: Visitor; seat: string }[] = []
  let at = { panel: '', round: '', sitting: '' }
  let tableAddress = ''

  const table = async (): Promise<StewardTable> =>
    (
      await organiser.context.request.get(app.url + addressOf(getTable, { params: at }))
    ).json() as Promise<StewardTable>
  const inHand = async (seat: string) => (await table()).seats.find((one) => one.id === seat)?.serving ?? null

  /** Those who are no browsers rate what they hold. */
  async function othersRate(): Promise<void> {
    const shown = await table()
    for (const [index, { visitor, seat }] of others.entries()) {
      const held = shown.seats.find((one) => one.id === seat)
      if (held?.left || held?.serving?.state !== 'handed') continue
      const params = { seat, serving: held.serving.id }
      await visitor.call(seats.confirmCode, { params, body: { code: held.serving.code } })
      const { scorecard } = await visitor.call(seats.checkSeal, { params, body: { sealed: 'yes' } })
      const answers = scorecard.map(({ key }, line) => ({
        descriptor: key,
        value: (Number(held.serving?.code) * 7 + index * 13 + line * 29) % 101,
        cantTell: false,
      }))
      await visitor.call(seats.submitRatings, {
        params,
        body: { answers, remark: '' },
        idempotencyKey: randomUUID(),
      })
    }
  }

  /** The steward presses "Next turn" on the run sheet, and says so again where somebody has not sent. */
  async function nextTurn(): Promise<void> {
    const { page } = organiser
    const before = (await table()).sitting.turn
    await page.goto(tableAddress)
    await page.getByRole('button', { name: verb }).first().click(within)
    const dialog = page.getByRole('dialog')
    await Promise.race([
      dialog.waitFor(within),
      expect.poll(async () => (await table()).sitting.turn, within).toBe(before + 1),
    ])
    if (await dialog.isVisible()) await dialog.getByRole('button', { name: verb }).click()
    await expect.poll(async () => (await table()).sitting.turn, within).toBe(before + 1)
  }

  it('the organiser signs up, names units and people, and opens the round on a phone', async () => {
    organiser = await browser.open({ baseURL: app.url, name: 'organiser' })
    await organise(organiser.page)
    await expect
      .poll(() => organiser.page.url(), within)
      .toMatch(/rounds\/[0-9a-f-]{36}\/(progress|links|plan)/)
    const [, panel = '', round = ''] = /\/p\/([^/]+)\/rounds\/([^/]+)/.exec(organiser.page.url()) ?? []
    const shown = async () =>
      (
        await organiser.context.request.get(app.url + addressOf(getRound, { params: { panel, round } }))
      ).json() as Promise<{ status: string; sittingId: string }>
    await expect.poll(async () => (await shown()).status, within).toBe('open')
    at = { panel, round, sitting: (await shown()).sittingId }
    tableAddress = `/p/${panel}/rounds/${round}/table/${at.sitting}`
  })

  it('keeper and listeners come in by links, without an account', async () => {
    const handovers = await handoversFrom(organiser.context, app.url, at)
    const path = (label: string | RegExp) =>
      handovers.find((one) => (typeof label === 'string' ? one.label === label : label.test(one.label)))
        ?.url ?? ''
    keeper = await browser.open({ baseURL: app.url, name: 'keeper' })
    keeper.allow(/403/) // The page stays open when the round closes, and is told that there is nothing left to tag.
    await keeper.page.goto(new URL(path(/keeper/i)).pathname)
    await press(keeper.page, 'Tagged')
    await seen(keeper.page, /1 of \d tagged/)
    for (const link of handovers.filter((one) => one.what === 'seat')) {
      if (link.label === 'Bram' || link.label === 'Cleo') {
        const screen = await browser.open({ baseURL: app.url, name: link.label })
        screen.allow(/Failed to load resource/, /ERR_INTERNET_DISCONNECTED/)
        await sitDown(screen.page, link.url)
        phones.push({ name: link.label, screen, seat: link.id })
      } else {
        const visitor = visit(app.url)
        await visitor.call(seats.join, { params: { token: link.url.split('/').at(-1) ?? '' } })
        await visitor.call(seats.giveConsent, {
          params: { seat: link.id },
          body: { version: seats.consentVersion, adult: true },
        })
        others.push({ name: link.label, visitor, seat: link.id })
      }
    }
    expect([phones.length, others.length]).toEqual([2, 5])
  })

  it('loses and doubles nothing: network cut, page reloaded, submit doubled, a second tab', async () => {
    const done = new Set<string>()
    for (let turn = 1; done.size < 2 && turn <= 7; turn++) {
      await nextTurn()
      await othersRate()
      for (const { name, screen, seat } of phones) {
        const held = await inHand(seat)
        if (held?.state !== 'handed') continue
        const { page } = screen
        await page.getByLabel('Digits').fill(held.code === '987' ? '986' : '987', within)
        await press(page, 'This is my pouch')
        await seen(page, /not the digits of your pouch/)
        await takePouch(page, held.code)
        if (name === 'Bram') {
          // The page is reloaded in the middle; what was touched is still there.
          await page.getByRole('slider').focus()
          await page.keyboard.press('Home') // The first key sets the middle, whichever it is.
          await page.keyboard.press('End')
          await seen(page, /saved on this phone/i)
          await page.reload()
          await page.getByRole('heading', { name: 'First, as a whole' }).waitFor(within)
          await expect
            .poll(() => page.getByRole('slider').getAttribute('aria-valuetext'), within)
            .toMatch(/100 of 100/)
          await rateAll(page, turn)
          // Two tabs send the same serving, one of them twice.
          const twin = await screen.context.newPage()
          await twin.goto(page.url())
          const send = (tab: Page) => tab.getByRole('button', { name: 'Send this serving' })
          await send(twin).waitFor(within)
          // Straight to the element: whichever tab is first takes the verb away from the other.
          const twice = (node: HTMLElement | SVGElement) =>
            [0, 1].forEach(() => (node as HTMLElement).click())
          await Promise.all([
            send(page).evaluate(twice),
            send(twin)
              .evaluate(twice)
              .catch(() => undefined),
          ])
          await expect.poll(async () => (await inHand(seat))?.state, within).toBe('submitted')
          await twin.close()
        } else {
          await rateAll(page, turn)
          await screen.context.setOffline(true)
          await press(page, 'Send this serving')
          await seen(page, /not sent yet|kept on this phone|waiting to be sent/i)
          expect((await inHand(seat))?.state).toBe('confirmed')
          await screen.context.setOffline(false)
        }
        await expect.poll(async () => (await inHand(seat))?.state, within).toBe('submitted')
        done.add(name)
      }
    }
    expect(done.size).toBe(2)
    const [kept] = await app.owner.query(
      `select count(*)::int as n from (select serving_id from submissions group by serving_id having count(*) > 1) twice`,
    )
    expect(kept).toEqual([{ n: 0 }])
  })

  it('goes on when one listener leaves, to the last turn and the end questions', async () => {
    const leaver = others.at(-1)
    await organiser.context.request.post(app.url + addressOf(seatLeaves, { params: at }), {
      data: { seat: leaver?.seat },
      headers: { Origin: app.url },
    })
    for (let now = await table(); !now.sitting.ended; now = await table()) {
      for (const { screen, seat } of phones) {
        const held = await inHand(seat)
        if (held?.state !== 'handed') continue
        await takePouch(screen.page, held.code)
        await rateAll(screen.page, now.sitting.turn)
        await press(screen.page, 'Send this serving')
        await expect.poll(async () => (await inHand(seat))?.state, within).toBe('submitted')
      }
      await othersRate()
      await nextTurn()
    }
    for (const { screen } of phones) {
      await screen.page.getByLabel('No, none').check(within)
      await press(screen.page, 'Send the answers')
      await seen(screen.page, 'Thank you. That was all')
    }
    for (const { visitor, seat } of others.slice(0, -1))
      await visitor.call(seats.answerEnd, {
        params: { seat },
        body: { recognised: 'none', recognitions: [] },
      })
  })

  it('closes, and the key opens: agreement for the organiser, the reveal for the room, an own report for each', async () => {
    const { page } = organiser
    await page.goto(`/p/${at.panel}/rounds/${at.round}/progress`)
    await press(page, 'Close the round')
    await page
      .getByRole('dialog')
      .getByRole('button', { name: /^Close (the round|it all)/ })
      .click()
    await seen(page, /closed/i)
    await expect
      .poll(
        async () =>
          (
            (await (
              await organiser.context.request.get(app.url + addressOf(getRound, { params: at }))
            ).json()) as { status: string }
          ).status,
        within,
      )
      .toBe('closed')
    await page.goto(`/p/${at.panel}/rounds/${at.round}/agreement`)
    await page
      .getByText(/Krippendorff/)
      .first()
      .waitFor({ state: 'attached', ...within })
    await seen(page, 'Small panel: at least six listeners on each unit')
    await page.goto(`/p/${at.panel}/rounds/${at.round}/reveal`)
    for (const _ of units) await press(page, 'Next')
    for (const [, name] of units) await seen(page, name)
    const { page: phone } = phones[0]!.screen
    await phone.reload()
    await seen(phone, 'What you heard, beside the panel')
  })

  it('is published once what readers must know is filled in, and a stranger checks it in their own browser', async () => {
    const { page } = organiser
    await page.goto(`/p/${at.panel}/rounds/${at.round}/verdict`)
    for (const [, name] of units) {
      const section = page.getByRole('region', { name })
      await section.getByLabel('Bought', { exact: true }).check(within)
      await section
        .getByLabel('The sentence readers will see')
        .fill('Bought by the panel at the usual price.')
      await section.getByLabel('There is no price').check()
      await section.getByRole('button', { name: `Keep what is known of ${name}` }).click()
      await section.getByText('Kept.').waitFor(within)
    }
    await page.getByLabel('Headline', { exact: true }).fill('Four small ones, heard by seven on one evening')
    await page.getByLabel('Summary', { exact: true }).fill('Nobody knew which was which.')
    await press(page, 'Keep the words')
    await press(page, 'Publish the verdict')
    await page.getByRole('dialog').getByRole('button', { name: 'Publish the verdict' }).click()
    await expect.poll(() => page.url(), within).toMatch(/\/verdicts\//)
    const reader = await browser.open({ baseURL: app.url, width: 1280, height: 900, name: 'reader' })
    await reader.page.goto('/')
    await reader.page
      .getByRole('link', { name: /Four small ones, heard by seven/ })
      .first()
      .click()
    await headed(reader.page, /Four small ones, heard by seven/)
    await press(reader.page, 'Check it')
    await seen(reader.page, 'Fingerprint of the key')
    await expect.poll(() => reader.page.locator('main').innerText(), within).toMatch(/draw/i)
    expect(await reader.page.getByText(/does not match|differs/i).count()).toBe(0)
    expect(await reader.page.locator('body').innerText()).not.toMatch(/Bram|Cleo|Dario|Kaat/)
  })
})
