import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'
import { agreement } from './analysis.ts'
import { endpoint } from './endpoint.ts'
import { atRound } from './rounds.ts'
import { descriptor } from './scorecard.ts'
import { calendarDate, fingerprint, id, instant, line, prose, slug } from './text.ts'

export const provenances = ['bought', 'loan', 'gift', 'discounted', 'prototype'] as const
const price = z.strictObject({
  minor: z.number().int().min(0, 'Write the price as a number, like 189 or 189.50.').max(100_000_000),
  currency: z.string().regex(/^[A-Z]{3}$/, 'Three letters, like EUR.'),
  on: calendarDate,
})

/** What is asked of a unit before publishing. */
export const unitFacts = z
  .strictObject({
    provenance: z.enum(provenances, { error: 'Say how you got it.' }),
    lender: prose(limits.name).default(''),
    returnOn: calendarDate.nullable().default(null),
    disclosure: line(limits.reason, 'Write the sentence readers will see.'),
    price: price.nullable(),
    priceUnknown: z.boolean().default(false),
  })
  .superRefine((facts, context) => {
    if (facts.provenance === 'loan' && facts.lender === '')
      context.addIssue({
        code: 'custom',
        path: ['lender'],
        message: 'Name who lent it (a person may be “a reader”).',
      })
    if (facts.price === null && !facts.priceUnknown)
      context.addIssue({
        code: 'custom',
        path: ['price'],
        message: 'Enter the price, or say that there is none.',
      })
  })
export type UnitFactsInput = z.input<typeof unitFacts>

export const publishedUnit = z.strictObject({
  id,
  maker: z.string(),
  name: z.string(),
  provenance: z.enum(provenances).nullable(),
  lender: z.string().nullable(),
  returnOn: calendarDate.nullable(),
  disclosure: z.string().nullable(),
  price: price.nullable(),
  priceUnknown: z.boolean(),
  photo: z
    .strictObject({ id, url: z.string(), width: z.number().int(), height: z.number().int() })
    .nullable(),
  version: z.number().int(),
})

/** The organiser's desk before publishing. */
export const verdictDraft = z.strictObject({
  round: z.strictObject({ id, title: z.string(), status: z.string(), version: z.number().int() }),
  label: agreement.shape.label,
  labels: z.array(z.string()),
  headline: z.string(),
  summary: z.string(),
  /** Sentences that Scrim wrote from the numbers; they stand beside the organiser's own. */
  sentences: z.array(z.string()),
  units: z.array(publishedUnit),
  /** `field` is the input's name on the desk: `headline`, `summary`, `units.0.provenance` (index into `units`). */
  missing: z.array(z.strictObject({ field: z.string(), what: z.string() })),
  published: z.strictObject({ slug, version: z.number().int(), at: instant }).nullable(),
  version: z.number().int(),
  can: z.strictObject({ publish: z.boolean() }),
})
export type VerdictDraft = z.infer<typeof verdictDraft>

export const publicVerdict = z.strictObject({
  slug,
  number: z.number().int(),
  version: z.number().int(),
  publishedAt: instant,
  panelName: z.string(),
  title: z.string(),
  question: z.string(),
  headline: z.string(),
  summary: z.string(),
  sentences: z.array(z.string()),
  certainty: z.array(z.string()),
  label: agreement.shape.label,
  labels: z.array(z.string()),
  disclosures: z.array(z.string()),
  units: z.array(publishedUnit.omit({ version: true })),
  /** Empty where fewer than five listeners took part: no public figures at all. */
  results: agreement.shape.results,
  method: z.strictObject({
    origin: z.enum(['live', 'imported']),
    blinding: z.string(),
    openedAt: instant.nullable(),
    closedAt: instant.nullable(),
    listeners: z.number().int(),
    turns: z.number().int().nullable(),
    scorecard: z.array(descriptor),
    primaryDescriptor: z.string(),
    tracks: z.array(z.string()),
    sourceChain: z.string(),
    levelMatching: z.string(),
    hiding: z.string(),
    servings: agreement.shape.servings,
    exclusions: z.array(z.string()),
    library: z.string(),
    seed: z.string(),
  }),
  limits: z.array(z.string()),
  fingerprints: z.strictObject({
    plan: fingerprint.nullable(),
    key: fingerprint.nullable(),
    ratings: fingerprint.nullable(),
  }),
  files: z.array(
    z.strictObject({
      name: z.enum(['plan.json', 'key.json', 'ratings.csv', 'data-dictionary.txt']),
      url: z.string(),
    }),
  ),
  corrections: z.array(z.strictObject({ version: z.number().int(), at: instant, note: z.string() })),
})
export type PublicVerdict = z.infer<typeof publicVerdict>

