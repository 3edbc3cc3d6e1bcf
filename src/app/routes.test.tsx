import { QueryClientProvider } from '@tanstack/react-query'
import { fireEvent, render, screen } from '@testing-library/react'
import { createMemoryRouter, matchRoutes, RouterProvider } from 'react-router-dom'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { endSession, getMe, type Me } from '#shared/contracts/account.ts'
import { getPanel, listRounds } from '#shared/contracts/panels.ts'
import { listVerdicts } from '#shared/contracts/verdicts.ts'
import { createQueryClient } from '#src/lib/query-client.ts'
import { allowConsoleErrors } from '#tests/support/console.ts'
import { fakeServer, Refusal } from '#tests/support/show-page.tsx'
import { paths } from './paths.ts'
import { routes } from './routes.tsx'

const nobody: Me = { user: null, panels: [], seats: [], duties: [], mode: 'demo', mailSends: true }

function visit(address: string) {
  const router = createMemoryRouter(routes, { initialEntries: [address] })
  render(
    <QueryClientProvider client={createQueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  )
  return router
}

afterEach(() => vi.unstubAllGlobals())

it.each(Object.entries(paths))('the address "%s" leads to a page of its own', (_, { pattern }) => {
  const matches = matchRoutes(routes, pattern.replace(/:\w+/g, 'x')) ?? []
  expect(matches.at(-1)?.route.path).toBe(pattern)
})

describe('what cannot be shown', () => {
  it('is said to be nowhere, in the same words as what may not be known', async () => {
    fakeServer().on(getMe, () => nobody)
    visit('/no/such/place')
    expect(await screen.findByRole('heading', { name: 'There is nothing at this address' })).toBeVisible()
    expect(document.title).toBe('There is nothing at this address · Scrim')
  })

  it('sends somebody who is not signed in to the sign-in, and remembers where they wanted to go', async () => {
    allowConsoleErrors(/CallError|React Router|error boundary/i)
    fakeServer()
      .on(getMe, () => nobody)
      .on(getPanel, () => new Refusal('not_signed_in', 'Sign in first.'))
      .on(listRounds, () => new Refusal('not_signed_in', 'Sign in first.'))
    const router = visit('/p/quayside-bench')
    expect(await screen.findByRole('heading', { name: 'Sign in' }, { timeout: 10_000 })).toBeVisible()
    expect(router.state.location.search).toBe(`?next=${encodeURIComponent('/p/quayside-bench')}`)
  }, 20_000)

  it('names the request, so that somebody can ask about it', async () => {
    allowConsoleErrors(/CallError|React Router|error boundary/i)
    fakeServer()
      .on(getMe, () => nobody)
      .on(getPanel, () => new Refusal('forbidden', 'Only members see this panel.'))
      .on(listRounds, () => new Refusal('forbidden', 'Only members see this panel.'))
    visit('/p/quayside-bench')
    expect(await screen.findByText('Request r-1', {}, { timeout: 10_000 })).toBeVisible()
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Only members see this panel.')
  }, 20_000)
})

it('nothing of the person who signs out stays on the page', async () => {
  let me: Me = {
    ...nobody,
    user: {
      id: '33333333-3333-4333-8333-333333333333',
      name: 'Ines Falk',
      email: 'ines@example.org',
      version: 1,
    },
    panels: [{ slug: 'quayside-bench', name: 'The Quayside Bench', roles: ['organiser'] }],
  }
  fakeServer()
    .on(getMe, () => me)
    .on(listVerdicts, () => ({ verdicts: [] }))
    .on(endSession, () => {
      me = nobody
      return { done: true as const }
    })
  const router = visit('/how')
  fireEvent.click(await screen.findByRole('button', { name: 'Sign out' }, { timeout: 10_000 }))
  expect(await screen.findByRole('link', { name: 'Sign in' }, { timeout: 10_000 })).toBeVisible()
  expect(screen.queryByText('Ines Falk')).toBeNull()
  expect(screen.queryByText('The Quayside Bench')).toBeNull()
  expect(router.state.location.pathname).toBe('/')
}, 20_000)

it('a page of the demo says that everything is invented', async () => {
  fakeServer().on(getMe, () => nobody)
  visit('/how')
  expect(await screen.findByRole('region', { name: 'Demo' }, { timeout: 10_000 })).toHaveTextContent(
    /invented/,
  )
}, 20_000)
