import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import { counted, numberWord } from '#src/lib/counts.ts'
import { asP, asShare, asShareWithInterval } from './figures.ts'

type Agreement = DescriptorResult['agreement']
type Estimate = Extract<Agreement['single'], { estimate: number }>

/** True where a figure could be said; otherwise it carries a sentence that says why not. */
export const isSaid = (figure: Agreement['single']): figure is Estimate => 'estimate' in figure

/** "0.78, between 0.61 and 0.88", or why there is no figure. */
export const figureWords = (figure: Agreement['single']): string =>
  isSaid(figure) ? asShareWithInterval(figure) : figure.sentence

/** "0.86, p 0.006", or why there is no figure. */
export const wWords = (w: Agreement['w']): string =>
  'w' in w ? `${asShare(w.w)}, p ${asP(w.pExact ?? w.p)}` : w.sentence

/** Who Kendall's W stands on, where somebody had to be left out. */
export function leftOutWords(w: Agreement['w']): string | null {
  if (!('w' in w) || w.listwise.leftOut === 0) return null
  const { used, leftOut } = w.listwise
  return `W stands on the ${counted(used, 'listener')} who rated every unit; ${numberWord(leftOut)} ${leftOut === 1 ? 'was' : 'were'} left out.`
}

/** The short of a sentence on the panel's mean, for a column of that name: "is steady", "cannot be said". */
export const steadyShort = (sentence: string): string =>
  (sentence.split(':')[0] ?? '')
    .replace(/^The panel’s mean /, '')
    .replace(/^Whether .* cannot be said$/, 'cannot be said')

/** How much weight a descriptor's sentence may carry. */
export const statedWords: Record<DescriptorResult['stated'], string> = {
  primary: 'The primary descriptor: its result is stated.',
  stated: 'Holds over the whole scorecard (Holm).',
  hint: 'A hint: it does not hold over the whole scorecard (Holm).',
}

/** A panel's label with what it stands on: "Small panel: at least six listeners on each unit". */
export const labelWords = (label: { words: string; fewest: number }): string =>
  `${label.words}: at least ${counted(label.fewest, 'listener')} on each unit`
