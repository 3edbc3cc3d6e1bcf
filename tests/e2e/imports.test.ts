import { readFileSync } from 'node:fs'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Page } from 'playwright-core'
import { listRounds } from '#shared/contracts/panels.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { useBrowser } from '#tests/support/browser.ts'
import { signUpOrganiser } from '#tests/support/evening.ts'
import { headed, takeSession } from '#tests/support/signed-in.ts'
import type { Visitor } from '#tests/support/visitor.ts'

const browser = useBrowser()
let app: TestApp
let organiser: Visitor
let panel: string

beforeAll(async () => {
  app = await startApp({ pages: true })
  ;({ visitor: organiser, panel } = await signUpOrganiser(app.url))
})
afterAll(() => app.close())

async function importPage(name: string): Promise<Page> {
  const { context, page } = await browser.open({ baseURL: app.url, width: 1280, height: 900, name })
  await takeSession(context, app.url, organiser)
  await page.goto(`/p/${panel}/import`)
  await headed(page, 'Bring ratings you already have')
  return page
}

const fixture = (name: string): Buffer => readFileSync(new URL(`../fixtures/stats/${name}`, import.meta.url))

async function store(page: Page, name: string, bytes: Buffer): Promise<void> {
  await page.getByLabel('Ratings file').setInputFiles({ name, mimeType: 'text/csv', buffer: bytes })
  await page.getByText('Every row can be read.').waitFor()
  await page.getByLabel('Title').fill(name)
  await page.getByLabel('Question').fill('Does it agree with what was published?')
  await page.getByRole('button', { name: 'Store the ratings' }).click()
  await headed(page, name)
}

/** Opens every disclosure, so that the numbers behind the pictures can be read. */
async function numbersOf(page: Page): Promise<string> {
  for (const summary of await page.locator('details > summary').all())
    await summary.evaluate((node) => ((node.parentElement as HTMLDetailsElement).open = true))
  return (await page.locator('main').innerText()).replace(/\s+/g, ' ')
}

describe('ratings that somebody already has', () => {
  it('give the published REML estimates of the Machines data, read off the agreement screen', async () => {
    // Machines of R's nlme (Pinheiro & Bates 2000): 6 workers × 3 machines × 3 replicates.
    const page = await importPage('machines')
    await store(page, 'machines.csv', fixture('machines.csv'))
    const text = await numbersOf(page)
    for (const [component, variance] of [
      ['panelist', '22.8584'],
      ['panelist:unit', '13.9095'],
      ['residual', '0.9246'],
    ])
      expect(text, component).toMatch(new RegExp(`${component} ${variance}`))
    expect(text).toMatch(/criterion 215\.6876/)
    expect(text).toMatch(/F\(2, 10(\.0+)?\) = 20\.5761/)
    // Adjusted means 52.355556, 60.322222, 66.272222; standard error 2.485830, df 8.52 (Kenward–Roger).
    for (const mean of ['52.36', '60.32', '66.27']) expect(text).toContain(mean)
    expect(text).toContain('2.4858 8.52')
    expect(text).toContain('Imported ratings')
  })

  it('give the published REML estimates of the Penicillin data', async () => {
    // Penicillin of R's lme4 (Davies & Goldsmith 1972): 24 plates as listeners, 6 samples as units. In a balanced table
    // plate and residual are the same whether samples are fixed or random: .716908 and .302415 by mean squares.
    const page = await importPage('penicillin')
    await store(page, 'penicillin.csv', fixture('penicillin.csv'))
    const text = await numbersOf(page)
    expect(text).toMatch(/panelist 0\.7169/)
    expect(text).toMatch(/residual 0\.3024/)
  })

  it('name ten faults in a thousand rows by line, and store nothing until they are left out', async () => {
    const faults = new Map([
      [17, 'p17,Dunlin,width,1,1,sixty'],
      [101, ',Dunlin,width,1,1,60'],
      [102, 'p102,,width,1,1,60'],
      [230, 'p230,Dunlin,,1,1,60'],
      [231, 'p231,Dunlin,width,1,first,60'],
      [500, 'p1,Dunlin,width,1,1,60'],
      [640, 'p640,Dunlin,width,1,1,60,61,62'],
      [777, 'p777,Dunlin,width,1,1,1e999'],
      [800, `${'x'.repeat(400)},Dunlin,width,1,1,60`],
      [999, 'p999,Dunlin,width,1,-3,60'],
    ])
    const lines = Array.from(
      { length: 1000 },
      (_, index) =>
        faults.get(index + 2) ?? `p${index + 1},${index % 2 ? 'Knot' : 'Dunlin'},width,1,1,${index % 100}`,
    )
    const page = await importPage('faults')
    await page.getByLabel('Ratings file').setInputFiles({
      name: 'faults.csv',
      mimeType: 'text/csv',
      buffer: Buffer.from(`panelist,unit,descriptor,replicate,position,score\n${lines.join('\n')}\n`),
    })
    await page.getByText('10 faults in the file').waitFor()
    for (const line of faults.keys())
      await expect.poll(() => page.getByText(`Line ${line}`, { exact: true }).count()).toBeGreaterThan(0)
    await page.getByLabel('Title').fill('Faults')
    await page.getByLabel('Question').fill('Kept?')
    const rounds = async () =>
      (await organiser.call(listRounds, { params: { panel } })).rounds.filter((one) => one.title === 'Faults')
        .length
    await page.getByRole('button', { name: 'Store the ratings' }).click({ force: true })
    expect(await rounds()).toBe(0)
    expect(await page.getByLabel('Title').inputValue()).toBe('Faults')
    await page.getByLabel('Leave these rows out').check()
    await page.getByRole('button', { name: 'Store the ratings' }).click()
    await headed(page, 'Faults')
    expect(await rounds()).toBe(1)
  })
})
