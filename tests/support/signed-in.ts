import type { BrowserContext, Page } from 'playwright-core'
import type { Visitor } from './visitor.ts'

/** Gives a browser the session that a visitor without a screen already has. */
export async function takeSession(
  context: BrowserContext,
  url: string,
  visitor: Pick<Visitor, 'cookies'>,
): Promise<void> {
  await context.addCookies([...visitor.cookies].map(([name, value]) => ({ name, value, url })))
}

/** Waits for the page's heading: the page has its data. */
export const headed = (page: Page, name: string | RegExp): Promise<void> =>
  page.getByRole('heading', { level: 1, name }).waitFor({ timeout: 60_000 })
