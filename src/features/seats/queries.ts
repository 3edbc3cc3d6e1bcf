import { getSeat, getSeatReport } from '#shared/contracts/seats.ts'
import { ask } from '#src/lib/ask.ts'

/** What the listener at this seat does now. */
export const seatQuery = (seat: string) => ask(getSeat, { params: { seat } })

/** Own ratings beside the panel's, after closing. */
export const reportQuery = (seat: string) => ask(getSeatReport, { params: { seat } })
