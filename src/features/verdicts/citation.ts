import { day } from '#src/lib/dates.ts'

interface Cited {
  panelName: string
  headline: string
  title: string
  publishedAt: string
  version: number
  number: number
}

/** How to cite a verdict: who, when, what, which version, and the short address that leads to it for good. */
export function citation(verdict: Cited, origin: string): string {
  const what = verdict.headline.trim() === '' ? verdict.title : verdict.headline
  const stop = /[.!?…]$/.test(what) ? '' : '.'
  const when = day(verdict.publishedAt, 'UTC')
  return `${verdict.panelName} (${when}). ${what}${stop} Blind listening verdict ${verdict.number}, version ${verdict.version}. ${origin}/v/${verdict.number}`
}
