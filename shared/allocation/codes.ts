import { range } from './balance.ts'
import type { Stream } from './stream.ts'
import type { CodeSet, Letter, Refusal } from './types.ts'

/** The most codes that one sitting may need: more would leave too little choice among the 633. */
export const MOST_CODES = 300
export const CODE_SETS: readonly CodeSet[] = ['served', 'takeover', 'reserve']

const digits = (code: number) => [Math.floor(code / 100), Math.floor(code / 10) % 10, code % 10] as const

/** 100–999 with three different digits that do not run up (…345…) or down (…543…). */
export function isCode(code: number): boolean {
  if (!Number.isInteger(code) || code < 100 || code > 999) return false
  const [a, b, c] = digits(code)
  const run = b - a === c - b && Math.abs(b - a) === 1
  return a !== b && b !== c && a !== c && !run
}

/** All 633 codes. */
export const CODES: readonly number[] = range(1000).filter(isCode)

/** In how many of the three places two codes differ. */
export function placesApart(one: number, other: number): number {
  const second = digits(other)
  return digits(one).filter((digit, i) => digit !== second[i]).length
}

type Slot = { row: number; unit: string }
type Allowed = (code: number, unit: string) => boolean

const TRIES = 20

/** Moves codes among slots until `slot` has one, or tells that none is left. */
function makeRoom(
  slot: number,
  slots: readonly Slot[],
  pool: readonly number[],
  owner: Map<number, number>,
  allowed: Allowed,
) {
  const seen = new Set<number>()
  const place = (at: number): boolean => {
    for (const code of pool) {
      if (seen.has(code) || !allowed(code, slots[at]!.unit)) continue
      seen.add(code)
      const before = owner.get(code)
      if (before === undefined || place(before)) {
        owner.set(code, at)
        return true
      }
    }
    return false
  }
  return place(slot)
}

function assignOnce(slots: readonly Slot[], allowed: Allowed, stream: Stream): number[] | null {
  const pool = stream.shuffle(CODES)
  const owner = new Map<number, number>()
  const ofRow = new Map<number, number[]>()
  for (const at of stream.shuffle(range(slots.length))) {
    const { row, unit } = slots[at]!
    const near = ofRow.get(row) ?? []
    const free = (code: number) => !owner.has(code) && allowed(code, unit)
    const apart = (code: number) => near.every((other) => placesApart(code, other) >= 2)
    const code = pool.find((one) => free(one) && apart(one)) ?? pool.find(free)
    if (code !== undefined) {
      owner.set(code, at)
      ofRow.set(row, [...near, code])
    } else if (!makeRoom(at, slots, pool, owner, allowed)) return null
  }
  const codes = new Array<number>(slots.length).fill(0)
  for (const [code, at] of owner) codes[at] = code
  return codes
}

/** How many pairs of codes in one row differ in one place only. */
function closePairs(slots: readonly Slot[], codes: readonly number[]): number {
  let close = 0
  for (let i = 0; i < slots.length; i += 1) {
    for (let j = 0; j < i; j += 1) {
      if (slots[i]!.row === slots[j]!.row && placesApart(codes[i]!, codes[j]!) < 2) close += 1
    }
  }
  return close
}

/** One different code for each slot; null when no choice of codes is allowed. Fewest close pairs of some tries. */
function assign(slots: readonly Slot[], allowed: Allowed, stream: Stream): number[] | null {
  let best: number[] | null = null
  let fewest = Infinity
  for (let i = 0; i < TRIES && fewest > 0; i += 1) {
    const codes = assignOnce(slots, allowed, stream)
    if (codes === null) return null
    const close = closePairs(slots, codes)
    if (close < fewest) [best, fewest] = [codes, close]
  }
  return best
}

function allowedBy(pairs: readonly { code: number; unit: string }[], codes: readonly number[]): Allowed {
  const excluded = new Set(codes)
  const spent = new Set(pairs.map((pair) => `${pair.code} ${pair.unit}`))
  return (code, unit) => !excluded.has(code) && !spent.has(`${code} ${unit}`)
}

const tooFew = (needed: number): Refusal => ({
  ok: false,
  reason: 'history-leaves-too-few-codes',
  detail: `earlier rounds leave no choice of ${needed} codes for this sitting`,
})

type Exclusions = { pairs: readonly { code: number; unit: string }[]; codes: readonly number[] }

/**
 * Codes for a sitting in which every serving has its own: `rows[row][unit index]` holds one code of each set. All
 * differ; within a row they differ in two places where possible; excluded pairs and codes never occur.
 */
export function drawCodes(
  input: Exclusions & { rows: number; units: readonly string[]; stream: Stream },
): { ok: true; rows: Record<CodeSet, number>[][] } | Refusal {
  const { rows, units, pairs, codes, stream } = input
  const needed = rows * units.length * CODE_SETS.length
  if (needed > MOST_CODES) {
    const detail = `${rows} rows of ${units.length} units need ${needed} codes; a sitting has at most ${MOST_CODES}`
    return { ok: false, reason: 'too-many-codes', detail }
  }
  const slots = range(rows).flatMap((row) => units.flatMap((unit) => CODE_SETS.map(() => ({ row, unit }))))
  const drawn = assign(slots, allowedBy(pairs, codes), stream)
  if (drawn === null) return tooFew(needed)
  const at = (row: number, unit: number, set: number) => drawn[(row * units.length + unit) * 3 + set]!
  return {
    ok: true,
    rows: range(rows).map((row) =>
      units.map((_, u) => ({ served: at(row, u, 0), takeover: at(row, u, 1), reserve: at(row, u, 2) })),
    ),
  }
}

/** A split key: units get letters A, B, … at random, and each letter two codes for the whole sitting. */
export function drawLetters(
  input: Exclusions & { units: readonly string[]; stream: Stream },
): { ok: true; letters: Letter[] } | Refusal {
  const units = input.stream.shuffle(input.units)
  const slots = units.flatMap((unit) => [
    { row: 0, unit },
    { row: 0, unit },
  ])
  const drawn = assign(slots, allowedBy(input.pairs, input.codes), input.stream)
  if (drawn === null) return tooFew(slots.length)
  const letters = units.map((unit, i) => ({
    letter: String.fromCharCode(65 + i),
    unit,
    codes: { served: drawn[2 * i]!, reserve: drawn[2 * i + 1]! },
  }))
  return { ok: true, letters }
}
