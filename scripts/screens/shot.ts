import type { Page } from 'playwright-core'
import type { PathName } from '#src/app/paths.ts'
import type { Visitor } from '#tests/support/visitor.ts'
import type { Cast } from './cast.ts'

/** One picture: whose page, at which address, and what is done there first. */
export interface Shot {
  /** Begins with the name of its address. */
  name: string
  path: PathName
  who(cast: Cast): Visitor
  /** Brings the demo into the state that the picture shows, and says where to go. */
  go(cast: Cast): string | Promise<string>
  /** What is done on the page before the picture. */
  then?(page: Page, cast: Cast): Promise<unknown>
}

export const reader = (cast: Cast): Visitor => cast.reader
export const organiser = (cast: Cast): Visitor => cast.organiser

export const headed = (page: Page): Promise<void> => page.getByRole('heading', { level: 1 }).first().waitFor()
/** Nothing is awaited any more. */
export async function settled(page: Page): Promise<void> {
  await page.waitForTimeout(300)
  await page.locator('[aria-busy="true"]').first().waitFor({ state: 'detached' })
}
export const press = (page: Page, name: string | RegExp): Promise<void> =>
  page.getByRole('button', { name }).first().click()
