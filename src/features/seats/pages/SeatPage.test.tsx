import { screen, waitFor } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { IDBFactory } from 'fake-indexeddb'
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest'
import { forgetSeat, submitRatings } from '#shared/contracts/seats.ts'
import { card, press, seatServer, showSeat } from '#tests/support/seat-server.tsx'
import { otherSeatId, servingFixture } from '../seat.fixture.ts'

const rating = () => seatServer({ step: 'rate', serving: servingFixture(), scorecard: card })
const range = (name: string) => screen.getByRole('slider', { name })

/** Answers liking, warmth and width and comes to the last look. */
async function answerAll() {
  await screen.findByRole('heading', { level: 1, name: 'First, as a whole' })
  range('Overall liking').focus()
  await userEvent.keyboard('{ArrowRight}{ArrowRight}')
  await press('Next: tonal balance')
  await userEvent.click(screen.getByRole('checkbox', { name: /can’t tell/ }))
  await press('Next: staging')
  await press(/Width: a step towards well outside/)
  await press('Next: a remark')
  await userEvent.type(screen.getByRole('textbox', { name: /Remark/ }), 'thin')
  await press('Next: a last look')
}

beforeEach(() => {
  globalThis.indexedDB = new IDBFactory()
  sessionStorage.clear()
})
afterEach(() => vi.unstubAllGlobals())

describe('before the first pouch', () => {
  test('what is coming is read first, then consent is asked once, and only adults take part', async () => {
    const { server } = seatServer({ step: 'consent', consented: false, turn: 0 })
    showSeat()
    await screen.findByText(/Four pairs of earphones/)
    await press('Go on')
    expect(screen.getByText(/by listener number, never by name/)).toBeVisible()
    expect(screen.getByText(/stop at once on pain, ringing/)).toBeVisible()
    await press('Take part')
    expect(await screen.findByText('Only adults take part.')).toBeVisible()
    expect(server.asked('giveConsent')).toHaveLength(0)
    await userEvent.click(screen.getByRole('checkbox'))
    await press('Take part')
    await screen.findByRole('heading', { level: 1, name: 'Next: your first of four' })
    expect(server.asked('giveConsent')).toHaveLength(1)
  })

  test('a round that publishes no rows says so in its consent', async () => {
    seatServer({ step: 'consent', consented: false, publishesRows: false })
    showSeat()
    await userEvent.click(await screen.findByRole('button', { name: 'Go on' }))
    expect(screen.getByText(/this round publishes no rows/)).toBeVisible()
  })

  test('a wrong code stops, says what to do and keeps the screen; the right one goes on to the seal check', async () => {
    seatServer({
      step: 'enter-code',
      serving: servingFixture({ state: 'handed', code: null, sealChecked: false }),
    })
    showSeat()
    const digits = await screen.findByRole('textbox', { name: 'Digits' })
    expect(document.body).not.toHaveTextContent('417')
    await userEvent.type(digits, '528{Enter}')
    expect(await screen.findByText('These are not the digits of your pouch.')).toBeVisible()
    await userEvent.clear(digits)
    await userEvent.type(digits, '417{Enter}')
    await screen.findByRole('heading', { level: 1, name: 'Is the bass there?' })
    await press('Yes')
    await press('Yes')
    await press('Yes')
    await screen.findByRole('heading', { level: 1, name: 'First, as a whole' })
  })
})

