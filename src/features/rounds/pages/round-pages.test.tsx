import { fireEvent, screen, waitFor, within } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import {
  cancelRound,
  closeRound,
  getProgress,
  getRound,
  listHandovers,
  openRound,
  renewLink,
  type Round,
} from '#shared/contracts/rounds.ts'
import { paths, to } from '#src/app/paths.ts'
import { fakeServer, Refusal, showPage } from '#tests/support/show-page.tsx'
import { draftRound, halfway, ids, openRoundRecord, panel } from '../round.fixture.ts'
import LinksPage from './LinksPage.tsx'
import PlanPage from './PlanPage.tsx'
import ProgressPage from './ProgressPage.tsx'

const at = { panel: panel.slug, round: ids.round }
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }))
const inDialog = () => within(screen.getByRole('dialog'))

const showPlan = async (round: Round) => {
  const server = fakeServer().on(getRound, () => round)
  showPage(PlanPage, paths.plan.pattern, to('plan', at), { [paths.links.pattern]: 'The links are shown' })
  await screen.findByRole('heading', { level: 1, name: round.title })
  return server
}

afterEach(() => vi.unstubAllGlobals())

describe('the plan', () => {
  it('is a sentence, whose parts lead to where they are changed', async () => {
    await showPlan(draftRound)
    expect(screen.getByText(/in three turns of about 7 minutes/)).toHaveTextContent(
      'Three units for two listeners in three turns of about 7 minutes: overall liking and one line each time, about 20 minutes.',
    )
    expect(screen.getByRole('link', { name: 'two listeners' })).toHaveAttribute(
      'href',
      `${to('editRound', at)}#people`,
    )
  })

  it('opens only after it was said what freezes', async () => {
    const server = await showPlan({ ...draftRound, you: { roles: ['organiser', 'panelist'], seatId: null } })
    server.on(openRound, () => openRoundRecord)
    press('Open the round')
    expect(inDialog().getByText('units, people and their duties')).toBeVisible()
    expect(inDialog().getByText(/While the round is open you see what your duty/)).toBeVisible()
    expect(server.asked('openRound')).toHaveLength(0)
    fireEvent.click(inDialog().getByRole('button', { name: 'Open the round' }))
    expect(await screen.findByText('The links are shown')).toBeVisible()
  })

  it('says why it could not be opened, and stays a draft', async () => {
    const server = await showPlan(draftRound)
    server.on(openRound, () => new Refusal('conflict', 'Somebody changed this draft meanwhile.'))
    press('Open the round')
    fireEvent.click(inDialog().getByRole('button', { name: 'Open the round' }))
    expect(await screen.findByText('The draft is as it was.')).toBeVisible()
    expect(screen.getByText('Request r-1')).toBeVisible()
  })

  it('lists what it lacks, and why the verb is off', async () => {
    await showPlan({ ...draftRound, lacks: ['A code keeper'] })
    expect(screen.getByText('A code keeper')).toBeVisible()
    const verb = screen.getByRole('button', { name: 'Open the round' })
    expect(verb).toHaveAttribute('aria-disabled', 'true')
    expect(verb).toHaveAccessibleDescription('It lacks what is listed here.')
    fireEvent.click(verb)
    expect(screen.queryByRole('dialog')).toBeNull()
  })

  it('asks for a reason before it is cancelled', async () => {
    const server = await showPlan(draftRound)
    server.on(cancelRound, () => ({
      ...draftRound,
      status: 'cancelled' as const,
      cancelReason: 'Nobody came.',
    }))
    press('Cancel the round')
    fireEvent.click(inDialog().getByRole('button', { name: 'Cancel the round' }))
    await waitFor(() => expect(screen.getByLabelText('Reason')).toHaveAccessibleDescription('Say why.'))
    fireEvent.change(screen.getByLabelText('Reason'), { target: { value: 'Nobody came.' } })
    fireEvent.click(inDialog().getByRole('button', { name: 'Cancel the round' }))
    expect(await screen.findByText('Cancelled')).toBeVisible()
    expect(screen.getByRole('button', { name: 'Draft it again' })).toBeVisible()
  })

  it('shows no units to an organiser who listens while the round is open', async () => {
    await showPlan({ ...openRoundRecord, units: null })
    expect(screen.getByText('3, under the cloth while you listen or steward')).toBeVisible()
    expect(screen.getByText('b'.repeat(64))).toBeVisible()
  })
})

describe('progress', () => {
  const showProgress = async (progress = halfway) => {
    const server = fakeServer()
      .on(getRound, () => openRoundRecord)
      .on(getProgress, () => progress)
    showPage(ProgressPage, paths.progress.pattern, to('progress', at), {
      [paths.agreement.pattern]: 'Agreement is shown',
    })
    await screen.findByText(/servings are rated/, { selector: 'p' })
    return server
  }

  it('counts servings, and says that it asks by the clock while no events arrive', async () => {
    await showProgress()
    expect(screen.getByText('3 of 6 servings are rated. Turn 2 of 3.')).toBeVisible()
    expect(screen.getByText('Asked again every five seconds.')).toBeVisible()
    expect(screen.getByText('one rating')).toBeVisible()
  })

  it('warns what is out before it closes, and closes all the same when told so', async () => {
    const server = await showProgress()
    server.on(closeRound, () => ({ ...openRoundRecord, status: 'closed' as const }))
    press('Close the round')
    expect(inDialog().getByText('Three servings are not rated.')).toBeVisible()
    expect(inDialog().getByText('Cy: one rating')).toBeVisible()
    fireEvent.click(inDialog().getByRole('button', { name: 'Close it all the same' }))
    expect(await screen.findByText('Agreement is shown')).toBeVisible()
    expect(server.asked('closeRound')[0]?.body).toEqual({ evenIfOut: true })
  })

  it('closes without a warning when everything is in', async () => {
    const server = await showProgress({
      ...halfway,
      turn: 3,
      servings: { planned: 6, submitted: 6, void: 0, out: 0 },
      waitingFor: [],
    })
    server.on(closeRound, () => ({ ...openRoundRecord, status: 'closed' as const }))
    press('Close the round')
    fireEvent.click(inDialog().getByRole('button', { name: 'Close the round' }))
    expect(await screen.findByText('Agreement is shown')).toBeVisible()
    expect(server.asked('closeRound')[0]?.body).toEqual({ evenIfOut: false })
  })
})

describe('links', () => {
  it('are shown with a QR code for each seat and duty, and can be made anew', async () => {
    const seat = {
      what: 'seat' as const,
      label: 'Cy',
      id: ids.seat,
      url: 'http://panel.test/join/abc',
      qr: '<svg xmlns="http://www.w3.org/2000/svg"/>',
      opened: false,
    }
    const server = fakeServer()
      .on(getRound, () => openRoundRecord)
      .on(listHandovers, () => ({
        handovers: [seat, { ...seat, what: 'duty' as const, id: ids.bo, label: 'Steward: Bo' }],
      }))
      .on(renewLink, () => ({ ...seat, url: 'http://panel.test/join/def' }))
    showPage(LinksPage, paths.links.pattern, to('links', at))
    expect(await screen.findByRole('img', { name: 'QR code: Cy, opens the seat on a phone' })).toBeVisible()
    expect(screen.getByRole('heading', { name: 'Steward: Bo' })).toBeVisible()
    press('Make a new link for Cy')
    expect(await screen.findByText('The old link no longer works.')).toBeVisible()
    expect(server.asked('renewLink')[0]?.params.link).toBe(ids.seat)
  })
})
