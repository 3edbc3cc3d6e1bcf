import { familyNames } from '#shared/domain/lexicon.ts'
import { FamilyName } from '#src/components/FamilySign.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { counted, sentenceCase } from '#src/lib/counts.ts'
import type { FamilyScreen } from '../family-screens.ts'
import { openLines, type KeptServing } from '../keeping/kept-serving.ts'
import type { Frame } from './RatingFamily.tsx'
import { AnswerGlimpse } from './AnswerGlimpse.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

interface ReviewScreenProps {
  frame: Frame
  kept: KeptServing
  screens: readonly FamilyScreen[]
  saving: boolean
  onScreen: (screen: number) => void
  onRemark: () => void
  onSubmit: () => void
}

/** A last look before sending: what was answered, what is open, and that sending locks. */
export function ReviewScreen({
  frame,
  kept,
  screens,
  saving,
  onScreen,
  onRemark,
  onSubmit,
}: ReviewScreenProps) {
  const open = openLines(frame.seat.scorecard, kept)
  const reason =
    open.length === 0
      ? null
      : `${sentenceCase(counted(open.length, 'line'))} still open: answer, or say “I can’t tell”.`
  return (
    <SeatFrame
      {...frame}
      verb={
        <Button onClick={onSubmit} busy={saving && kept.outbox !== null} disabledReason={reason}>
          Send this serving
        </Button>
      }
    >
      <ScreenTitle>A last look</ScreenTitle>
      <p className="mt-2">Sending locks your answers. Until then you may change any of them.</p>
      {screens.map((screen, nth) => (
        <section key={nth} className="mt-6" data-family={screen.family}>
          <div className="flex flex-wrap items-baseline justify-between gap-x-4">
            <h2>
              <FamilyName family={screen.family}>
                {familyNames[screen.family]}
                {screen.parts > 1 && `, ${screen.part} of ${screen.parts}`}
              </FamilyName>
            </h2>
            <Button kind="secondary" onClick={() => onScreen(nth)}>
              Change <span className="visually-hidden">{familyNames[screen.family]}</span>
            </Button>
          </div>
          <ul className="rows">
            {screen.lines.map((line) => (
              <AnswerGlimpse key={line.key} line={line} answer={kept.answers[line.key] ?? null} />
            ))}
          </ul>
        </section>
      ))}
      <section className="mt-6">
        <div className="flex flex-wrap items-baseline justify-between gap-x-4">
          <h2 className="font-semibold">Remark</h2>
          <Button kind="secondary" onClick={onRemark}>
            Change <span className="visually-hidden">the remark</span>
          </Button>
        </div>
        <p className={kept.remark ? 'reading' : 'text-muted'}>{kept.remark || 'none'}</p>
      </section>
    </SeatFrame>
  )
}
