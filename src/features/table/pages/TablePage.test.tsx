import { screen, waitFor, within } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { afterEach, describe, expect, test, vi } from 'vitest'
import { getRound } from '#shared/contracts/rounds.ts'
import {
  addListener,
  getTable,
  nextTurn,
  reportIncident,
  seatLeaves,
  voidServing,
  type StewardTable,
} from '#shared/contracts/table.ts'
import { paths, to } from '#src/app/paths.ts'
import { fakeServer, Refusal, showPage } from '#tests/support/show-page.tsx'
import { seatIdOf, tableAt, tableFixture, tableSeat, tableServing } from '../table.fixture.ts'
import TablePage from './TablePage.tsx'

const show = () => showPage(TablePage, paths.table.pattern, to('table', tableAt))

function tableServer(part: Partial<StewardTable> = {}) {
  const held = { table: tableFixture(part) }
  const server = fakeServer()
    .on(getTable, () => held.table)
    .on(getRound, () => ({ ...roundOf(), you: { roles: ['steward' as const], seatId: null } }))
    .on(nextTurn, () => {
      const { sitting } = held.table
      return (held.table = { ...held.table, notSent: [], sitting: { ...sitting, turn: sitting.turn + 1 } })
    })
    .on(voidServing, () => held.table)
    .on(seatLeaves, ({ body }) => {
      const { seat } = body as { seat: string }
      const seats = held.table.seats.map((one) => (one.id === seat ? { ...one, left: true } : one))
      return (held.table = { ...held.table, seats })
    })
    .on(addListener, () => (held.table = { ...held.table, seats: [...held.table.seats, tableSeat(4)] }))
    .on(reportIncident, () => ({ done: true as const }))
  return { server, held }
}
const press = (name: string | RegExp) => userEvent.click(screen.getByRole('button', { name }))

afterEach(() => vi.unstubAllGlobals())

