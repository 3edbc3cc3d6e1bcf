import { CallError } from '#src/lib/call.ts'
import type { KeptServing } from './kept-serving.ts'

export type Reply = { outcome: 'taken' | 'late' | 'void' } | { error: unknown }

/** Codes that asking again later cannot mend by itself. */
const final: readonly string[] = [
  'malformed',
  'not_signed_in',
  'forbidden',
  'not_found',
  'conflict',
  'too_large',
  'invalid',
]
const noSeat: readonly string[] = ['not_signed_in', 'forbidden', 'not_found']

export const lostSeatWords =
  'This phone does not hold the seat any more. Open your seat’s link on it again; what you rated is kept here until then.'

/** Whether a failed attempt is worth repeating by itself: the network or the server was away. */
export const mayComeLater = (error: unknown): boolean =>
  !(error instanceof CallError) || !final.includes(error.code)

/**
 * What becomes of a kept serving after an attempt to send it: undefined once the server has it, a word to read when it
 * came late or was void, still queued while the network is away, refused with the reason otherwise.
 */
export function settled(kept: KeptServing, reply: Reply): KeptServing | undefined {
  if (kept.outbox?.state !== 'queued') return kept
  if ('outcome' in reply) {
    if (reply.outcome === 'taken') return undefined
    return { ...kept, answers: {}, remark: '', outbox: { ...kept.outbox, state: reply.outcome, words: '' } }
  }
  if (mayComeLater(reply.error)) return kept
  const { code, message } = reply.error as CallError
  return {
    ...kept,
    outbox: { ...kept.outbox, state: 'refused', words: noSeat.includes(code) ? lostSeatWords : message },
  }
}
