import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js'
import { canonicalJson } from './canonical-json.ts'
import { publishedExclusions } from './draw.ts'
import { readKey, readPlan } from './shapes.ts'
import type {
  CodeSet,
  Draw,
  FileText,
  History,
  Json,
  KeyDocument,
  KeyRow,
  KeyUnit,
  PlanContent,
  PlanDocument,
} from './types.ts'

/** Lowercase hex SHA-256 of the UTF-8 bytes of a text: what `sha256sum` prints for the file. */
export function fingerprint(text: string): string {
  return bytesToHex(sha256(utf8ToBytes(text)))
}

const file = (document: PlanDocument | KeyDocument): FileText => {
  const text = canonicalJson(document as unknown as Json)
  return { text, fingerprint: fingerprint(text) }
}

/**
 * The exact text of plan.json. `time` is ISO 8601 in UTC; `nonce` is 64 hex digits. Throws ShapeError on anything
 * that the reader's check would refuse.
 */
export function planFile(input: {
  round: string
  time: string
  nonce: string
  versions: Record<string, string>
  plan: PlanContent
}): FileText & { planDigest: string } {
  const { round, time, nonce, versions, plan } = input
  const planDigest = fingerprint(canonicalJson(plan))
  const written = file({ scheme: 'scrim-plan-1', round, time, nonce, versions, plan, planDigest })
  readPlan(written.text)
  return { ...written, planDigest }
}

const SETS: Record<Draw['codePolicy'], readonly CodeSet[]> = {
  'per-seat': ['served', 'takeover', 'reserve'],
  split: ['served', 'reserve'],
}

/** The code sets that the key holds: under a split key whoever takes a row over meets the served codes. */
export function keyRows(draw: Pick<Draw, 'rows' | 'codePolicy'>): KeyRow[] {
  return draw.rows.flatMap((row) =>
    SETS[draw.codePolicy].map((set) => ({
      listener: set === 'takeover' ? row.takeoverListener : row.listener,
      set,
      places: row.places.map(({ position, turn, unit, codes }) => ({
        position,
        turn,
        code: codes[set],
        unit,
      })),
    })),
  )
}

/**
 * The exact text of key.json. `history` is the one given to the draw; of it only pairs and codes are written, which
 * must hold nothing sealed. `previousKey` is the fingerprint of the panel's key before this one, or null.
 */
export function keyFile(input: {
  round: string
  time: string
  nonce: string
  seed: string
  versions: Record<string, string>
  planDigest: string
  units: KeyUnit[]
  draw: Draw
  history: Pick<History, 'pairs' | 'codes'>
  previousKey: string | null
}): FileText {
  const { draw, history, units, ...head } = input
  const { round, time, nonce, seed, versions, planDigest, previousKey } = head
  const sorted = [...units].sort((a, b) => (a.id < b.id ? -1 : 1))
  const ids = sorted.map((unit) => unit.id)
  const drawn = new Set(draw.rows.flatMap((row) => row.places.map((place) => place.unit)))
  if (ids.length !== drawn.size || ids.some((id) => !drawn.has(id))) {
    throw new RangeError('the units are not those of the draw')
  }
  const { scheme, mode, listeners, spares, codePolicy, attempt } = draw
  const order = { scheme, mode, listeners, spares, codePolicy, attempt }
  const written = file({
    scheme: 'scrim-key-1',
    round,
    time,
    nonce,
    seed,
    versions,
    planDigest,
    units: sorted.map(({ id, maker, name, serial, firmware }) => ({ id, maker, name, serial, firmware })),
    draw: { ...order, ...publishedExclusions(history, ids) },
    rows: keyRows(draw),
    previousKey,
    ...(draw.codePolicy === 'split' ? { letters: draw.letters } : {}),
  })
  readKey(written.text)
  return written
}
