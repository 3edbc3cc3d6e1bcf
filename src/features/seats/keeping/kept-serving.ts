import type { Descriptor } from '#shared/contracts/scorecard.ts'
import type { Submission } from '#shared/contracts/seats.ts'
import type { Answer } from '#src/components/rating/answer.ts'

/** A value on the line's scale, or "can't tell". A line without an answer has no entry. */
export type KeptAnswer = Exclude<Answer, null>

export interface Outbox {
  /** The idempotency key: one for each serving and code, the same in every tab and at every attempt. Letters, digits, hyphens. */
  key: string
  /** queued: to be sent. refused: the server would not take it. late, void: taken, with a word that is not yet read. */
  state: 'queued' | 'refused' | 'late' | 'void'
  /** Why it was refused. */
  words: string
}

/** What this phone keeps of one serving until the server has it. */
export interface KeptServing {
  id: string
  seat: string
  serving: string
  code: string
  ordinal: number
  answers: Readonly<Record<string, KeptAnswer>>
  remark: string
  /** Which screen of the rating is open, counted from 0. */
  screen: number
  /** Null while it may be changed: a submission locks. */
  outbox: Outbox | null
}

export type Place = Pick<KeptServing, 'seat' | 'serving' | 'code' | 'ordinal'>

export interface Change {
  /** Answers by descriptor; null clears the line. */
  answers?: Readonly<Record<string, Answer>>
  remark?: string
  screen?: number
}

/** A serving that comes back under a reserve code is another record: nothing of the voided one is carried over. */
export const keptId = (place: Pick<Place, 'seat' | 'serving' | 'code'>): string =>
  `${place.seat}/${place.serving}/${place.code}`

export const keptStart = ({ seat, serving, code, ordinal }: Place): KeptServing => ({
  id: keptId({ seat, serving, code }),
  seat,
  serving,
  code,
  ordinal,
  answers: {},
  remark: '',
  screen: 0,
  outbox: null,
})

/** Lays a change over what is kept; a submitted serving stays as it is. */
export function changed(before: KeptServing, change: Change): KeptServing {
  if (before.outbox) return before
  const answers: Record<string, KeptAnswer> = { ...before.answers }
  for (const [line, answer] of Object.entries(change.answers ?? {}))
    if (answer === null) delete answers[line]
    else answers[line] = answer
  return {
    ...before,
    answers,
    remark: change.remark ?? before.remark,
    screen: change.screen ?? before.screen,
  }
}

/** Puts a serving into the outbox; once there, a second time changes nothing. */
export const submitted = (before: KeptServing): KeptServing =>
  before.outbox
    ? before
    : { ...before, outbox: { key: `${before.serving}-${before.code}`, state: 'queued', words: '' } }

/** Puts a refused submission back into the queue, under the same key. */
export const requeued = (before: KeptServing | undefined): KeptServing | undefined =>
  before?.outbox?.state === 'refused'
    ? { ...before, outbox: { ...before.outbox, state: 'queued', words: '' } }
    : before

/** The scorecard's lines that have neither a value nor "can't tell". */
export const openLines = (scorecard: readonly Descriptor[], kept: KeptServing): Descriptor[] =>
  scorecard.filter((line) => kept.answers[line.key] === undefined)

/** The body of a submission. */
export const submissionOf = (kept: KeptServing): Submission => ({
  answers: Object.entries(kept.answers).map(([descriptor, answer]) =>
    answer === 'cant-tell'
      ? { descriptor, value: null, cantTell: true }
      : { descriptor, value: answer, cantTell: false },
  ),
  remark: kept.remark,
})
