import type { ComponentProps } from 'react'
import { familyNames } from '#shared/domain/lexicon.ts'
import { FamilySign } from '#src/components/FamilySign.tsx'
import type { Answer } from '#src/components/rating/answer.ts'
import { RatingLine } from '#src/components/RatingLine.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { listed } from '#src/lib/counts.ts'
import type { FamilyScreen } from '../family-screens.ts'
import type { KeptServing } from '../keeping/kept-serving.ts'
import { lineScale } from '../line-scale.ts'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

export type Frame = Omit<ComponentProps<typeof SeatFrame>, 'children' | 'verb'>

interface RatingFamilyProps {
  frame: Frame
  screen: FamilyScreen
  /** Which of the families' screens this is, and what comes after it. */
  position: { at: number; of: number; later: string[] }
  answers: KeptServing['answers']
  onAnswer: (line: string, answer: Answer) => void
  next: { name: string; go: () => void }
  back?: { name: string; go: () => void }
}

/** One family, at most four lines, the verb at the bottom. */
export function RatingFamily({ frame, screen, position, answers, onAnswer, next, back }: RatingFamilyProps) {
  const name = screen.family === 'liking' ? 'First, as a whole' : familyNames[screen.family]
  const part = screen.parts > 1 ? `, ${screen.part} of ${screen.parts}` : ''
  const then = position.later.length > 0 ? `then ${listed(position.later)}` : 'then a remark'
  return (
    <SeatFrame {...frame} verb={<Button onClick={next.go}>{next.name}</Button>}>
      <div className="family-heading" data-family={screen.family}>
        <ScreenTitle size="small" title={name + part}>
          <span className="family-name">
            <FamilySign family={screen.family} />
            <span>
              {name}
              {part}
            </span>
          </span>
        </ScreenTitle>
      </div>
      <p className="note">
        {position.at} of {position.of} · {then}
      </p>
      {screen.lines.map((line) => (
        <RatingLine
          key={line.key}
          id={`line-${line.key}`}
          name={line.name}
          sentence={line.sentence}
          family={line.family}
          scale={lineScale(line)}
          heading="h2"
          value={answers[line.key] ?? null}
          onChange={(answer) => onAnswer(line.key, answer)}
        />
      ))}
      {back && (
        <div className="mt-2">
          <Button kind="secondary" icon="back" onClick={back.go}>
            {back.name}
          </Button>
        </div>
      )}
    </SeatFrame>
  )
}
