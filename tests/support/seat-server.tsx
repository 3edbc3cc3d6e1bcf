import { userEvent } from '@testing-library/user-event'
import { screen } from '@testing-library/react'
import {
  answerEnd,
  checkSeal,
  confirmCode,
  getSeat,
  giveConsent,
  submitRatings,
  type PanelistSeat,
} from '#shared/contracts/seats.ts'
import { paths, to } from '#src/app/paths.ts'
import SeatPage from '#src/features/seats/pages/SeatPage.tsx'
import { scorecardOf, seatFixture, seatId, servingFixture } from '#src/features/seats/seat.fixture.ts'
import { fakeServer, Refusal, showPage } from './show-page.tsx'

/** Shows the seat's page; `state` is what navigation brought along. */
export const showSeat = (state: unknown = null) =>
  showPage(SeatPage, paths.seat.pattern, { pathname: to('seat', { seat: seatId }), state }, { '/': 'home' })

/** A short scorecard: liking, one line of tonal balance, one of staging. */
export const card = scorecardOf(['warmth', 'width'])

/** A server that holds one seat and moves it on as the real one does. */
export function seatServer(part: Partial<PanelistSeat>) {
  const held = { seat: seatFixture(part) }
  const set = (next: Partial<PanelistSeat>) => (held.seat = { ...held.seat, ...next })
  const server = fakeServer()
    .on(getSeat, () => held.seat)
    .on(giveConsent, () => set({ step: 'waiting', consented: true }))
    .on(confirmCode, ({ body }) =>
      (body as { code: string }).code === '417'
        ? set({ step: 'seal', serving: servingFixture({ sealChecked: false }) })
        : new Refusal('invalid', 'Wrong code', { code: 'These are not the digits of your pouch.' }),
    )
    .on(checkSeal, () => set({ step: 'rate', serving: servingFixture() }))
    .on(submitRatings, () => ({
      outcome: 'taken' as const,
      seat: set({ step: 'sent', serving: servingFixture({ state: 'submitted' }) }),
    }))
    .on(answerEnd, () => set({ step: 'thanks' }))
  return { server, held, set }
}

export const press = (name: string | RegExp) => userEvent.click(screen.getByRole('button', { name }))
