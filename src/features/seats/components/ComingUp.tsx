import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { counted, numberWord, sentenceCase, spokenMinutes } from '#src/lib/counts.ts'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

/** What is coming, how long it takes and how it goes, before anything is agreed to. */
export function ComingUp({ seat, onRead }: { seat: PanelistSeat; onRead: () => void }) {
  const { plan, round } = seat
  const lines = seat.scorecard.length
  return (
    <SeatFrame seat={seat} verb={<Button onClick={onRead}>Go on</Button>}>
      <ScreenTitle title="What is coming">{round.question}</ScreenTitle>
      <p className="lead mt-3">
        {sentenceCase(counted(plan.servings, 'pair'))} of earphones, one after another,{' '}
        {spokenMinutes(plan.minutes)} with breaks. You will not know which is which, and neither will anyone
        at the table.
      </p>
      <ol className="mt-6 rows">
        <li className="py-3">You are handed a pouch and type the three digits on it.</li>
        <li className="py-3">
          You listen{seat.tracks.length > 0 ? ' to the tracks below' : ''} and rate {numberWord(lines)}{' '}
          {lines === 1 ? 'line' : 'lines'} on this phone: overall liking first. “I can’t tell” is always an
          answer.
        </li>
        <li className="py-3">You rest your ears while the others finish, then the next pouch comes.</li>
      </ol>
      <p className="mt-4">There is no right answer. Nobody sees what you rate until the round closes.</p>
      {seat.tracks.length > 0 && (
        <>
          <h2 className="subheading mt-6">What you will hear</h2>
          <ul className="mt-2 rows">
            {seat.tracks.map((track) => (
              <li key={track} className="py-2">
                {track}
              </li>
            ))}
          </ul>
        </>
      )}
      <p className="note mt-6">
        {round.panelName}. Scrim plays no sound: the music comes from the source on the table.
      </p>
    </SeatFrame>
  )
}
