import { canonicalJson } from './canonical-json.ts'
import { isCode } from './codes.ts'
import {
  hex64,
  integer,
  listOf,
  matching,
  nullOr,
  oneOf,
  type Reader,
  record,
  ShapeError,
  text,
  texts,
  utcTime,
} from './shape-readers.ts'
import type { Json, KeyDocument, PlanContent, PlanDesign, PlanDocument } from './types.ts'

export { ShapeError } from './shape-readers.ts'

const code: Reader<number> = (value, at) => {
  const number = integer(100, 999)(value, at)
  if (!isCode(number)) throw new ShapeError(`${at} is not a code`)
  return number
}

const json: Reader<Json> = (value) => value as Json
const codePolicy = oneOf('per-seat', 'split')

const design = record<PlanDesign>({
  mode: oneOf('turns'),
  units: integer(2, 12),
  listeners: integer(1, 40),
  spares: integer(0, 40),
  turns: integer(2, 1000),
  codePolicy,
})

const content = record<PlanContent>(
  {
    question: text,
    scorecard: json,
    primaryDescriptor: text,
    rules: json,
    design,
    tracks: json,
    levelMatching: json,
    hiding: json,
    blinding: json,
  },
  { open: true },
)

const plan = record<PlanDocument>({
  scheme: oneOf('scrim-plan-1'),
  round: text,
  time: utcTime,
  nonce: hex64,
  versions: texts,
  plan: content,
  planDigest: hex64,
})

const listener = integer(1, 160)
const place = record<KeyDocument['rows'][number]['places'][number]>({
  position: integer(1, 12),
  turn: integer(1, 1000),
  code,
  unit: text,
})

const key = record<KeyDocument>(
  {
    scheme: oneOf('scrim-key-1'),
    round: text,
    time: utcTime,
    nonce: hex64,
    seed: hex64,
    versions: texts,
    planDigest: hex64,
    units: listOf(record({ id: text, maker: text, name: text, serial: text, firmware: text })),
    draw: record<KeyDocument['draw']>({
      scheme: oneOf('scrim-draw-1'),
      mode: oneOf('turns'),
      listeners: integer(1, 40),
      spares: integer(0, 40),
      codePolicy,
      attempt: integer(0, 5000),
      excludedPairs: listOf(record({ code: integer(100, 999), unit: text })),
      excludedCodes: listOf(integer(100, 999)),
    }),
    rows: listOf(
      record<KeyDocument['rows'][number]>({
        listener,
        set: oneOf('served', 'takeover', 'reserve'),
        places: listOf(place),
      }),
    ),
    previousKey: nullOr(hex64),
    letters: listOf(
      record<NonNullable<KeyDocument['letters']>[number]>({
        letter: matching('one letter', /^[A-L]$/),
        unit: text,
        codes: record<{ served: number; reserve: number }>({ served: code, reserve: code }),
      }),
    ),
  },
  { optional: ['letters'] },
)

/** Reads a file that must be in its one canonical form: otherwise the same words could have two fingerprints. */
function read<T>(source: string, what: string, shape: Reader<T>): T {
  let value: unknown
  try {
    value = JSON.parse(source)
  } catch {
    throw new ShapeError(`${what} is not JSON`)
  }
  const document = shape(value, what)
  let canonical: string | null
  try {
    canonical = canonicalJson(value as Json)
  } catch {
    canonical = null
  }
  if (canonical !== source) throw new ShapeError(`${what} is not in canonical form (RFC 8785)`)
  return document
}

/** Parses plan.json; throws ShapeError. */
export const readPlan = (source: string): PlanDocument => read(source, 'plan', plan)

/** Parses key.json; throws ShapeError. */
export const readKey = (source: string): KeyDocument => read(source, 'key', key)
