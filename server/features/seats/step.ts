import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { isRevealed } from '#shared/domain/round-status.ts'
import type { SeatFacts } from '#server/policies/seat.ts'
import type { SeatServing } from './servings.ts'

export interface StepFacts extends SeatFacts {
  turn: number
  sittingEnded: boolean
  endAnswered: boolean
  servings: readonly SeatServing[]
  now: Date
}

const settled = (serving: SeatServing): boolean => ['submitted', 'void', 'missed'].includes(serving.state)

/** The serving that this turn is about, where the seat hears something in it. */
export const servingInHand = (facts: Pick<StepFacts, 'servings' | 'turn'>): SeatServing | undefined =>
  facts.servings.find((one) => one.turn === facts.turn && one.state !== 'waiting' && one.state !== 'tagged')

/** What the listener does now. The one place that decides it; screens only show it. */
export function stepOf(facts: StepFacts): PanelistSeat['step'] {
  if (isRevealed(facts.status) || facts.status === 'cancelled') return 'closed'
  if (facts.left) return 'left'
  if (!facts.consented) return 'consent'
  const serving = servingInHand(facts)
  if (serving?.state === 'handed') return 'enter-code'
  if (serving?.state === 'confirmed')
    return serving.sealed === null || serving.sealed === 'no' ? 'seal' : 'rate'
  const over = facts.servings.every(
    (one) => settled(one) || (facts.sittingEnded && one.state !== 'confirmed'),
  )
  if (over && facts.turn > 0) return facts.endAnswered ? 'thanks' : 'end-questions'
  if (serving?.state === 'submitted')
    return serving.restUntil !== null && serving.restUntil > facts.now ? 'rest' : 'sent'
  return 'waiting'
}