describe('rating one serving', () => {
  test('liking comes first, families follow, and what is sent is what was touched', async () => {
    const { server } = rating()
    showSeat()
    await answerAll()
    await press('Send this serving')
    await screen.findByRole('heading', { level: 1, name: 'Sent. Rest your ears' })
    expect(server.asked('submitRatings').map(({ body }) => body)).toEqual([
      {
        answers: [
          { descriptor: 'overall-liking', value: 51, cantTell: false },
          { descriptor: 'warmth', value: null, cantTell: true },
          { descriptor: 'width', value: 50, cantTell: false },
        ],
        remark: 'thin',
      },
    ])
  })

  test('a line left open cannot be sent, and the last look says how many are', async () => {
    const { server } = rating()
    showSeat()
    await screen.findByRole('heading', { level: 1, name: 'First, as a whole' })
    for (const verb of ['Next: tonal balance', 'Next: staging', 'Next: a remark', 'Next: a last look'])
      await press(verb)
    expect(screen.getByText(/Three lines still open/)).toBeVisible()
    await press('Send this serving')
    expect(server.asked('submitRatings')).toHaveLength(0)
  })

  test('a reload in the middle comes back to the same screen with the same answers', async () => {
    rating()
    const before = showSeat()
    await screen.findByRole('heading', { level: 1, name: 'First, as a whole' })
    await press('Overall liking: a step towards like very much')
    await press('Next: tonal balance')
    await screen.findByText('saved on this phone')
    before.unmount()
    showSeat()
    await screen.findByRole('heading', { level: 1, name: 'Tonal balance' })
    await press('Back to overall liking')
    expect(range('Overall liking')).toHaveAttribute('aria-valuetext', '50 of 100, halfway')
  })

  test('without a network the serving stays on the phone, over a reload, and is sent once when it is back', async () => {
    const { server } = rating()
    const before = showSeat()
    await answerAll()
    server.reachable = false
    await press('Send this serving')
    await screen.findByRole('heading', { level: 1, name: 'Locked, and on its way' })
    await waitFor(() => expect(server.missed('submitRatings')).toBeGreaterThan(0))
    await screen.findByText('saved on this phone · not sent yet')
    before.unmount()

    server.reachable = true
    showSeat()
    await screen.findByRole('heading', { level: 1, name: 'Sent. Rest your ears' })
    expect(server.asked('submitRatings')).toHaveLength(1)
    expect(screen.queryByText(/not sent yet/)).not.toBeInTheDocument()
  })

  test('a double tap sends under one key', async () => {
    const { server } = rating()
    showSeat()
    await answerAll()
    await userEvent.dblClick(screen.getByRole('button', { name: 'Send this serving' }))
    await screen.findByRole('heading', { level: 1, name: 'Sent. Rest your ears' })
    expect(new Set(server.asked('submitRatings').map(({ key }) => key)).size).toBe(1)
  })

  test('what arrives after closing is said to be kept and not counted', async () => {
    const { server, set } = rating()
    server.on(submitRatings, () => ({
      outcome: 'late' as const,
      seat: set({ step: 'closed', serving: null }),
    }))
    showSeat()
    await answerAll()
    await press('Send this serving')
    expect(await screen.findByText(/marked as late, and not counted/)).toBeVisible()
    await press('I have read this')
    await waitFor(() => expect(screen.queryByText(/marked as late/)).not.toBeInTheDocument())
  })

  test('a browser that keeps nothing still rates, and says so', async () => {
    globalThis.indexedDB = {
      open: () => {
        throw new DOMException('denied', 'SecurityError')
      },
    } as unknown as IDBFactory
    const { server } = rating()
    showSeat()
    await screen.findByText(/does not let Scrim save/)
    await answerAll()
    await press('Send this serving')
    await screen.findByRole('heading', { level: 1, name: 'Sent. Rest your ears' })
    expect(server.asked('submitRatings')).toHaveLength(1)
  })
})

describe('a serving that was set aside or missed', () => {
  test('says so while the next one is awaited', async () => {
    const { set } = seatServer({ step: 'waiting', serving: servingFixture({ state: 'void' }) })
    const { client } = showSeat()
    await screen.findByText('The steward set your last serving aside')
    set({ serving: servingFixture({ state: 'missed' }) })
    await client.invalidateQueries()
    await screen.findByText(/It counts as missed/)
  })
})

describe('two people, one phone', () => {
  test('a seat that is through can be closed on a borrowed phone', async () => {
    const { server } = seatServer({ step: 'thanks' })
    server.on(forgetSeat, () => ({ done: true as const }))
    const { router } = showSeat()
    await userEvent.click(await screen.findByRole('button', { name: 'Close this seat on this phone' }))
    await waitFor(() => expect(router.state.location.pathname).toBe('/'))
    expect(server.asked('forgetSeat')).toHaveLength(1)
  })

  test('the other seat opens behind a plain screen that shows nothing of the one before', async () => {
    seatServer({ otherSeats: [{ id: otherSeatId, label: 'Seat 4' }] })
    const { router } = showSeat()
    await userEvent.click(await screen.findByRole('button', { name: 'Hand the phone to Seat 4' }))
    expect(router.state.location.pathname).toBe(`/seat/${otherSeatId}`)
    await screen.findByRole('heading', { level: 1, name: /Hand the phone to/ })
    expect(screen.queryByText(/Next: your first/)).not.toBeInTheDocument()
    await press(/^I am /)
    await screen.findByRole('heading', { level: 1, name: 'Next: your first of four' })
  })
})
