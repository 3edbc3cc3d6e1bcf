import { z } from 'zod'
import { endpoint } from './endpoint.ts'
import { atRound } from './rounds.ts'
import { id, threeDigits } from './text.ts'

export const atSitting = atRound.extend({ sitting: id })
const place = { seat: z.string(), turn: z.number().int(), code: threeDigits }
const state = z.enum(['to-tag', 'tagged', 'out', 'free'])
const unitName = { maker: z.string(), unit: z.string() }

/** What the person behind the screen may see: the whole key, or one half of a split key, never both halves. */
export const tags = z.discriminatedUnion('part', [
  z.strictObject({
    part: z.literal('keeper'),
    turn: z.number().int(),
    turns: z.number().int(),
    pouches: z.array(z.strictObject({ serving: id, ...place, ...unitName, state })),
    reserves: z.array(z.strictObject({ ...place, ...unitName })),
  }),
  z.strictObject({
    part: z.literal('letters'),
    pouches: z.array(z.strictObject({ letter: z.string(), ...unitName, done: z.boolean() })),
  }),
  z.strictObject({
    part: z.literal('codes'),
    pouches: z.array(
      z.strictObject({ letter: z.string(), code: threeDigits, reserve: threeDigits, done: z.boolean() }),
    ),
  }),
])
export type Tags = z.infer<typeof tags>

const done = z.strictObject({ done: z.literal(true) })
export const getTags = endpoint('GET /api/panels/:panel/rounds/:round/sittings/:sitting/tags', {
  id: 'getTags',
  audience: 'round',
  summary: 'Pouches to tag: for the keeper, or one half of a split key',
  params: atSitting,
  response: tags,
})
export const markTagged = endpoint('POST /api/panels/:panel/rounds/:round/sittings/:sitting/tags', {
  id: 'markTagged',
  audience: 'round',
  summary: 'This pouch is tagged (a serving for the keeper, a letter for a half of a split key)',
  params: atSitting,
  body: z.strictObject({ serving: id.optional(), letter: z.string().length(1).optional() }),
  response: done,
})
