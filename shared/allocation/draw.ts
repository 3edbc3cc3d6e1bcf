import type { DrawInput, DrawResult } from './types.ts'

export function drawRound(_input: DrawInput): DrawResult {
  throw new Error('not built yet')
}
