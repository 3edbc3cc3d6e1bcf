import type { Locator, Page } from 'playwright-core'

const isFocused = (locator: Locator): Promise<boolean> =>
  locator.evaluate((node) => node === document.activeElement, undefined, { timeout: 60_000 })

/** Presses Tab until the focus is on it, as somebody without a pointer would; fails where it is never reached. */
export async function tabTo(page: Page, locator: Locator, most = 60): Promise<void> {
  await locator.waitFor({ timeout: 60_000 })
  for (let pressed = 0; pressed <= most; pressed++) {
    if (await isFocused(locator)) return
    await page.keyboard.press('Tab')
  }
  throw new Error(`${most} presses of Tab do not lead to ${locator}`)
}

/** Reaches a button by Tab, sees that the focus shows, and presses Enter. */
export async function enter(page: Page, name: string | RegExp): Promise<void> {
  const button = page.getByRole('button', { name }).first()
  await tabTo(page, button)
  await page.keyboard.press('Enter')
}
