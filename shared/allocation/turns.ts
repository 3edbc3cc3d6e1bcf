import type { Stream } from './stream.ts'
import type { TurnPlan } from './types.ts'

export function drawTurns(_input: {
  units: number
  listeners: number
  spares: number
  stream: Stream
}): TurnPlan {
  throw new Error('not built yet')
}
