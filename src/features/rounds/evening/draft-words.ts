import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import { lexiconEntry } from '#shared/domain/lexicon.ts'
import { minutesPerTurn } from '#shared/domain/timing.ts'
import { counted, listed, sentenceCase } from '#src/lib/counts.ts'
import { hidingWords } from './blank-evening.ts'
import { holderOf, type Duty } from './share-out-duties.ts'

type Draft = Pick<EveningDraftInput, 'people' | 'tagging'>

/** Who does what tonight, as the folded part of the form says it: "Bo and Cy share the tagging, Ada stewards". */
export function dutiesWords({ people, tagging }: Draft): string {
  const called = (duty: Duty): string => {
    const place = holderOf(people, duty)
    return people[place]?.name.trim() || `Person ${place + 1}`
  }
  if (tagging === 'split')
    return `${listed([called('letters'), called('codes')])} share the tagging, ${called('steward')} stewards`
  if (tagging === 'keeper')
    return `${called('keeper')} tags and does not listen, ${called('steward')} stewards`
  return `${called('keeper')} tags and stewards: single-blind`
}

/** "Overall liking and five lines, about 7 minutes a turn". */
export const linesWords = (scorecard: readonly string[]): string =>
  `Overall liking and ${counted(scorecard.length, 'line')}, about ${minutesPerTurn(scorecard.length + 1)} minutes a turn`

/** The names of some lines, "width, warmth". */
export const lineNames = (keys: readonly string[]): string =>
  keys.map((key) => (lexiconEntry(key)?.name ?? key).toLocaleLowerCase('en')).join(', ')

/** "No music named; levels not matched; opaque pouches". */
export function conditionsWords(
  draft: Pick<EveningDraftInput, 'tracks' | 'levelMatching' | 'hiding'>,
): string {
  const tracks = (draft.tracks ?? []).filter((track) => track.trim() !== '').length
  const level = {
    measured: 'levels measured',
    'by-ear': 'levels matched by ear',
    'not-matched': 'levels not matched',
  }
  const hiding = ['opaque pouches, nobody looks', 'opaque pouches', 'nothing hidden']
  const nth = hidingWords.findIndex((words) => words === draft.hiding)
  const music = tracks === 0 ? 'no music named' : counted(tracks, 'track')
  return sentenceCase([music, level[draft.levelMatching], hiding[nth] ?? 'hidden in your words'].join('; '))
}
