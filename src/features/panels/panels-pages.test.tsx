import { fireEvent, screen, waitFor, within } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import {
  changePanel,
  getPanel,
  listRounds,
  listUnits,
  type Panel,
  type RoundLine,
} from '#shared/contracts/panels.ts'
import { paths, to } from '#src/app/paths.ts'
import { fakeServer, Refusal, showPage } from '#tests/support/show-page.tsx'
import DeskPage from './pages/DeskPage.tsx'
import RoundsPage from './pages/RoundsPage.tsx'
import SettingsPage from './pages/SettingsPage.tsx'
import UnitsPage from './pages/UnitsPage.tsx'

const panel: Panel = {
  slug: 'quayside-bench',
  name: 'The Quayside Bench',
  timeZone: 'UTC',
  version: 3,
  you: { memberId: '33333333-3333-4333-8333-333333333333', name: 'Ines Falk', roles: ['organiser'] },
  can: { startRound: true, edit: true, seeUnits: true },
}
const line = (number: number, status: RoundLine['status'], title: string): RoundLine => ({
  id: `11111111-1111-4111-8111-11111111111${number}`,
  number,
  title,
  status,
  origin: 'live',
  blinding: 'double',
  listeners: 6 + number,
  changedAt: `2026-11-0${number}T18:00:00Z`,
  verdictSlug: status === 'published' ? 'three-under-a-hundred' : null,
})
const rounds = [
  line(1, 'published', 'Three under a hundred'),
  line(2, 'draft', 'Next month'),
  line(3, 'open', 'Tonight'),
]
const at = { panel: panel.slug }

afterEach(() => vi.unstubAllGlobals())

describe('the desk', () => {
  it('puts what needs a hand first, each with its one verb', async () => {
    fakeServer()
      .on(getPanel, () => panel)
      .on(listRounds, () => ({ rounds }))
    showPage(DeskPage, paths.panel.pattern, to('panel', at))
    const next = await screen.findByRole('region', { name: 'What is next in each round' })
    await within(next).findByText('Tonight')
    expect(
      within(next)
        .getAllByRole('heading')
        .map((heading) => heading.textContent),
    ).toEqual(['Tonight', 'Next month'])
    expect(within(next).getByRole('link', { name: 'Go to the evening' })).toHaveAttribute(
      'href',
      to('progress', { ...at, round: rounds[2]!.id }),
    )
    expect(screen.getByRole('link', { name: 'Read the verdict' })).toHaveAttribute(
      'href',
      to('verdict', { slug: 'three-under-a-hundred' }),
    )
  })

  it('says what a round is where there is none yet', async () => {
    fakeServer()
      .on(getPanel, () => panel)
      .on(listRounds, () => ({ rounds: [] }))
    showPage(DeskPage, paths.panel.pattern, to('panel', at))
    expect(await screen.findByText('A round is one blind comparison.')).toBeVisible()
    expect(screen.getByRole('link', { name: 'Start an evening' })).toHaveAttribute('href', to('newRound', at))
  })

  it('offers nobody to start a round who may not', async () => {
    fakeServer()
      .on(getPanel, () => ({ ...panel, can: { ...panel.can, startRound: false } }))
      .on(listRounds, () => ({ rounds }))
    showPage(DeskPage, paths.panel.pattern, to('panel', at))
    await screen.findByText('Tonight')
    expect(screen.queryByRole('link', { name: 'Start an evening' })).toBeNull()
  })
})

describe('the lists', () => {
  it('of rounds are sorted by a press, and the address keeps how', async () => {
    fakeServer()
      .on(getPanel, () => panel)
      .on(listRounds, () => ({ rounds }))
    const { router } = showPage(RoundsPage, paths.rounds.pattern, to('rounds', at))
    await screen.findByRole('table')
    const titles = () => screen.getAllByRole('rowheader').map((cell) => cell.textContent)
    expect(titles()).toEqual(['Tonight', 'Next month', 'Three under a hundred'])
    fireEvent.click(screen.getByRole('button', { name: 'Round' }))
    await waitFor(() => expect(titles()).toEqual(['Next month', 'Three under a hundred', 'Tonight']))
    expect(router.state.location.search).toBe('?by=title&way=up')
  })

  it('of units say how many are under the cloth', async () => {
    fakeServer()
      .on(getPanel, () => panel)
      .on(listUnits, () => ({ units: [], withheld: 4 }))
    showPage(UnitsPage, paths.units.pattern, to('units', at))
    expect(await screen.findByText('Four units under the cloth')).toBeVisible()
    expect(screen.queryByText('A unit is one physical earphone.')).toBeNull()
  })

  it('say when the server is away, and ask again when told so', async () => {
    const server = fakeServer()
      .on(getPanel, () => panel)
      .on(listRounds, () => ({ rounds }))
    server.reachable = false
    showPage(RoundsPage, paths.rounds.pattern, to('rounds', at))
    const again = await screen.findByRole('button', { name: 'Try again' }, { timeout: 8_000 })
    server.reachable = true
    fireEvent.click(again)
    expect(await screen.findByRole('link', { name: 'Tonight' })).toBeVisible()
  }, 15_000)
})

describe('the settings', () => {
  it('put a refused name at its field, and keep it', async () => {
    fakeServer()
      .on(getPanel, () => panel)
      .on(changePanel, () => new Refusal('invalid', 'Look again.', { name: 'Another panel has this name.' }))
    showPage(SettingsPage, paths.settings.pattern, to('settings', at))
    const name = await screen.findByLabelText('Name of the panel')
    fireEvent.change(name, { target: { value: 'The Other Bench' } })
    fireEvent.click(screen.getByRole('button', { name: 'Save the settings' }))
    await waitFor(() => expect(name).toHaveAccessibleDescription(/Another panel has this name\.$/))
    expect(name).toHaveValue('The Other Bench')
  })

  it('are only read by a member who may not change them', async () => {
    fakeServer().on(getPanel, () => ({ ...panel, can: { ...panel.can, edit: false } }))
    showPage(SettingsPage, paths.settings.pattern, to('settings', at))
    expect(await screen.findByText(/Only an organiser of the panel changes/)).toBeVisible()
    expect(screen.queryByRole('button', { name: 'Save the settings' })).toBeNull()
  })
})
