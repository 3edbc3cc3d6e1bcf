import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState, type ReactNode } from 'react'
import { checkSeal, type PanelistSeat } from '#shared/contracts/seats.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { Steps } from '#src/components/ui/Steps.tsx'
import { call } from '#src/lib/call.ts'
import { numberWord } from '#src/lib/counts.ts'
import { seatQuery } from '../queries.ts'
import {
  mostReseats,
  sealNone,
  sealOutcome,
  sealQuestions,
  sealStart,
  sealStep,
  type SealAnswer,
  type SealQuestion,
} from '../seal-check.ts'
import { CallFailure } from './CallFailure.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

const questions: Record<SealQuestion, { ask: string; how: string }> = {
  bass: {
    ask: 'Is the bass there?',
    how: 'Put both earphones in and start the seal check on the source. Low notes should be plainly there, not thin and far away.',
  },
  'both-ears': {
    ask: 'Are both ears equal?',
    how: 'The notes come left, then right. They should be as strong in one ear as in the other.',
  },
  middle: {
    ask: 'Is the voice in the middle?',
    how: 'The voice or noise in both ears should stand in the middle of your head, not to one side.',
  },
}

/** The seal check in plain steps. The sounds come from the source; this phone only asks. */
export function SealScreen({
  seat,
  serving,
  kept,
}: {
  seat: PanelistSeat
  serving: NonNullable<PanelistSeat['serving']>
  kept: ReactNode
}) {
  const client = useQueryClient()
  const [check, setCheck] = useState(serving.sealChecked ? sealNone : sealStart)
  const tell = useMutation({
    mutationFn: (sealed: 'yes' | 'unsure' | 'no') =>
      call(checkSeal, { params: { seat: seat.id, serving: serving.id }, body: { sealed } }),
    onSuccess: (now) => client.setQueryData(seatQuery(seat.id).queryKey, now),
  })
  const take = (answer: SealAnswer) => {
    const next = sealStep(check, answer)
    setCheck(next)
    if (next.at === 'sealed' || (next.at === 'no-seal' && check.at !== 'no-seal'))
      tell.mutate(sealOutcome(next))
  }
  const failure = tell.error && (
    <CallFailure
      error={tell.error}
      what="The seal check was not taken."
      onRetry={() => tell.mutate(sealOutcome(check))}
    />
  )

  if (check.at === 'reseat' || check.at === 'other-tips') {
    const tips = check.at === 'other-tips'
    return (
      <SeatFrame
        seat={seat}
        kept={kept}
        verb={<Button onClick={() => take('done')}>{tips ? 'Other tips are on' : 'Seated anew'}</Button>}
      >
        <ScreenTitle key={check.at + check.reseats}>
          {tips ? 'Try tips of another size' : 'Seat the earphones anew'}
        </ScreenTitle>
        <p className="lead mt-3">
          {tips
            ? 'Ask the steward for new tips, one size up or down, and put them on. Then the questions come once more.'
            : 'Take both out. Pull the ear up and back, turn the earphone in gently, wait a moment. A light tug should meet some resistance.'}
        </p>
        {!tips && (
          <p className="note mt-3">
            Try {numberWord(check.reseats)} of {numberWord(mostReseats)}. Stop if anything hurts.
          </p>
        )}
        {tips && (
          <div className="mt-4">
            <Button kind="secondary" onClick={() => take('no-other-tips')}>
              There are no other tips
            </Button>
          </div>
        )}
      </SeatFrame>
    )
  }

  if (check.at === 'no-seal' || check.at === 'sealed') {
    const none = check.at === 'no-seal'
    return (
      <SeatFrame
        seat={seat}
        kept={kept}
        verb={none ? <Button onClick={() => take('again')}>Check again</Button> : undefined}
      >
        <ScreenTitle key={check.at}>{none ? 'Say “no seal” to the steward' : 'The seal is good'}</ScreenTitle>
        <p className="lead mt-3">
          {none
            ? 'These earphones do not close in your ears today. That is no fault of yours: the steward sets this serving aside, and it is not rated as poor.'
            : 'One moment: the rating comes next.'}
        </p>
        {failure}
      </SeatFrame>
    )
  }

  const question = questions[check.at]
  const at = sealQuestions.indexOf(check.at) + 1
  return (
    <SeatFrame seat={seat} kept={kept} verb={<Button onClick={() => take('yes')}>Yes</Button>}>
      <Steps noun="Seal check" current={at} total={sealQuestions.length} />
      <div className="mt-6">
        <ScreenTitle key={check.at + check.reseats} title={`Seal check: ${question.ask}`}>
          {question.ask}
        </ScreenTitle>
      </div>
      <p className="lead mt-3">{question.how}</p>
      <div className="actions mt-6">
        <Button kind="secondary" onClick={() => take('no')}>
          No
        </Button>
        <Button kind="secondary" onClick={() => take('cant-tell')}>
          I can’t tell
        </Button>
      </div>
      <p className="note mt-6">Moderate level. Stop at once on pain, ringing, dizziness or fullness.</p>
    </SeatFrame>
  )
}
