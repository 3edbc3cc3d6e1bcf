import type { ReactNode } from 'react'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { to } from '#src/app/paths.ts'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { ForgetButton } from './ForgetButton.tsx'
import { HandOverLinks } from './HandOver.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

const words = {
  thanks: {
    title: 'Thank you. That was all',
    text: 'Your ratings are with the round, and nobody sees them but you until it closes. Open this page again afterwards: your own ratings then stand beside the panel’s.',
  },
  closed: {
    title: 'This round is closed',
    text: 'Nothing more can be rated here.',
  },
  left: {
    title: 'You have stopped taking part',
    text: 'What you sent stays in the round. If you change your mind, the steward can let you back in while the round is open.',
  },
} as const

interface EndedProps {
  seat: PanelistSeat
  how: keyof typeof words
  notices: ReactNode
  kept: ReactNode
}

/** Nothing more to do: thanks, a closed round, or a seat that was left. */
export function Ended({ seat, how, notices, kept }: EndedProps) {
  const cancelled = how === 'closed' && seat.round.status === 'cancelled'
  const { title, text } = words[how]
  return (
    <SeatFrame seat={seat} kept={kept}>
      {notices}
      <ScreenTitle>{cancelled ? 'This round was cancelled' : title}</ScreenTitle>
      <p className="lead mt-3">
        {cancelled ? 'No rating of it is shown in sum to anyone. Its public page says why.' : text}
      </p>
      <div className="mt-4">
        <LinkButton to={to('publicRound', { round: seat.round.id })}>The round’s public page</LinkButton>
      </div>
      <HandOverLinks seat={seat} />
      <div className="mt-6">
        <ForgetButton seat={seat} />
      </div>
    </SeatFrame>
  )
}
