import { screen } from '@testing-library/react'
import { afterEach, describe, expect, test, vi } from 'vitest'
import { join } from '#shared/contracts/seats.ts'
import { paths } from '#src/app/paths.ts'
import { fakeServer, Refusal, showPage } from '#tests/support/show-page.tsx'
import JoinPage from './JoinPage.tsx'

const show = () => showPage(JoinPage, paths.join.pattern, '/join/abcdefgh1234', { '/seat/:seat': 'a seat' })
afterEach(() => vi.unstubAllGlobals())

describe('a seat’s link', () => {
  test('opens the seat and leaves nothing of the link in the way back', async () => {
    const server = fakeServer().on(join, () => ({ path: '/seat/one' }))
    const { router } = show()
    await screen.findByText('a seat')
    expect(router.state.location.pathname).toBe('/seat/one')
    expect(server.asked('join')).toHaveLength(1)
  })

  test('an old link says so and what to do', async () => {
    fakeServer().on(join, () => new Refusal('not_found', 'This link does not work any more.'))
    show()
    await screen.findByRole('heading', { level: 1, name: 'This link does not work any more' })
    expect(screen.getByText(/Ask the organiser or the steward/)).toBeVisible()
    expect(screen.queryByRole('button', { name: 'Try again' })).not.toBeInTheDocument()
  })

  test('a link that this phone may not open says why', async () => {
    fakeServer().on(
      join,
      () => new Refusal('forbidden', 'This phone already holds another part of the round.'),
    )
    show()
    await screen.findByRole('heading', { level: 1, name: 'This link cannot be opened here' })
    expect(screen.getByText('This phone already holds another part of the round.')).toBeVisible()
  })

  test('without a network it can be tried again', async () => {
    const server = fakeServer()
    server.reachable = false
    show()
    await screen.findByRole('heading', { level: 1, name: 'The link could not be opened' })
    expect(screen.getByRole('button', { name: 'Try again' })).toBeVisible()
  })
})