export const verdictLine = z.strictObject({
  slug,
  /** The number in `/v/:number`. */
  number: z.number().int(),
  headline: z.string(),
  panelName: z.string(),
  publishedAt: instant,
  label: z.string(),
  /** Single-blind, imported, not level-matched and the like: what must stand wherever the result appears. */
  labels: z.array(z.string()),
  listeners: z.number().int(),
  descriptor: descriptor.nullable(),
  units: z.array(
    z.strictObject({
      name: z.string(),
      scores: z.array(z.number()),
      q1: z.number(),
      median: z.number(),
      q3: z.number(),
    }),
  ),
})
export type VerdictLine = z.infer<typeof verdictLine>

const atUnit = atRound.extend({ unit: id })
const atSlug = z.strictObject({ slug })
const file = z.string()
export const getVerdictDraft = endpoint('GET /api/panels/:panel/rounds/:round/verdict', {
  id: 'getVerdictDraft',
  audience: 'round',
  summary: 'What is still asked before publishing',
  params: atRound,
  response: verdictDraft,
})
export const saveVerdict = endpoint('PUT /api/panels/:panel/rounds/:round/verdict', {
  id: 'saveVerdict',
  audience: 'round',
  summary: 'Keep headline and summary',
  params: atRound,
  body: z.strictObject({ headline: prose(limits.headline), summary: prose(limits.summary) }),
  response: verdictDraft,
  versioned: true,
})
export const saveUnitFacts = endpoint('PUT /api/panels/:panel/rounds/:round/units/:unit', {
  id: 'saveUnitFacts',
  audience: 'round',
  summary: 'Provenance, disclosure and price of a unit',
  params: atUnit,
  body: unitFacts,
  response: verdictDraft,
  versioned: true,
})
export const putPhoto = endpoint('PUT /api/panels/:panel/rounds/:round/units/:unit/photo', {
  id: 'putPhoto',
  audience: 'round',
  summary: 'A unit’s photograph (multipart field `photo`): type by content, resized, metadata stripped',
  params: atUnit,
  response: verdictDraft,
  kind: 'upload',
})
export const removePhoto = endpoint('DELETE /api/panels/:panel/rounds/:round/units/:unit/photo', {
  id: 'removePhoto',
  audience: 'round',
  summary: 'Remove the photograph',
  params: atUnit,
  response: verdictDraft,
})
export const publishVerdict = endpoint('POST /api/panels/:panel/rounds/:round/verdict/publish', {
  id: 'publishVerdict',
  audience: 'round',
  summary: 'Publish, or publish a corrected version',
  params: atRound,
  body: z.strictObject({ correction: prose(limits.reason).default('') }),
  response: z.strictObject({ slug, version: z.number().int() }),
  idempotent: true,
})
export const listVerdicts = endpoint('GET /api/verdicts', {
  id: 'listVerdicts',
  audience: 'anyone',
  summary: 'Published verdicts, newest first',
  response: z.strictObject({ verdicts: z.array(verdictLine) }),
})
export const getVerdict = endpoint('GET /api/verdicts/:slug', {
  id: 'getVerdict',
  audience: 'anyone',
  summary: 'A published verdict',
  params: atSlug,
  query: z.strictObject({ version: z.coerce.number().int().min(1).optional() }),
  response: publicVerdict,
})
export const getVerdictFile = endpoint('GET /api/verdicts/:slug/files/:file', {
  id: 'getVerdictFile',
  audience: 'anyone',
  summary: 'plan.json, key.json, ratings.csv or the data dictionary',
  params: atSlug.extend({ file: z.enum(['plan.json', 'key.json', 'ratings.csv', 'data-dictionary.txt']) }),
  response: file,
  kind: 'file',
})
export const getPhoto = endpoint('GET /api/photos/:photo', {
  id: 'getPhoto',
  audience: 'anyone',
  summary: 'A photograph; before its verdict is published only for those who may see the unit',
  params: z.strictObject({ photo: id }),
  response: file,
  kind: 'file',
})
