import type { BrowserContext, Page } from 'playwright-core'
import { addressOf } from '#src/lib/call.ts'
import { listHandovers, type Handover } from '#shared/contracts/rounds.ts'

const within = { timeout: 60_000 }
export const press = (page: Page, name: string | RegExp): Promise<void> =>
  page.getByRole('button', { name }).click(within)
export const seen = (page: Page, text: string | RegExp): Promise<void> =>
  page.getByText(text).first().waitFor(within)

export const units = [
  ['Saltmarsh Audio', 'Tern One'],
  ['Lantern Reed', 'Dunlin'],
  ['Saltmarsh Audio', 'Whimbrel'],
  ['Eddy & Shoal', 'Avocet'],
] as const
export const listeners = ['Bram', 'Cleo', 'Dario', 'Edda', 'Finn', 'Gerd', 'Hanne'] as const

/** From the first address to an open round, on one phone: the organiser stewards, Kaat keeps the key. */
export async function organise(page: Page): Promise<void> {
  await page.goto('/sign-up')
  await page.getByLabel('Your name').fill('Ines Falk')
  await page.getByLabel('Email address').fill('ines-evening@example.org')
  await page.getByLabel('Password').fill('three quiet herons')
  await page.getByLabel('Panel').fill('The Quayside Bench')
  await press(page, 'Create the account')
  await page.getByRole('heading', { level: 1, name: 'The Quayside Bench' }).waitFor(within)
  await page.getByRole('link', { name: 'Start an evening' }).first().click()
  await page.getByRole('heading', { level: 1, name: 'Start an evening' }).waitFor(within)
  for (const [nth, [maker, name]] of units.entries()) {
    if (nth >= 3) await press(page, /^Add a unit/)
    await page.getByLabel(`Maker of unit ${nth + 1}`).fill(maker)
    await page.getByLabel(`Name of unit ${nth + 1}`).fill(name)
  }
  const people = ['Kaat', ...listeners]
  for (const [nth, name] of people.entries()) {
    const field = page.getByLabel(`Person ${nth + 2}`, { exact: true })
    if ((await field.count()) === 0) await press(page, 'Add a person')
    await field.fill(name)
  }
  await page.getByLabel('Ines Falk listens').uncheck()
  for (const folded of await page.locator('form details').all())
    if ((await folded.getByLabel('Who stewards').count()) > 0) await folded.locator('summary').click()
  await page.getByLabel('One person behind a screen, who does not listen').check()
  await page.getByLabel('Who tags the pouches', { exact: true }).selectOption({ label: 'Kaat' })
  await page.getByLabel('Who stewards').selectOption({ label: 'Ines Falk' })
  await press(page, 'Look over the plan')
  await press(page, 'Open the round')
  await page.getByRole('dialog').getByRole('button', { name: 'Open the round' }).click(within)
}

/** The links that the organiser hands over, read with the organiser's own session. */
export async function handoversFrom(
  context: BrowserContext,
  url: string,
  at: { panel: string; round: string },
): Promise<Handover[]> {
  const answer = await context.request.get(url + addressOf(listHandovers, { params: at }))
  return ((await answer.json()) as { handovers: Handover[] }).handovers
}

/** A listener on a phone: the link, what is coming, consent. */
export async function sitDown(page: Page, link: string): Promise<void> {
  await page.goto(new URL(link).pathname)
  await press(page, 'Go on')
  await page.getByLabel('I am an adult, I have read this, and I want to take part').check(within)
  await press(page, 'Take part')
  await seen(page, 'The steward starts when everybody is here.')
}

/** The digits off the pouch, then the seal check, to the first line. */
export async function takePouch(page: Page, code: string): Promise<void> {
  await page.getByLabel('Digits').fill(code, within)
  await press(page, 'This is my pouch')
  for (const question of ['Is the bass there?', 'Are both ears equal?', 'Is the voice in the middle?']) {
    await page.getByRole('heading', { name: question }).waitFor(within)
    await press(page, 'Yes')
  }
  await page.getByRole('heading', { name: 'First, as a whole' }).waitFor(within)
}

/** Answers every line of the screen: the first by the plus sign, the last with "can't tell". */
export async function answerScreen(page: Page, steps: number): Promise<void> {
  const lines = page.getByRole('slider')
  const count = await lines.count()
  for (let nth = 0; nth < count; nth++) {
    await lines.nth(nth).focus()
    for (let step = 0; step <= steps % 5; step++) await page.keyboard.press('ArrowRight')
    if (steps % 2 === 0) await page.keyboard.press('PageUp')
  }
}

/** Goes through all screens, to the last look. */
export async function rateAll(page: Page, steps: number): Promise<void> {
  for (;;) {
    await answerScreen(page, steps)
    const next = page.getByRole('button', { name: /^Next: / })
    const words = (await next.textContent()) ?? ''
    await next.click()
    if (words.includes('remark')) break
    await page.getByRole('button', { name: words }).waitFor({ state: 'hidden', ...within })
  }
  await press(page, 'Next: a last look')
}
