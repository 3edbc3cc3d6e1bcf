import type { Agreement } from '#shared/contracts/analysis.ts'
import { counted, sentenceCase } from '#src/lib/counts.ts'

/** What became of the servings: "34 of 36 servings counted. One was void, one was missed." */
export function servingsWords(servings: Agreement['servings'], origin: string): string {
  if (origin === 'imported') return `${sentenceCase(counted(servings.counted, 'serving'))} in the file.`
  const left = [
    servings.void > 0 ? `${counted(servings.void, 'serving')} void and served again` : '',
    servings.missing > 0 ? `${counted(servings.missing, 'serving')} missing` : '',
    servings.late > 0 ? `${counted(servings.late, 'serving')} sent after closing: kept, not counted` : '',
  ].filter(Boolean)
  const all = `${servings.counted} of ${servings.planned} servings counted.`
  return left.length === 0 ? all : `${all} ${sentenceCase(left.join('; '))}.`
}

/** The listener's name where the reader may know it, else the number of the public file. */
export function listenerNames(listeners: Agreement['listeners']): (listener: string) => string {
  const names = new Map(listeners.map(({ listener, name }) => [listener, name]))
  return (listener) => names.get(listener) ?? `Listener ${listener}`
}

/** What an exclusion by a frozen rule did. */
export const exclusionWords = (one: Agreement['exclusions'][number]): string =>
  one.excluded ? 'left out' : 'flagged only'

const sureWords: Record<string, string> = { guess: 'a guess', fairly: 'fairly sure', certain: 'certain' }
/** How sure somebody was of a unit that they thought they knew. */
export const howSure = (sure: string): string => sureWords[sure] ?? sure
