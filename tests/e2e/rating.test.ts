import type { Locator, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { getTable } from '#shared/contracts/table.ts'
import { coreScorecard } from '#shared/domain/lexicon.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { useBrowser } from '#tests/support/browser.ts'
import { anEvening, goOn, openEvening, type OpenEvening } from '#tests/support/evening.ts'
import { enter, tabTo } from '#tests/support/keyboard.ts'
import { overflowOf, setTextSize } from '#tests/support/reflow.ts'
import { takeSession } from '#tests/support/signed-in.ts'

const browser = useBrowser()
const within = { timeout: 60_000 }
let app: TestApp
let evening: OpenEvening

beforeAll(async () => {
  app = await startApp({ pages: true })
  // As many units as listeners: in every turn each of them holds a pouch.
  const units = [...anEvening().units, { maker: 'Eddy & Shoal', name: 'Godwit' }]
  evening = await openEvening(app.url, anEvening({ units, scorecard: [...coreScorecard] }))
  await goOn(evening)
})
afterAll(() => app.close())

const seal = ['Is the bass there?', 'Are both ears equal?', 'Is the voice in the middle?']
const servingOf = async (seat: string) => {
  const shown = await evening.steward.call(getTable, { params: evening.at })
  return shown.seats.find((one) => one.id === seat)?.serving ?? null
}

/** The phones are given out one by one: each test takes the next listener who holds a pouch. */
const free = { next: 0 }
async function listenerWithPouch(name: string, width = 390) {
  const screen = await browser.open({ baseURL: app.url, name, width })
  for (;;) {
    const listener = evening.listeners[free.next++]
    if (!listener) throw new Error('nobody is left who holds a pouch')
    const serving = await servingOf(listener.seat)
    if (serving?.state !== 'handed') continue
    await takeSession(screen.context, app.url, listener.visitor)
    return { ...screen, seat: listener.seat, code: serving.code }
  }
}

const titled = (page: Page, name: string | RegExp) =>
  page.getByRole('heading', { level: 1, name }).waitFor(within)
const atSeat = async (page: Page, seat: string): Promise<void> => {
  await page.goto(`/seat/${seat}`)
  await titled(page, 'Type the three digits on your pouch')
}
const says = (line: Locator, words: RegExp): Promise<void> =>
  expect.poll(() => line.getAttribute('aria-valuetext'), within).toMatch(words)

describe('the rating screen', () => {
  it('takes a serving by keyboard alone, from the digits to sending', async () => {
    const { page, seat, code } = await listenerWithPouch('keyboard')
    await atSeat(page, seat)
    await tabTo(page, page.getByLabel('Digits'))
    await page.keyboard.type(code)
    await page.keyboard.press('Enter')
    for (const question of seal) {
      await titled(page, question)
      await enter(page, 'Yes')
    }
    await titled(page, 'First, as a whole')
    const next = page.getByRole('button', { name: /^Next: / })
    for (;;) {
      const title = await page.getByRole('heading', { level: 1 }).innerText()
      for (const line of await page.getByRole('slider').all()) {
        await tabTo(page, line)
        await says(line, /^not answered$/)
        await page.keyboard.press('ArrowRight') // The first key sets the middle, whichever it is.
        await says(line, /^50 of 100/)
        for (const key of ['PageUp', 'ArrowLeft']) await page.keyboard.press(key)
        await says(line, /^59 of 100/)
      }
      if (title.includes('First')) {
        // Cleared, said to be untellable, and answered after all.
        await page.keyboard.press('Delete')
        await says(page.getByRole('slider'), /^not answered$/)
        await tabTo(page, page.getByRole('checkbox', { name: 'I can’t tell' }))
        await page.keyboard.press('Space')
        await says(page.getByRole('slider'), /^answered: I can’t tell$/)
      }
      const words = await next.innerText()
      await enter(page, words)
      if (words.includes('remark')) break
      await page.getByRole('button', { name: words }).waitFor({ state: 'hidden', ...within })
    }
    await tabTo(page, page.getByRole('textbox'))
    await page.keyboard.type('Clear voices')
    await enter(page, 'Next: a last look')
    await titled(page, 'A last look')
    await enter(page, 'Send this serving')
    await expect.poll(async () => (await servingOf(seat))?.state, within).toBe('submitted')
    const [kept] = await app.owner.query(
      `select count(*) filter (where r.value = 59)::int as lines, count(*) filter (where r.cant_tell)::int as untold
         from ratings r join submissions s on s.id = r.submission_id join servings v on v.id = s.serving_id
        where v.seat_id = '${seat}'`,
    )
    expect(kept).toEqual([{ lines: coreScorecard.length, untold: 1 }])
  })

  it.each([
    ['at 200 % text on a phone of 390 px', 390, 32],
    ['at plain text on a screen of 320 px', 320, 16],
  ] as const)('fits its screen %s, from the digits to the last look', async (title, width, text) => {
    const { page, seat, code } = await listenerWithPouch(title, width)
    if (text !== 16) await setTextSize(page, text)
    await atSeat(page, seat)
    const fits = async (where: string) =>
      expect(await overflowOf(page), where).toEqual({ text, sideways: 0, cut: [] })
    await fits('digits')
    await page.getByLabel('Digits').fill(code)
    await page.getByRole('button', { name: 'This is my pouch' }).click()
    for (const question of seal) {
      await titled(page, question)
      await fits(question)
      await page.getByRole('button', { name: 'Yes' }).click()
    }
    await titled(page, 'First, as a whole')
    const next = page.getByRole('button', { name: /^Next: / })
    for (let words = ''; !words.includes('last look');) {
      for (const line of await page.getByRole('slider').all()) await line.press('ArrowRight')
      words = await next.innerText()
      await fits(`before “${words}”`)
      await next.click()
      await page.getByRole('button', { name: words }).waitFor({ state: 'hidden', ...within })
    }
    await titled(page, 'A last look')
    await fits('the last look')
  })

  it('stays unanswered when a finger scrolls over a line, and takes a tap on it', async () => {
    const { page, context, seat, code } = await listenerWithPouch('finger')
    await atSeat(page, seat)
    await page.getByLabel('Digits').fill(code)
    await page.getByRole('button', { name: 'This is my pouch' }).click()
    for (const question of seal) {
      await titled(page, question)
      await page.getByRole('button', { name: 'Yes' }).click()
    }
    await titled(page, 'First, as a whole')
    await page.getByRole('slider').press('ArrowRight')
    await page.getByRole('button', { name: /^Next: / }).click()
    await page.getByRole('heading', { name: 'First, as a whole' }).waitFor({ state: 'hidden', ...within })
    const track = page.getByTestId('rating-track').nth(1)
    const box = await track.boundingBox()
    if (!box) throw new Error('the line is not on the screen')
    const [x, y] = [box.x + box.width * 0.8, box.y + box.height / 2]
    const device = await context.newCDPSession(page)
    const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', to?: number) =>
      device.send('Input.dispatchTouchEvent', { type, touchPoints: to === undefined ? [] : [{ x, y: to }] })
    await touch('touchStart', y)
    for (let moved = 10; moved <= 200; moved += 10) await touch('touchMove', y - moved)
    await touch('touchEnd')
    await expect.poll(() => page.evaluate(() => window.scrollY), within).toBeGreaterThan(50)
    expect(
      await page.getByTestId('rating-track').evaluateAll((all) => all.map((one) => one.dataset.state)),
    ).not.toContain('answered')
    // Waits until the page stands still again.
    await track.tap({ position: { x: box.width * 0.8, y: box.height / 2 } })
    await expect.poll(() => track.getAttribute('data-state'), within).toBe('answered')
  })
})
