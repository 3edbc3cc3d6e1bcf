import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { faultsOf } from '#tests/support/accessibility.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { useBrowser } from '#tests/support/browser.ts'

const browser = useBrowser()
let app: TestApp

beforeAll(async () => {
  app = await startApp({ pages: true, worker: true })
})
afterAll(() => app.close())

describe('a newcomer on a phone', () => {
  it('creates an account with a panel, and comes back to it after a reload', async () => {
    const { page } = await browser.open({ baseURL: app.url, name: 'newcomer' })
    await page.goto('/sign-up')
    await page.getByLabel('Your name').fill('Ruta Vint')
    await page.getByLabel('Email address').fill('ruta@example.org')
    await page.getByLabel('Password').fill('a boat in the fog')
    await page.getByLabel('Panel').fill('North Pier')
    await page.getByRole('button', { name: 'Create the account' }).click()
    await page.getByRole('heading', { level: 1, name: 'North Pier' }).waitFor()
    await page.reload()
    await page.getByRole('heading', { level: 1, name: 'North Pier' }).waitFor()
  })

  it('is told at the field what is wrong, and nothing that was typed is lost', async () => {
    const { page } = await browser.open({ baseURL: app.url, name: 'hasty' })
    await page.goto('/sign-up')
    await page.getByLabel('Your name').fill('Ruta Vint')
    await page.getByLabel('Email address').fill('not an address')
    await page.getByRole('button', { name: 'Create the account' }).click()
    const email = page.getByLabel('Email address')
    await expect.poll(() => email.getAttribute('aria-invalid')).toBe('true')
    expect(await page.getByLabel('Your name').inputValue()).toBe('Ruta Vint')
    expect(await email.inputValue()).toBe('not an address')
  })
})

describe('the pages before signing in', () => {
  it.each(['light', 'dark'] as const)('have nothing for axe to find, %s', async (colorScheme) => {
    const { page } = await browser.open({ baseURL: app.url, colorScheme, name: colorScheme })
    for (const path of ['/', '/sign-in', '/sign-up', '/forgot']) {
      await page.goto(path)
      await page.getByRole('heading', { level: 1 }).waitFor()
      expect(await faultsOf(page), path).toEqual([])
    }
  })
})
