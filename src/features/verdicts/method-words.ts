import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import { counted, sentenceCase } from '#src/lib/counts.ts'
import { moment } from '#src/lib/dates.ts'

type Method = PublicVerdict['method']

const blindingWords: Record<string, string> = {
  double:
    'Double-blind: whoever put units under codes did not meet the listeners; steward and listeners saw codes only.',
  split:
    'Split key: one person put units into lettered pouches, another put codes over the letters; neither alone could tell which unit a code hid.',
  single: 'Single-blind: whoever handed out the units knew which code hid which unit; the listeners did not.',
  imported: 'Imported ratings: Scrim did not draw the codes and cannot say how blind the listening was.',
}

const levelWords: Record<string, string> = {
  measured: 'Levels were matched with a measurement before the round.',
  'by-ear': 'Levels were matched by ear.',
  'not-matched': 'Levels were not matched: louder often sounds better.',
}

const said = (words: Record<string, string>, key: string): string => words[key] ?? key

/** How the round was held, as pairs of a word and what stands behind it; what the round does not say is left out. */
export function methodWords(method: Method): { term: string; words: string }[] {
  const live = method.origin === 'live'
  const rows: [string, string][] = [
    ['Blinding', said(blindingWords, method.blinding)],
    [
      'Opened and closed',
      [
        method.openedAt &&
          `Opened ${moment(method.openedAt)}; from then on nothing in the plan could change.`,
        method.closedAt && `Closed ${moment(method.closedAt)}.`,
      ]
        .filter(Boolean)
        .join(' '),
    ],
    [
      'Listeners',
      sentenceCase(counted(method.listeners, 'listener')) +
        (method.turns === null ? '.' : `, in ${counted(method.turns, 'turn')}.`),
    ],
    ['Levels', live ? said(levelWords, method.levelMatching) : method.levelMatching],
    ['Shape and cable', method.hiding],
    ['Source', method.sourceChain],
    ['Tracks', method.tracks.join('; ')],
    ['Statistics', `Scrim’s library ${method.library}, seed ${method.seed}.`],
  ]
  return rows.filter(([, words]) => words.trim() !== '').map(([term, words]) => ({ term, words }))
}
