import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import { shortScorecard } from '#shared/domain/lexicon.ts'
import { withDuties, type DraftPerson } from './share-out-duties.ts'

/** How shape and cable may be hidden; the first is what most small panels do. */
export const hidingWords = [
  'Opaque pouches; listeners look away while putting the earphones in, cables run under a cloth.',
  'Opaque pouches only: a listener could feel shape and cable.',
  'Nothing is hidden: listeners could see the earphones.',
] as const

const somebody = (name = ''): DraftPerson => ({
  name,
  listens: true,
  duty: 'none',
  steward: false,
  you: false,
})
export const nobodyYet = somebody
export const unnamedUnit = () => ({ maker: '', name: '' })

/** A title that says when: "An evening of listening, Tuesday 1 December". */
export const eveningTitle = (at: Date, zone?: string): string =>
  `An evening of listening, ${new Intl.DateTimeFormat('en-GB', {
    weekday: 'long',
    day: 'numeric',
    month: 'long',
    ...(zone === undefined ? {} : { timeZone: zone }),
  })
    .format(at)
    .replace(',', '')}`

/**
 * An evening in which only names are missing. What goes public about the method is set to the least that may be true:
 * levels are not matched until somebody says that they are.
 */
export function blankEvening(you: string, at: Date, zone?: string): EveningDraftInput {
  return {
    title: eveningTitle(at, zone),
    question: 'Which of these do we like, and do we hear the same things in them?',
    units: [unnamedUnit(), unnamedUnit(), unnamedUnit()],
    people: withDuties([{ ...somebody(you), you: true }, somebody(), somebody()], 'split'),
    scorecard: [...shortScorecard],
    primaryDescriptor: 'overall-liking',
    tracks: [],
    sourceChain: '',
    levelMatching: 'not-matched',
    hiding: hidingWords[0],
    tagging: 'split',
    publishesRows: true,
  }
}
