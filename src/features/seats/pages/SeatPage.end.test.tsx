import { screen, within } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { IDBFactory } from 'fake-indexeddb'
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest'
import { getSeat, getSeatReport } from '#shared/contracts/seats.ts'
import { card, press, seatServer, showSeat } from '#tests/support/seat-server.tsx'
import { fakeServer, Refusal } from '#tests/support/show-page.tsx'

beforeEach(() => {
  globalThis.indexedDB = new IDBFactory()
})
afterEach(() => vi.unstubAllGlobals())

describe('after the last serving', () => {
  test('a recognition is told by one’s own code and in free text, never from a list of units', async () => {
    const { server } = seatServer({
      step: 'end-questions',
      heard: [
        { code: '417', ordinal: 1 },
        { code: '528', ordinal: 2 },
      ],
    })
    showSeat()
    await userEvent.click(await screen.findByRole('radio', { name: 'Perhaps' }))
    await press('Send the answers')
    const summary = await screen.findByRole('alert')
    expect(within(summary).getByRole('link', { name: 'Say how sure you are.' })).toBeVisible()
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Which code' }), '528')
    await userEvent.type(screen.getByRole('textbox', { name: 'What do you think it was?' }), 'the one I own')
    await userEvent.click(screen.getByRole('radio', { name: 'A guess' }))
    await press('Send the answers')
    await screen.findByRole('heading', { level: 1, name: 'Thank you. That was all' })
    expect(server.asked('answerEnd')[0]?.body).toEqual({
      recognised: 'perhaps',
      recognitions: [{ code: '528', text: 'the one I own', sure: 'guess' }],
    })
  })

  test('the own report stands beside the panel’s, without a rank, and says where there are too few to show', async () => {
    const { server } = seatServer({ step: 'closed', can: { seeReport: true } })
    server.on(getSeatReport, () => ({
      label: 'Seat 3',
      roundTitle: 'Autumn evening',
      scorecard: card,
      units: [
        {
          maker: 'Saltmarsh Audio',
          name: 'Dunlin',
          code: '417',
          ratings: [
            { descriptor: 'warmth', yours: 70, cantTell: false, panelMedian: 58, n: 6 },
            { descriptor: 'width', yours: null, cantTell: true, panelMedian: null, n: 4 },
          ],
        },
      ],
      verdictSlug: null,
    }))
    showSeat()
    expect(await screen.findByText('you 70 · the panel 58, 6 ratings')).toBeVisible()
    expect(screen.getByText('you: can’t tell · the panel: too few ratings to show')).toBeVisible()
  })

  test('a phone that does not hold the seat says how to open it', async () => {
    fakeServer().on(getSeat, () => new Refusal('not_found', 'There is nothing here.'))
    showSeat()
    await screen.findByRole('heading', { level: 1, name: 'This seat is not open on this phone' })
  })
})
