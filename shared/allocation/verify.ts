import type { Check } from './types.ts'

/** Re-runs the draw from the published seed; every (position, turn, code, unit) must come out the same. */
export function repeatDraw(_keyText: string, _planText: string): Check[] {
  throw new Error('not built yet')
}

/** `ratedRows` (what the ratings file holds, read by the caller): each listener number and code must be in the key. */
export function verifyFiles(_input: {
  planText: string
  keyText: string
  ratingsText: string | null
  fingerprints: { plan: string; key: string; ratings: string | null }
  ratedRows?: { listener: number; code: number }[]
}): Check[] {
  throw new Error('not built yet')
}
