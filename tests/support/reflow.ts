import type { Page } from 'playwright-core'

/** Sets the size of plain text as a reader does in the browser's settings: 32 is 200 %. */
export async function setTextSize(page: Page, standard: number): Promise<void> {
  const session = await page.context().newCDPSession(page)
  await session.send('Page.enable')
  await session.send('Page.setFontSizes', { fontSizes: { standard, fixed: standard } })
}

export interface Overflow {
  /** Size of plain text in force, in pixels. */
  text: number
  /** Pixels by which the page is wider than the screen: it scrolls sideways. */
  sideways: number
  /** Controls and texts that reach over the edge of the screen. */
  cut: string[]
}

/** What of the page does not fit its width. */
export const overflowOf = (page: Page): Promise<Overflow> =>
  page.evaluate(() => {
    const root = document.documentElement
    const width = root.clientWidth
    const shown = [...document.querySelectorAll('h1, h2, h3, p, label, button, a, input, li, dd, dt, td, th')]
    const cut = shown
      .filter((node) => !node.closest('.visually-hidden') && node.checkVisibility())
      .map((node) => ({ node, box: node.getBoundingClientRect() }))
      .filter(({ box }) => box.width > 1 && (box.right > width + 1 || box.left < -1))
      .map(({ node }) => `${node.tagName.toLowerCase()} ${(node.textContent ?? '').trim().slice(0, 40)}`)
    return {
      text: Number.parseFloat(getComputedStyle(root).fontSize),
      sideways: root.scrollWidth - width,
      cut,
    }
  })
