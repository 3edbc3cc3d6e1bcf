import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'
import { endpoint } from './endpoint.ts'
import { descriptor } from './scorecard.ts'
import { id, instant, line, prose, threeDigits } from './text.ts'

export const atSeat = z.strictObject({ seat: id })
export const atServing = atSeat.extend({ serving: id })
export const consentVersion = '2026-1'

/** What a listener's phone may know of the serving in hand. The code is there only once they have typed it. */
const serving = z.strictObject({
  id,
  ordinal: z.number().int(),
  of: z.number().int(),
  turn: z.number().int(),
  state: z.enum(['handed', 'confirmed', 'submitted', 'void', 'missed']),
  code: threeDigits.nullable(),
  sealChecked: z.boolean(),
})

export const panelistSeat = z.strictObject({
  id,
  label: z.string(),
  round: z.strictObject({
    id,
    title: z.string(),
    question: z.string(),
    panelName: z.string(),
    status: z.string(),
  }),
  plan: z.strictObject({
    servings: z.number().int(),
    turns: z.number().int(),
    minutesPerTurn: z.number().int(),
    minutes: z.number().int(),
  }),
  scorecard: z.array(descriptor),
  tracks: z.array(z.string()),
  blinding: z.string(),
  publishesRows: z.boolean(),
  consented: z.boolean(),
  left: z.boolean(),
  /** 0 before the first turn. */
  turn: z.number().int(),
  step: z.enum([
    'consent',
    'waiting',
    'enter-code',
    'seal',
    'rate',
    'sent',
    'rest',
    'end-questions',
    'thanks',
    'closed',
    'left',
  ]),
  serving: serving.nullable(),
  /** The listener's own earlier servings, by code, for the end questions. */
  heard: z.array(z.strictObject({ code: threeDigits, ordinal: z.number().int() })),
  restUntil: instant.nullable(),
  serverTime: instant,
  /** Other seats opened in this browser: two people may share one phone. */
  otherSeats: z.array(z.strictObject({ id, label: z.string() })),
  can: z.strictObject({ seeReport: z.boolean() }),
})
export type PanelistSeat = z.infer<typeof panelistSeat>

export const answer = z
  .strictObject({ descriptor: z.string(), value: z.number().nullable(), cantTell: z.boolean() })
  .refine((one) => (one.value === null) === one.cantTell, 'Either a value or “can’t tell”.')
export const submission = z.strictObject({
  answers: z
    .array(answer)
    .min(1)
    .max(limits.descriptorsMost + 1),
  remark: prose(limits.remark).default(''),
})
export type Submission = z.input<typeof submission>

export const endQuestions = z.strictObject({
  recognised: z.enum(['none', 'perhaps', 'yes']),
  recognitions: z
    .array(
      z.strictObject({
        code: threeDigits,
        text: line(limits.line, 'Say what you think it was.'),
        sure: z.enum(['guess', 'fairly', 'certain']),
      }),
    )
    .max(24),
})

/** After closing: one's own ratings beside the panel's. */
export const seatReport = z.strictObject({
  label: z.string(),
  roundTitle: z.string(),
  scorecard: z.array(descriptor),
  units: z.array(
    z.strictObject({
      maker: z.string(),
      name: z.string(),
      code: threeDigits,
      ratings: z.array(
        z.strictObject({
          descriptor: z.string(),
          yours: z.number().nullable(),
          cantTell: z.boolean(),
          panelMedian: z.number().nullable(),
          n: z.number().int(),
        }),
      ),
    }),
  ),
  verdictSlug: z.string().nullable(),
})
export type SeatReport = z.infer<typeof seatReport>

const done = z.strictObject({ done: z.literal(true) })
export const join = endpoint('POST /api/join/:token', {
  id: 'join',
  audience: 'anyone',
  summary: 'Open a seat or a duty by its link, on any phone',
  params: z.strictObject({ token: z.string().min(8).max(80) }),
  response: z.strictObject({ path: z.string() }),
})
export const getSeat = endpoint('GET /api/seats/:seat', {
  id: 'getSeat',
  audience: 'seat',
  summary: 'What the listener does now',
  params: atSeat,
  response: panelistSeat,
})
export const giveConsent = endpoint('POST /api/seats/:seat/consent', {
  id: 'giveConsent',
  audience: 'seat',
  summary: 'Agree to take part',
  params: atSeat,
  body: z.strictObject({
    version: z.literal(consentVersion),
    adult: z.literal(true, { error: 'Only adults take part.' }),
  }),
  response: panelistSeat,
})
export const leaveSeat = endpoint('POST /api/seats/:seat/leave', {
  id: 'leaveSeat',
  audience: 'seat',
  summary: 'Stop taking part, without a reason',
  params: atSeat,
  response: panelistSeat,
})
export const confirmCode = endpoint('POST /api/seats/:seat/servings/:serving/code', {
  id: 'confirmCode',
  audience: 'seat',
  summary: 'The digits read off the pouch; a wrong code changes nothing',
  params: atServing,
  body: z.strictObject({ code: threeDigits }),
  response: panelistSeat,
})
export const checkSeal = endpoint('POST /api/seats/:seat/servings/:serving/seal', {
  id: 'checkSeal',
  audience: 'seat',
  summary: 'How the seal check went',
  params: atServing,
  body: z.strictObject({ sealed: z.enum(['yes', 'unsure', 'no']) }),
  response: panelistSeat,
})
export const submitRatings = endpoint('POST /api/seats/:seat/servings/:serving/ratings', {
  id: 'submitRatings',
  audience: 'seat',
  summary: 'Send one serving’s ratings; a repeat with the same key is the same submission',
  params: atServing,
  body: submission,
  response: z.strictObject({ outcome: z.enum(['taken', 'late', 'void']), seat: panelistSeat }),
  idempotent: true,
})
export const answerEnd = endpoint('POST /api/seats/:seat/end', {
  id: 'answerEnd',
  audience: 'seat',
  summary: 'The end questions',
  params: atSeat,
  body: endQuestions,
  response: panelistSeat,
})
export const getSeatReport = endpoint('GET /api/seats/:seat/report', {
  id: 'getSeatReport',
  audience: 'seat',
  summary: 'One’s own ratings beside the panel’s, after closing',
  params: atSeat,
  response: seatReport,
})
export const seatEvents = endpoint('GET /api/seats/:seat/events', {
  id: 'seatEvents',
  audience: 'seat',
  summary: 'Server-sent events: something changed for this seat',
  params: atSeat,
  response: z.strictObject({ changed: z.string() }),
  kind: 'events',
})
export const forgetSeat = endpoint('POST /api/seats/:seat/forget', {
  id: 'forgetSeat',
  audience: 'seat',
  summary: 'Close this seat on this phone',
  params: atSeat,
  response: done,
})
