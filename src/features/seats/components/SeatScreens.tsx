import { useState, type ReactNode } from 'react'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { kept as keptInTab } from '#src/lib/kept.ts'
import type { Keeping, KeepingState } from '../keeping/keeping.ts'
import { keptId, type Place } from '../keeping/kept-serving.ts'
import { keptWords } from '../kept-words.ts'
import { screenFor } from '../step-screen.ts'
import { ComingUp } from './ComingUp.tsx'
import { ConsentForm } from './ConsentForm.tsx'
import { Ended } from './Ended.tsx'
import { EndQuestions } from './EndQuestions.tsx'
import { EnterCode } from './EnterCode.tsx'
import { KeptNotices } from './KeptNotices.tsx'
import { OwnReport } from './OwnReport.tsx'
import { QueuedScreen } from './QueuedScreen.tsx'
import { RatingScreens } from './RatingScreens.tsx'
import { SealScreen } from './SealScreen.tsx'
import { SentScreen } from './SentScreen.tsx'
import { WaitingScreen } from './WaitingScreen.tsx'

interface SeatScreensProps {
  seat: PanelistSeat
  keeping: Keeping
  state: KeepingState
  /** A word on the connection, when there is something to say. */
  connection: ReactNode
}

/** The serving in hand as the phone keeps it; only known by its code once that was typed. */
export function placeOf(seat: PanelistSeat): Place | null {
  const { serving } = seat
  if (!serving?.code) return null
  return { seat: seat.id, serving: serving.id, code: serving.code, ordinal: serving.ordinal }
}

/** The one screen of a seat that is due now. */
export function SeatScreens({ seat, keeping, state, connection }: SeatScreensProps) {
  const read = keptInTab<boolean>(`seat.${seat.id}.read`)
  const [readAbout, setReadAbout] = useState(() => read.read() ?? false)
  const place = placeOf(seat)
  const kept = place ? state.records.get(keptId(place)) : undefined
  const screen = screenFor(seat, { readAbout, kept })
  const rating = screen === 'rate' || screen === 'seal' || screen === 'queued'
  const notices = (
    <>
      {connection}
      <KeptNotices
        keeping={keeping}
        state={state}
        seat={seat.id}
        scorecard={seat.scorecard}
        except={rating && place ? keptId(place) : null}
      />
    </>
  )
  const foot = keptWords(state, kept)
  const { serving } = seat

  switch (screen) {
    case 'coming-up':
      return (
        <ComingUp
          seat={seat}
          onRead={() => {
            read.write(true)
            setReadAbout(true)
          }}
        />
      )
    case 'consent':
      return <ConsentForm seat={seat} />
    case 'enter-code':
      return serving && <EnterCode key={serving.id} seat={seat} serving={serving} notices={notices} />
    case 'seal':
      return serving && <SealScreen key={serving.id} seat={seat} serving={serving} kept={foot} />
    case 'rate':
      return place && <RatingScreens seat={seat} place={place} keeping={keeping} state={state} kept={kept} />
    case 'queued':
      return kept && <QueuedScreen seat={seat} keeping={keeping} state={state} kept={kept} />
    case 'sent':
      return <SentScreen seat={seat} notices={notices} kept="sent" />
    case 'end-questions':
      return <EndQuestions seat={seat} notices={notices} kept={connection} />
    case 'report':
      return <OwnReport seat={seat} notices={notices} />
    case 'thanks':
    case 'closed':
    case 'left':
      return <Ended seat={seat} how={screen} notices={notices} kept="" />
    default:
      return <WaitingScreen seat={seat} notices={notices} kept="" />
  }
}
