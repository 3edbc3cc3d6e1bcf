import { z } from 'zod'
import { endpoint } from './endpoint.ts'
import { atRound } from './rounds.ts'
import { descriptor } from './scorecard.ts'
import { fingerprint, instant } from './text.ts'

const interval = z.strictObject({ low: z.number(), high: z.number(), level: z.number() })
/** What cannot be said carries its reason instead of a number. */
export const cannot = z.strictObject({ ok: z.literal(false), reason: z.string(), sentence: z.string() })
const estimate = z.strictObject({
  estimate: z.number(),
  interval: interval.nullable(),
  method: z.string(),
  n: z.number().int(),
})

export const unitResult = z.strictObject({
  unit: z.string(),
  n: z.number().int(),
  listeners: z.number().int(),
  cantTell: z.number().int(),
  scores: z.array(z.strictObject({ listener: z.string(), value: z.number() })),
  median: z.number().nullable(),
  q1: z.number().nullable(),
  q3: z.number().nullable(),
  mean: z.number().nullable(),
  sd: z.number().nullable(),
  adjusted: z
    .strictObject({
      mean: z.number(),
      standardError: z.number(),
      df: z.number(),
      low: z.number(),
      high: z.number(),
      comparisonHalf: z.number().nullable(),
    })
    .nullable(),
})
export const pairResult = z.strictObject({
  a: z.string(),
  b: z.string(),
  difference: z.number(),
  standardError: z.number(),
  df: z.number(),
  low: z.number(),
  high: z.number(),
  p: z.number(),
})

/** One descriptor's spread on the agreement screen and on the verdict. */
export const descriptorResult = z.strictObject({
  descriptor,
  counts: z.strictObject({
    listeners: z.number().int(),
    units: z.number().int(),
    ratings: z.number().int(),
    missingCells: z.number().int(),
    cantTell: z.number().int(),
  }),
  units: z.array(unitResult),
  agreement: z.strictObject({
    sentence: z.string(),
    steadiness: z.string(),
    single: z.union([estimate, cannot]),
    average: z.union([estimate, cannot]),
    alpha: z.union([estimate, cannot]),
    w: z.union([
      z.strictObject({
        w: z.number(),
        p: z.number(),
        pExact: z.number().nullable(),
        chiSquare: z.number(),
        df: z.number(),
        listwise: z.strictObject({ used: z.number().int(), leftOut: z.number().int() }),
      }),
      cannot,
    ]),
  }),
  model: z.union([
    z.strictObject({
      formula: z.string(),
      method: z.string(),
      remlCriterion: z.number(),
      components: z.strictObject({
        panelist: z.number(),
        panelistUnit: z.number().nullable(),
        residual: z.number(),
      }),
      boundary: z.array(z.string()),
      unitTest: z.strictObject({ f: z.number(), df1: z.number(), df2: z.number(), p: z.number() }).nullable(),
    }),
    cannot,
  ]),
  pairs: z.array(pairResult),
  /** "Dunlin is rated wider than Knot; difference 21, between 13 and 29." or "No difference found; …". */
  sentence: z.string(),
  stated: z.enum(['primary', 'stated', 'hint']),
  notes: z.array(z.string()),
})
export type DescriptorResult = z.infer<typeof descriptorResult>

export const agreement = z.strictObject({
  round: z.strictObject({
    id: z.string(),
    title: z.string(),
    status: z.string(),
    origin: z.string(),
    blinding: z.string(),
  }),
  label: z.strictObject({
    key: z.enum(['none', 'informal', 'small-panel', 'panel', 'full-panel']),
    words: z.string(),
    fewest: z.number().int(),
  }),
  labels: z.array(z.string()),
  listeners: z.array(z.strictObject({ listener: z.string(), name: z.string().nullable() })),
  servings: z.strictObject({
    planned: z.number().int(),
    counted: z.number().int(),
    void: z.number().int(),
    missing: z.number().int(),
    late: z.number().int(),
  }),
  exclusions: z.array(
    z.strictObject({ listener: z.string(), rule: z.string(), reason: z.string(), excluded: z.boolean() }),
  ),
  recognised: z.array(
    z.strictObject({
      listener: z.string(),
      code: z.string(),
      text: z.string(),
      sure: z.string(),
      unit: z.string(),
    }),
  ),
  results: z.array(descriptorResult),
  computed: z.strictObject({ at: instant, digest: fingerprint, library: z.string(), seed: z.string() }),
  can: z.strictObject({ publish: z.boolean() }),
})
export type Agreement = z.infer<typeof agreement>

export const getAgreement = endpoint('GET /api/panels/:panel/rounds/:round/agreement', {
  id: 'getAgreement',
  audience: 'round',
  summary: 'How far the listeners agreed and what they heard; after closing only',
  params: atRound,
  response: agreement,
})

/** For the room: units in the order in which they are drawn out, with the panel's figures for the primary descriptor. */
export const reveal = z.strictObject({
  title: z.string(),
  descriptor,
  label: z.string(),
  units: z.array(
    z.strictObject({
      maker: z.string(),
      name: z.string(),
      codes: z.array(z.string()),
      median: z.number().nullable(),
      q1: z.number().nullable(),
      q3: z.number().nullable(),
      n: z.number().int(),
    }),
  ),
  /** One a listener; its values stand in the order of `units`. */
  threads: z.array(z.strictObject({ values: z.array(z.number().nullable()) })),
  sentence: z.string(),
})
export type Reveal = z.infer<typeof reveal>
export const getReveal = endpoint('GET /api/panels/:panel/rounds/:round/reveal', {
  id: 'getReveal',
  audience: 'round',
  summary: 'What the room sees when the key has opened',
  params: atRound,
  response: reveal,
})
