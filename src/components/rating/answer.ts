/** A line's answer: a number on its scale, "can't tell" (which is an answer), or null while it is unanswered. */
export type Answer = number | 'cant-tell' | null

/** A descriptor's scale as the line needs it. One-sided runs from little to much; two-sided has a neutral middle. */
export interface LineScale {
  low: number
  high: number
  /** Smallest step a rating may take. */
  step: number
  sided: 'one' | 'two'
  lowWord: string
  highWord: string
  /** Word for the middle of a two-sided scale: "neutral", "about right". */
  midWord?: string
}

export const middleOf = (scale: LineScale) => snap(scale, (scale.low + scale.high) / 2)

/** The nearest value that the scale allows. */
export function snap(scale: LineScale, value: number) {
  const steps = Math.round((value - scale.low) / scale.step)
  const snapped = Number((scale.low + steps * scale.step).toFixed(6))
  return Math.min(scale.high, Math.max(scale.low, snapped))
}

/** How far along the line a value lies, 0 to 1. */
export const shareOf = (scale: LineScale, value: number) => (value - scale.low) / (scale.high - scale.low)

/** The value at a share of the line, 0 to 1, taken to the nearest step. */
export const valueAt = (scale: LineScale, share: number) =>
  snap(scale, scale.low + Math.min(1, Math.max(0, share)) * (scale.high - scale.low))

/** What a screen reader says: the value and which end it leans to. No number is shown. */
export function sayAnswer(scale: LineScale, answer: Answer): string {
  if (answer === null) return 'not answered'
  if (answer === 'cant-tell') return 'answered: I can’t tell'
  const number =
    scale.low === 0 ? `${answer} of ${scale.high}` : `${answer}, from ${scale.low} to ${scale.high}`
  const middle = (scale.low + scale.high) / 2
  if (answer === middle) return `${number}, ${scale.midWord ?? 'halfway'}`
  return `${number}, towards ${answer > middle ? scale.highWord : scale.lowWord}`
}

const BIG_STEPS = 10

/**
 * What a key does. The first key on an unanswered line sets the middle, whichever it is; Delete clears.
 * @returns the new answer, or undefined when the key is not for the line
 */
export function answerByKey(scale: LineScale, answer: Answer, key: string): Answer | undefined {
  if (key === 'Delete' || key === 'Backspace') return null
  const by: Record<string, number> = {
    ArrowRight: 1,
    ArrowUp: 1,
    ArrowLeft: -1,
    ArrowDown: -1,
    PageUp: BIG_STEPS,
    PageDown: -BIG_STEPS,
  }
  const moves = by[key]
  if (moves === undefined && key !== 'Home' && key !== 'End') return undefined
  if (typeof answer !== 'number') return middleOf(scale)
  if (key === 'Home') return scale.low
  if (key === 'End') return scale.high
  return snap(scale, answer + (moves ?? 0) * scale.step)
}

/** What − or + does: the first step sets the middle. */
export function answerByStep(scale: LineScale, answer: Answer, direction: -1 | 1): number {
  return typeof answer === 'number' ? snap(scale, answer + direction * scale.step) : middleOf(scale)
}
