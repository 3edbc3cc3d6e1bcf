import type { ReactNode } from 'react'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { Notice } from '#src/components/ui/Notice.tsx'
import { numberWord } from '#src/lib/counts.ts'
import { nextServing, ordinalWord } from '../step-screen.ts'
import { HandOverLinks } from './HandOver.tsx'
import { LeaveButton } from './LeaveButton.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

const settled: Partial<Record<string, { title: string; text: string }>> = {
  void: {
    title: 'The steward set your last serving aside',
    text: 'Put the earphones back in the pouch. It comes again at the end under another code.',
  },
  missed: {
    title: 'The table went on before your last serving was sent',
    text: 'It counts as missed. That is no fault, and nothing stops.',
  },
}

/** Between turns: which pouch comes next, and that nothing needs doing. */
export function WaitingScreen({
  seat,
  notices,
  kept,
}: {
  seat: PanelistSeat
  notices: ReactNode
  kept: ReactNode
}) {
  const next = nextServing(seat)
  const before = seat.serving && settled[seat.serving.state]
  const title = next
    ? `Next: your ${ordinalWord(next.ordinal)} of ${numberWord(next.of)}`
    : 'Nothing more comes for now'
  const when =
    seat.turn === 0
      ? 'The steward starts when everybody is here.'
      : `The table is at turn ${seat.turn} of ${seat.plan.turns}; a turn takes about ${seat.plan.minutesPerTurn} minutes. This may be a turn in which you rest.`
  return (
    <SeatFrame seat={seat} kept={kept}>
      {notices}
      {before && (
        <div className="mb-6">
          <Notice title={before.title} live>
            {before.text}
          </Notice>
        </div>
      )}
      <ScreenTitle title={title}>{title}</ScreenTitle>
      <p className="lead mt-3">{when}</p>
      <p className="mt-3">
        This screen changes by itself when a pouch is handed to you. Keep your ears bare till then.
      </p>
      <HandOverLinks seat={seat} />
      <div className="mt-6">
        <LeaveButton seat={seat} />
      </div>
    </SeatFrame>
  )
}
