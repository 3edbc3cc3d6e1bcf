import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'
import { servingStates } from '#shared/domain/round-status.ts'
import { endpoint } from './endpoint.ts'
import { atSitting } from './tags.ts'
import { id, instant, line, threeDigits } from './text.ts'

/** The steward's view: codes and states, no unit and no rating. */
export const tableSeat = z.strictObject({
  id,
  label: z.string(),
  number: z.number().int(),
  joined: z.boolean(),
  left: z.boolean(),
  serving: z
    .strictObject({
      id,
      code: threeDigits,
      state: z.enum(servingStates),
      version: z.number().int(),
      wrongCodes: z.number().int(),
      /** How the seal check went; null until the listener has said. */
      seal: z.enum(['yes', 'unsure', 'no']).nullable(),
      restUntil: instant.nullable(),
    })
    .nullable(),
  resting: z.boolean(),
  endAnswered: z.boolean(),
})
export const stewardTable = z.strictObject({
  round: z.strictObject({ id, title: z.string(), status: z.string(), blinding: z.string() }),
  sitting: z.strictObject({
    id,
    name: z.string(),
    turn: z.number().int(),
    turns: z.number().int(),
    version: z.number().int(),
    ended: z.boolean(),
  }),
  seats: z.array(tableSeat),
  /** Seats by label that have not sent in the present turn. */
  notSent: z.array(z.string()),
  spareRows: z.number().int(),
  serverTime: instant,
  youListen: z.boolean(),
  can: z.strictObject({ nextTurn: z.boolean(), addListener: z.boolean(), end: z.boolean() }),
})
export type StewardTable = z.infer<typeof stewardTable>

export const getTable = endpoint('GET /api/panels/:panel/rounds/:round/sittings/:sitting/table', {
  id: 'getTable',
  audience: 'round',
  summary: 'The steward’s table',
  params: atSitting,
  response: stewardTable,
})
export const nextTurn = endpoint('POST /api/panels/:panel/rounds/:round/sittings/:sitting/turn', {
  id: 'nextTurn',
  audience: 'round',
  summary: 'Go on from this turn to the next; pressing twice moves once',
  params: atSitting,
  body: z.strictObject({ from: z.number().int().min(0) }),
  response: stewardTable,
})
export const voidServing = endpoint('POST /api/panels/:panel/rounds/:round/sittings/:sitting/void', {
  id: 'voidServing',
  audience: 'round',
  summary: 'Void a serving; it comes back at the end under a reserve code',
  params: atSitting,
  body: z.strictObject({
    serving: id,
    version: z.number().int(),
    reason: line(limits.reason, 'Say what went wrong.'),
  }),
  response: stewardTable,
})
export const seatLeaves = endpoint('POST /api/panels/:panel/rounds/:round/sittings/:sitting/leave', {
  id: 'seatLeaves',
  audience: 'round',
  summary: 'Someone leaves; what they sent stays',
  params: atSitting,
  body: z.strictObject({ seat: id }),
  response: stewardTable,
})
export const seatReturns = endpoint('POST /api/panels/:panel/rounds/:round/sittings/:sitting/return', {
  id: 'seatReturns',
  audience: 'round',
  summary: 'Someone who left is back',
  params: atSitting,
  body: z.strictObject({ seat: id }),
  response: stewardTable,
})
export const addListener = endpoint('POST /api/panels/:panel/rounds/:round/sittings/:sitting/listeners', {
  id: 'addListener',
  audience: 'round',
  summary: 'Someone came late: they take a spare row, or the row of someone who left',
  params: atSitting,
  body: z.strictObject({ name: line(limits.name, 'Enter a name.'), insteadOf: id.optional() }),
  response: stewardTable,
  idempotent: true,
})
export const reportIncident = endpoint('POST /api/panels/:panel/rounds/:round/sittings/:sitting/incidents', {
  id: 'reportIncident',
  audience: 'round',
  summary: 'Put on record what went wrong',
  params: atSitting,
  body: z.strictObject({
    kind: z.enum(['mix-up', 'lost-seal', 'unit-fault', 'key-learned', 'other']),
    seat: id.optional(),
    text: line(limits.reason, 'Say what happened.'),
  }),
  response: z.strictObject({ done: z.literal(true) }),
})
