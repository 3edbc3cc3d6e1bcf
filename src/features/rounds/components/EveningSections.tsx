import type { ReactNode } from 'react'
import { useWatch } from 'react-hook-form'
import { useLocation } from 'react-router-dom'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { Disclosure } from '#src/components/ui/Disclosure.tsx'
import { conditionsWords, dutiesWords, linesWords } from '../evening/draft-words.ts'
import type { EveningPart } from '../evening/evening-form.ts'
import { ConditionsFields, TracksField } from './ConditionsFields.tsx'
import { DutiesFields } from './DutiesFields.tsx'
import { ScorecardFields } from './ScorecardFields.tsx'
import { WordsFields } from './WordsFields.tsx'

interface FoldedProps {
  label: string
  /** What holds if nothing is changed here. */
  words: string
  /** Unfolds by itself where something inside is at fault. */
  faulty: boolean
  note?: ReactNode
  children: ReactNode
}

const Folded = ({ label, words, faulty, note, children }: FoldedProps) => (
  <FolioSection label={label} note={note}>
    <Disclosure summary={words} open={faulty}>
      <div className="fields mt-3">{children}</div>
    </Disclosure>
  </FolioSection>
)

/** All that has a default: each part is a sentence that unfolds. */
export function EveningSections(part: EveningPart) {
  const [people, tagging, scorecard, tracks, levelMatching, hiding, title] = useWatch({
    control: part.form.control,
    name: ['people', 'tagging', 'scorecard', 'tracks', 'levelMatching', 'hiding', 'title'],
  })
  const { hash } = useLocation()
  const faulty = (...fields: string[]) =>
    fields.some((field) => part.errorAt(field) !== undefined || hash === `#${field}`)
  return (
    <>
      <Folded label="Duties" words={dutiesWords({ people, tagging })} faulty={faulty('tagging')}>
        <DutiesFields {...part} />
      </Folded>
      <Folded
        label="Scorecard"
        words={linesWords(scorecard)}
        faulty={faulty('scorecard', 'primaryDescriptor')}
      >
        <ScorecardFields {...part} />
      </Folded>
      <Folded
        label="Music and cloth"
        words={conditionsWords({ tracks, levelMatching, hiding })}
        faulty={faulty('tracks', 'levelMatching', 'hiding')}
        note={
          levelMatching === 'not-matched' && (
            <p>
              The louder unit is often liked better, whatever it is. Matching by ear is better than not at
              all.
            </p>
          )
        }
      >
        <TracksField {...part} />
        <ConditionsFields {...part} />
      </Folded>
      <Folded
        label="Words"
        words={title}
        faulty={faulty('title', 'question', 'sourceChain', 'publishesRows')}
      >
        <WordsFields {...part} />
      </Folded>
    </>
  )
}
