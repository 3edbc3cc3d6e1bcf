/** Shapes of the draw: what goes in, what comes out, and what the two sealed files hold. */

/** Any value that RFC 8785 can write here: no fractions, no undefined. */
export type Json = string | number | boolean | null | readonly Json[] | { readonly [key: string]: Json }

/** `served` at first; `takeover` when another person takes the row over; `reserve` when a serving was void. */
export type CodeSet = 'served' | 'takeover' | 'reserve'

/** `per-seat`: every serving has its own code. `split`: one code per unit for the sitting, through letters. */
export type CodePolicy = 'per-seat' | 'split'

/** One serving of a row: 1-based turn of the evening, 1-based place in the order heard, 0-based unit. */
export type TurnPlace = { turn: number; position: number; unit: number }

export type TurnRow = { places: TurnPlace[] }

/** How even the rows of the listeners are (spare rows are not counted). */
export type Balance = {
  /** Every unit is heard at every position by the same number of listeners, give or take one. */
  positionsWithinOne: boolean
  /** `[unit][position - 1]` → listeners. */
  positionCounts: number[][]
  /** `[unit][next unit]` → listeners who heard the second right after the first. */
  followerCounts: number[][]
  /** Largest less smallest follower count over ordered pairs of different units. */
  followerSpread: number
  /** The longest wait of any listener between two servings, in turns of rest. */
  longestRest: number
}

export type TurnPlan = { turns: number; rows: TurnRow[]; spareRows: TurnRow[]; balance: Balance }

/** What earlier rounds forbid. Codes are integers 100–999. */
export type History = {
  /** (code, unit id) pairs of the panel's last ten rounds **whose key is public**: they never return. They are
   * printed in this round's key, so a pair of a sealed key must never stand here. */
  pairs: { code: number; unit: string }[]
  /** Codes kept out of the whole round: those of the panel's rounds whose key is still sealed. */
  codes: number[]
  /** Codes that each member met in their last three rounds. Never published: they only steer who gets which row. */
  seats: { seatRef: string; codes: number[] }[]
}

export type DrawInput = {
  /** 64 lowercase hex digits from the system's random source. */
  seed: string
  scheme: 'scrim-draw-1'
  mode: 'turns'
  /** 2–12 units; any order, sorted by id inside. */
  units: { id: string }[]
  /** 1–40 seats; any order, sorted by reference inside. References never enter the key. */
  seats: { seatRef: string }[]
  spares: number
  codePolicy: CodePolicy
  history: History
}

/** One serving with its codes; under a split key `takeover` equals `served`. */
export type DrawPlace = { turn: number; position: number; unit: string; codes: Record<CodeSet, number> }

export type DrawRow = {
  /** The number of the public file: drawn from 1…rows, spares included. */
  listener: number
  /** The number of whoever takes the row over: `listener` + the number of rows, spares included. */
  takeoverListener: number
  spare: boolean
  places: DrawPlace[]
}

/** One pouch letter of a split key. */
export type Letter = { letter: string; unit: string; codes: { served: number; reserve: number } }

export type DrawOrder = {
  scheme: 'scrim-draw-1'
  mode: 'turns'
  listeners: number
  spares: number
  codePolicy: CodePolicy
  /** How many earlier drawings of codes gave no seating free of remembered codes. */
  attempt: number
}

export type Draw = DrawOrder & {
  /** Turns in which the listeners are served; spare rows may run on after it. */
  turns: number
  /** Sorted by listener number. */
  rows: DrawRow[]
  /** Seat → the listener number of its row. */
  seats: { seatRef: string; listener: number }[]
  /** A, B, …; empty unless the key is split. */
  letters: Letter[]
  balance: Balance
}

export type Refusal = { ok: false; reason: 'too-many-codes' | 'history-leaves-too-few-codes'; detail: string }

export type DrawResult = { ok: true; draw: Draw } | Refusal

export type PlanDesign = {
  mode: 'turns'
  units: number
  listeners: number
  spares: number
  turns: number
  codePolicy: CodePolicy
}

/** What freezes at opening. Free parts are any JSON without fractions (decimals are strings). */
export type PlanContent = {
  question: string
  scorecard: Json
  primaryDescriptor: string
  rules: Json
  design: PlanDesign
  tracks: Json
  levelMatching: Json
  hiding: Json
  blinding: Json
  [more: string]: Json
}

export type PlanDocument = {
  scheme: 'scrim-plan-1'
  round: string
  /** ISO 8601, UTC. */
  time: string
  /** 64 hex digits. */
  nonce: string
  versions: { [part: string]: string }
  plan: PlanContent
  /** Fingerprint of the canonical text of `plan`. */
  planDigest: string
}

export type KeyUnit = { id: string; maker: string; name: string; serial: string; firmware: string }

export type KeyRow = {
  listener: number
  set: CodeSet
  places: { position: number; turn: number; code: number; unit: string }[]
}

export type KeyDocument = {
  scheme: 'scrim-key-1'
  round: string
  time: string
  nonce: string
  seed: string
  versions: { [part: string]: string }
  planDigest: string
  units: KeyUnit[]
  /** All that the draw needs beside seed and unit ids. */
  draw: DrawOrder & { excludedPairs: { code: number; unit: string }[]; excludedCodes: number[] }
  rows: KeyRow[]
  /** Fingerprint of the panel's key before this one. */
  previousKey: string | null
  letters?: Letter[]
}

export type FileText = { text: string; fingerprint: string }

export type Check = { name: string; ok: boolean; detail: string }
