import type { PanelistSeat } from '#shared/contracts/seats.ts'
import type { Descriptor } from '#shared/contracts/scorecard.ts'

interface ServingRow {
  id: string
  turn: number
  state: string
  code: string
  sealed: string | null
  confirmed: boolean
  restUntil: Date | null
}

export interface SeatParts {
  seat: { id: string; label: string }
  round: {
    id: string
    title: string
    question: string
    status: string
    blinding: string
    publishesRows: boolean
  }
  panelName: string
  plan: { turns: number; minutesPerTurn: number; minutes: number }
  scorecard: Descriptor[]
  tracks: string[]
  consented: boolean
  left: boolean
  turn: number
  step: PanelistSeat['step']
  servings: readonly ServingRow[]
  inHand: ServingRow | undefined
  now: Date
  otherSeats: { id: string; label: string }[]
  maySeeReport: boolean
}

/** The listener's view: own codes, once typed; no unit, nobody else. */
export function presentSeat(parts: SeatParts): PanelistSeat {
  const counted = parts.servings.filter((one) => one.state !== 'void')
  const { inHand } = parts
  return {
    id: parts.seat.id,
    label: parts.seat.label,
    round: {
      id: parts.round.id,
      title: parts.round.title,
      question: parts.round.question,
      panelName: parts.panelName,
      status: parts.round.status,
    },
    plan: { servings: counted.length, ...parts.plan },
    scorecard: parts.scorecard,
    tracks: parts.tracks,
    blinding: parts.round.blinding,
    publishesRows: parts.round.publishesRows,
    consented: parts.consented,
    left: parts.left,
    turn: parts.turn,
    step: parts.step,
    serving: inHand
      ? {
          id: inHand.id,
          ordinal: ordinalOf(counted, inHand),
          of: counted.length,
          turn: inHand.turn,
          state: inHand.state as 'handed',
          code: inHand.confirmed ? inHand.code : null,
          sealChecked: inHand.sealed !== null,
        }
      : null,
    heard: counted
      .filter((one) => one.confirmed)
      .map((one) => ({ code: one.code, ordinal: ordinalOf(counted, one) })),
    restUntil: parts.step === 'rest' ? (inHand?.restUntil?.toISOString() ?? null) : null,
    serverTime: parts.now.toISOString(),
    otherSeats: parts.otherSeats,
    can: { seeReport: parts.maySeeReport },
  }
}

const ordinalOf = (counted: readonly ServingRow[], serving: ServingRow): number =>
  counted.filter((one) => one.turn <= serving.turn).length
