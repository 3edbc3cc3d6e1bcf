/**
 * How long an evening takes. About seven minutes a serving, about twelve seconds a descriptor, at most six servings
 * before a longer break: common practice, no source; the twelve seconds are an assumption.
 */
export const timing = {
  minutesPerServing: 7,
  secondsPerDescriptor: 12,
  servingsBeforeBreak: 4,
  breakMinutes: 10,
  restSeconds: 60,
  mostServings: 6,
} as const

/** Minutes for one turn in which `descriptors` lines are rated, overall liking included. */
export const minutesPerTurn = (descriptors: number): number =>
  Math.max(timing.minutesPerServing, Math.round(4.5 + (descriptors * timing.secondsPerDescriptor) / 60))

/** The evening in minutes: `turns` turns in step and a break after every fourth. */
export function eveningMinutes(
  turns: number,
  descriptors: number,
): { listening: number; breaks: number; total: number } {
  const listening = turns * minutesPerTurn(descriptors)
  const breaks = Math.max(0, Math.ceil(turns / timing.servingsBeforeBreak) - 1) * timing.breakMinutes
  return { listening, breaks, total: listening + breaks }
}
