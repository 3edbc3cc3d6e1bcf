import type { Reveal } from '#shared/contracts/analysis.ts'
import { asPoints, asRange } from '#src/components/results/figures.ts'
import { counted, numberWord, sentenceCase } from '#src/lib/counts.ts'

/** One step per unit, one more for the panel's sentence; step 0 is all cloth. */
export const lastStep = (reveal: Pick<Reveal, 'units'>): number => reveal.units.length + 1

/** A step asked for in the address, kept within what there is. */
export function stepFrom(asked: string | null, reveal: Pick<Reveal, 'units'>): number {
  const step = Number(asked ?? 0)
  return Number.isInteger(step) ? Math.min(Math.max(step, 0), lastStep(reveal)) : 0
}

export interface Said {
  heading: string
  /** The codes a unit went by, each listener's own among them. */
  codes: readonly string[]
  /** What the room reads below it; empty where the heading says all. */
  detail: string
}

/** What is said at a step. A unit's name is not in the words before its cloth is drawn aside. */
export function saidAt(reveal: Reveal, step: number): Said {
  const { scale, name } = reveal.descriptor
  if (step === 0)
    return {
      heading: reveal.title,
      codes: [],
      detail: `${sentenceCase(numberWord(reveal.units.length))} units, still under the cloth. ${name} is shown.`,
    }
  const unit = reveal.units[step - 1]
  if (unit === undefined) return { heading: reveal.sentence, codes: [], detail: '' }
  const heading = `${unit.maker} ${unit.name}`
  const { codes } = unit
  if (unit.median === null || unit.q1 === null || unit.q3 === null)
    return { heading, codes, detail: `Nobody could rate it on ${name.toLowerCase()}.` }
  return {
    heading,
    codes,
    detail: `${name}: median ${asPoints(unit.median, scale)}, the middle half ${asRange(unit.q1, unit.q3, scale)}, ${counted(unit.n, 'rating')}.`,
  }
}

/** How far the room is: "2 of 6 drawn aside". */
export const progressAt = (reveal: Pick<Reveal, 'units'>, step: number): string =>
  `${Math.min(step, reveal.units.length)} of ${reveal.units.length} drawn aside`
