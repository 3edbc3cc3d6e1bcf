import { fireEvent, screen, waitFor, within } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { getPanel, listMembers, listUnits } from '#shared/contracts/panels.ts'
import { createEvening } from '#shared/contracts/rounds.ts'
import { paths, to } from '#src/app/paths.ts'
import { fakeServer, Refusal, showPage } from '#tests/support/show-page.tsx'
import { draftRound, ids, panel } from '../round.fixture.ts'
import NewEveningPage from './NewEveningPage.tsx'

const units = [
  ['Lantern Reed', 'Dunlin'],
  ['Saltmarsh Audio', 'Whimbrel'],
  ['Saltmarsh Audio', 'Tern One'],
] as const

function standIn() {
  return fakeServer()
    .on(getPanel, () => panel)
    .on(listUnits, () => ({ units: [], withheld: 0 }))
    .on(listMembers, () => ({ members: [{ id: ids.bo, name: 'Bo', roles: ['panelist'], signsIn: false }] }))
}

const open = async () => {
  const view = showPage(NewEveningPage, paths.newRound.pattern, to('newRound', { panel: panel.slug }), {
    [paths.plan.pattern]: 'The plan is shown',
  })
  await screen.findByRole('heading', { name: 'Start an evening' })
  return view
}
const type = (label: string, text: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value: text } })
const nameAll = () => {
  for (const [nth, [maker, name]] of units.entries()) {
    type(`Maker of unit ${nth + 1}`, maker)
    type(`Name of unit ${nth + 1}`, name)
  }
  type('Person 2', 'Bo')
  type('Person 3', 'Cy')
}
const send = () => userEvent.click(screen.getByRole('button', { name: 'Look over the plan' }))

beforeEach(() => window.sessionStorage.clear())
afterEach(() => vi.unstubAllGlobals())

describe('starting an evening', () => {
  it('needs nothing but names', async () => {
    const server = standIn().on(createEvening, () => draftRound)
    await open()
    expect(screen.getByLabelText('Person 1, you')).toHaveValue('Ines Falk')
    nameAll()
    expect(screen.getByText(/^Three units, three listeners/)).toBeVisible()
    await send()
    await screen.findByText('The plan is shown')
    const [sent] = server.asked('createEvening')
    expect(sent?.body).toMatchObject({
      units: units.map(([maker, name]) => ({ maker, name })),
      people: [{ name: 'Ines Falk', steward: true, you: true }, { name: 'Bo' }, { name: 'Cy' }],
      tagging: 'split',
      levelMatching: 'not-matched',
      primaryDescriptor: 'overall-liking',
    })
    expect(sent?.key).toBeTruthy()
    expect(window.sessionStorage.length).toBe(0)
  }, 30_000)

  it('says what is missing, at each field and on top, and takes focus there', async () => {
    standIn()
    await open()
    type('Name of unit 1', 'Dunlin')
    await send()
    const summary = await screen.findByRole('alert')
    expect(summary).toHaveFocus()
    const link = within(summary).getByRole('link', { name: 'Unit 1: Enter the maker.' })
    expect(screen.getByLabelText('Maker of unit 1')).toBeInvalid()
    expect(screen.getByLabelText('Maker of unit 1')).toHaveAccessibleDescription('Enter the maker.')
    expect(screen.getByLabelText('Name of unit 1')).toHaveValue('Dunlin')
    await userEvent.click(link)
    expect(screen.getByLabelText('Maker of unit 1')).toHaveFocus()
  }, 30_000)

  it('loses nothing to a reload', async () => {
    standIn()
    const { unmount } = await open()
    type('Name of unit 2', 'Knot')
    unmount()
    await open()
    expect(screen.getByLabelText('Name of unit 2')).toHaveValue('Knot')
    await userEvent.click(screen.getByRole('button', { name: 'Start afresh' }))
    expect(screen.getByLabelText('Name of unit 2')).toHaveValue('')
  }, 30_000)

  it('puts what the server refuses at its input, and sends again under the same key', async () => {
    const answers = [
      new Refusal('invalid', 'Look at these again.', {
        'units.1.name': 'A round that is open uses this unit.',
      }),
      new Refusal('unavailable', 'The database is away.'),
    ]
    const server = standIn().on(createEvening, () => answers.shift() ?? draftRound)
    await open()
    nameAll()
    await send()
    await waitFor(() =>
      expect(screen.getByLabelText('Name of unit 2')).toHaveAccessibleDescription(
        'A round that is open uses this unit.',
      ),
    )
    expect(screen.getByLabelText('Name of unit 2')).toHaveValue('Whimbrel')
    type('Name of unit 2', 'Knot')
    await send()
    expect(await screen.findByText('Request r-1')).toBeVisible()
    expect(screen.getByText('What you typed is still here.')).toBeVisible()
    await send()
    await screen.findByText('The plan is shown')
    const [first, second, third] = server.asked('createEvening').map((asked) => asked.key)
    expect(second).not.toBe(first)
    expect(third).toBe(second)
  }, 30_000)

  it('takes the seat from whoever keeps the codes, and says so', async () => {
    standIn()
    await open()
    await userEvent.click(screen.getByRole('radio', { name: /One person behind a screen/ }))
    const listens = screen.getByRole('checkbox', { name: 'Ines Falk tags and cannot listen' })
    expect(listens).toBeDisabled()
    expect(listens).not.toBeChecked()
    await userEvent.selectOptions(screen.getByLabelText('Who tags the pouches'), 'Person 3')
    expect(screen.getByRole('checkbox', { name: 'Person 3 tags and cannot listen' })).toBeDisabled()
  }, 30_000)

  it('refuses a unit’s name where listeners would read it', async () => {
    standIn()
    await open()
    nameAll()
    type('Question', 'Is Dunlin the best?')
    await send()
    const question = screen.getByLabelText('Question')
    await waitFor(() =>
      expect(question).toHaveAccessibleDescription(/Listeners read this: leave out “Dunlin”/),
    )
  }, 30_000)
})
