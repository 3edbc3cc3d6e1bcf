import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { chromium, type Browser, type Page } from 'playwright-core'
import { takeSession } from '#tests/support/signed-in.ts'
import type { Visitor } from '#tests/support/visitor.ts'

const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]
const sizes = [
  { width: 390, height: 844 },
  { width: 1280, height: 900 },
] as const
const schemes = [
  ['light', 'light'],
  ['dark', 'dusk'],
] as const

export interface Camera {
  /** A page in which this visitor is who they are. */
  open(visitor: Visitor): Promise<Page>
  /** Four pictures of the page as it stands. */
  take(page: Page, name: string): Promise<void>
  close(): Promise<void>
}

/** The whole page's, so that what sticks to the window's foot stands at the page's foot. */
const heightOf = (page: Page): Promise<number> =>
  page.evaluate('Math.max(document.documentElement.scrollHeight, document.querySelector(".stage")?.scrollHeight ?? 0)')

/** @param url the application's address  @param folder where pictures go */
export async function setUpCamera(url: string, folder: string, executablePath: string): Promise<Camera> {
  mkdirSync(folder, { recursive: true })
  const browser: Browser = await chromium.launch({ executablePath, args: flags, headless: true })
  return {
    open: async (visitor) => {
      const context = await browser.newContext({
        baseURL: url,
        viewport: sizes[0],
        reducedMotion: 'reduce',
        locale: 'en-GB',
        timezoneId: 'UTC',
      })
      await takeSession(context, url, visitor)
      const page = await context.newPage()
      page.setDefaultTimeout(60_000)
      return page
    },
    take: async (page, name) => {
      for (const size of sizes) {
        await page.setViewportSize(size)
        await page.mouse.move(0, 0)
        for (const [colorScheme, word] of schemes) {
          await page.emulateMedia({ colorScheme })
          await page.waitForTimeout(300) // pictures are drawn anew at the new width
          await page.setViewportSize({ ...size, height: Math.max(size.height, await heightOf(page)) })
          await page.waitForTimeout(150)
          await page.screenshot({ path: join(folder, `${name}-${size.width}-${word}.png`) })
          await page.setViewportSize(size)
        }
      }
      await page.setViewportSize(sizes[0])
      await page.emulateMedia({ colorScheme: 'light' })
    },
    close: () => browser.close(),
  }
}
