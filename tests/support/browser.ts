import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core'
import { afterAll, afterEach, beforeAll, expect } from 'vitest'
import { ensureChromium } from '../../scripts/start/chromium.mjs'

/** One person at one screen: a context with its own cookies and storage, and a page in it. */
export interface Screen {
  context: BrowserContext
  page: Page
  /** Lets this screen's console write errors that match; all others fail the test. */
  allow(...patterns: RegExp[]): void
}

export interface ScreenOptions {
  /** The application's address: `page.goto('/sign-in')` is under it. */
  baseURL: string
  /** 390 (a phone) unless said otherwise. */
  width?: number
  height?: number
  colorScheme?: 'light' | 'dark'
  reducedMotion?: 'reduce' | 'no-preference'
  /** For the messages of a test that fails. */
  name?: string
}

const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  // Stands for a host of the local network, which browsers do not trust without TLS.
  '--host-resolver-rules=MAP panel.test 127.0.0.1',
]

/**
 * One Chromium for the test file. Its screens stay open until the file ends; after each test every console error
 * and every uncaught error of theirs that was not allowed fails it.
 */
export function useBrowser(): { open(options: ScreenOptions): Promise<Screen> } {
  let browser: Browser
  const contexts: BrowserContext[] = []
  const complaints: string[] = []

  beforeAll(async () => {
    const executablePath = await ensureChromium(() => {})
    browser = await chromium.launch({ executablePath, args: flags, headless: true })
  })
  afterEach(() => {
    const said = complaints.splice(0)
    expect(said, 'errors on screens that the test did not expect').toEqual([])
  })
  afterAll(async () => {
    await Promise.all(contexts.map((context) => context.close()))
    await browser?.close()
  })

  return {
    open: async ({ baseURL, width = 390, height = 844, name = 'screen', ...more }) => {
      const phone = width < 600
      const context = await browser.newContext({
        baseURL,
        viewport: { width, height },
        hasTouch: phone,
        reducedMotion: 'reduce',
        locale: 'en-GB',
        timezoneId: 'UTC',
        ...more,
      })
      contexts.push(context)
      const allowed: RegExp[] = []
      const complain = (line: string) => {
        if (!allowed.some((pattern) => pattern.test(line))) complaints.push(`${name}: ${line}`)
      }
      context.on('console', (message) => {
        if (message.type() === 'error') complain(`${message.text()} (${message.location().url})`)
      })
      context.on('weberror', (error) => complain(error.error().stack ?? error.error().message))
      const page = await context.newPage()
      page.setDefaultTimeout(30_000)
      return { context, page, allow: (...patterns) => void allowed.push(...patterns) }
    },
  }
}