describe('the run sheet', () => {
  test('says that it is over once the round has closed, and shows no codes any more', async () => {
    const { server } = tableServer()
    const { client } = show()
    await screen.findByRole('list', { name: 'Seats' })
    server.on(getTable, () => new Refusal('forbidden', 'The table is over: the round is closed.'))
    await client.invalidateQueries()
    await screen.findAllByText('The table is over: the round is closed.')
    expect(screen.queryByRole('list', { name: 'Seats' })).not.toBeInTheDocument()
  })

  test('has one line a seat with its code and what it is doing, and never a number that was rated', async () => {
    tableServer({
      seats: [
        tableSeat(1),
        tableSeat(2, { serving: tableServing({ code: '528', state: 'handed', seal: null }) }),
        tableSeat(3, { serving: null, resting: true }),
      ],
    })
    show()
    const lines = within(await screen.findByRole('list', { name: 'Seats' })).getAllByRole('listitem')
    expect(lines.map((line) => line.textContent)).toEqual([
      expect.stringContaining('listening and rating'),
      expect.stringContaining('528'),
      expect.stringContaining('rests this turn'),
    ])
  })

  test('asks before it goes on without somebody, and names them', async () => {
    const { server } = tableServer({ notSent: ['Seat 2'] })
    show()
    await screen.findByText('Not sent yet: Seat 2.')
    await press('Next turn: 3 of 4')
    const dialog = await screen.findByRole('dialog', { name: 'Go on without Seat 2?' })
    expect(server.asked('nextTurn')).toHaveLength(0)
    await userEvent.click(within(dialog).getByRole('button', { name: 'Next turn: 3 of 4' }))
    await screen.findByText('turn 3 of 4')
    expect(server.asked('nextTurn').map(({ body }) => body)).toEqual([{ from: 2 }])
  })

  test('goes on at one touch when everyone has sent', async () => {
    const { server } = tableServer({ notSent: [] })
    show()
    await screen.findByText('Everyone in this turn has sent.')
    await press('Next turn: 3 of 4')
    await screen.findByText('turn 3 of 4')
    expect(server.asked('nextTurn')).toHaveLength(1)
  })

  test('setting a serving aside needs a reason and carries the version that was seen', async () => {
    const { server } = tableServer()
    show()
    await userEvent.click(await screen.findByRole('button', { name: 'More for Seat 1' }))
    await press('Set 417 aside')
    const dialog = await screen.findByRole('dialog', { name: 'Set 417 aside?' })
    await userEvent.click(within(dialog).getByRole('button', { name: 'Set 417 aside' }))
    expect(await within(dialog).findByText('Say what went wrong.')).toBeVisible()
    await userEvent.type(
      within(dialog).getByRole('textbox', { name: 'What went wrong' }),
      'two pouches swapped',
    )
    await userEvent.click(within(dialog).getByRole('button', { name: 'Set 417 aside' }))
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument())
    expect(server.asked('voidServing')[0]?.body).toMatchObject({ version: 3, reason: 'two pouches swapped' })
  })

  test('a table that has moved on meanwhile refuses, keeps the reason and shows itself anew', async () => {
    const { server } = tableServer()
    server.on(voidServing, () => new Refusal('conflict', 'This serving was sent meanwhile.'))
    show()
    await userEvent.click(await screen.findByRole('button', { name: 'More for Seat 1' }))
    await press('Set 417 aside')
    const reason = await screen.findByRole('textbox', { name: 'What went wrong' })
    await userEvent.type(reason, 'two pouches swapped{Enter}')
    expect((await screen.findAllByText('This serving was sent meanwhile.')).length).toBeGreaterThan(0)
    expect(reason).toHaveValue('two pouches swapped')
    await waitFor(() => expect(server.asked('getTable').length).toBeGreaterThan(1))
  })

  test('somebody who leaves is marked at once', async () => {
    const { server } = tableServer()
    show()
    await userEvent.click(await screen.findByRole('button', { name: 'More for Seat 2' }))
    await press('Has left')
    await screen.findByText('has left')
    expect(server.asked('seatLeaves')[0]?.body).toEqual({ seat: seatIdOf(2) })
  })

  test('somebody who comes late takes a spare row, or the row of one who left', async () => {
    const { server } = tableServer({ seats: [tableSeat(1), tableSeat(2, { left: true })] })
    show()
    await userEvent.click(await screen.findByRole('button', { name: 'Someone came late' }))
    await userEvent.type(await screen.findByRole('textbox', { name: 'Their name' }), 'Wren')
    await userEvent.click(screen.getByRole('radio', { name: /Instead of Seat 2/ }))
    await press('Give them a seat')
    await screen.findByText(/Wren has a seat/)
    const [asked] = server.asked('addListener')
    expect(asked?.body).toEqual({ name: 'Wren', insteadOf: seatIdOf(2) })
    expect(asked?.key).toBeTruthy()
  })

  test('an incident goes on record with its seat', async () => {
    const { server } = tableServer()
    show()
    await userEvent.click(await screen.findByRole('button', { name: 'Something went wrong' }))
    await userEvent.click(await screen.findByRole('radio', { name: 'An earphone has a fault' }))
    await userEvent.selectOptions(screen.getByRole('combobox', { name: /At which seat/ }), 'Seat 3')
    await userEvent.type(screen.getByRole('textbox', { name: 'What happened' }), 'left side rattles')
    await press('Write it down')
    await screen.findByText('The incident is on record.')
    expect(server.asked('reportIncident')[0]?.body).toEqual({
      kind: 'unit-fault',
      seat: seatIdOf(3),
      text: 'left side rattles',
    })
  })

  test('a steward who also listens finds the way to their own seat', async () => {
    const { server } = tableServer({ youListen: true })
    server.on(getRound, () => ({
      ...roundOf(),
      you: { roles: ['steward' as const, 'panelist' as const], seatId: seatIdOf(3) },
    }))
    show()
    expect(await screen.findByRole('link', { name: 'Your own seat' })).toHaveAttribute(
      'href',
      `/seat/${seatIdOf(3)}`,
    )
  })
})

/** The least a round may say of itself to somebody who stewards it. */
function roundOf() {
  return {
    id: tableAt.round,
    number: 1,
    title: 'Autumn evening',
    question: 'Which would you keep?',
    status: 'open' as const,
    origin: 'live' as const,
    blinding: 'double' as const,
    version: 1,
    units: null,
    unitCount: 4,
    people: [],
    scorecard: [],
    primaryDescriptor: 'overall-liking',
    tracks: [],
    sourceChain: '',
    levelMatching: 'measured' as const,
    hiding: '',
    publishesRows: true,
    plan: { turns: 4, minutesPerTurn: 7, minutes: 40, rows: [] },
    sittingId: tableAt.sitting,
    planFingerprint: null,
    keyFingerprint: null,
    openedAt: null,
    closedAt: null,
    cancelReason: null,
    verdictSlug: null,
    draft: null,
    lacks: [],
    can: {
      edit: false,
      open: false,
      cancel: false,
      close: false,
      handOutLinks: false,
      steward: true,
      tag: false,
      seeAgreement: false,
      publish: false,
    },
  }
}
