import { useQuery } from '@tanstack/react-query'
import { Link, Navigate, useParams } from 'react-router-dom'
import { roundEvents, type Progress, type Round } from '#shared/contracts/rounds.ts'
import { to } from '#src/app/paths.ts'
import { RoundSelvedge } from '#src/app/RoundSelvedge.tsx'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { keyOf } from '#src/lib/ask.ts'
import { addressOf } from '#src/lib/call.ts'
import { counted, sentenceCase } from '#src/lib/counts.ts'
import { useLive } from '#src/lib/use-live.ts'
import { getProgress, getRound } from '#shared/contracts/rounds.ts'
import { CancelRound } from '../components/CancelRound.tsx'
import { CloseRound } from '../components/CloseRound.tsx'
import { ProgressThread } from '../components/ProgressThread.tsx'
import { WaitingFor } from '../components/WaitingFor.tsx'
import { progressQuery, roundQuery, type At } from '../queries.ts'

const turnWords = ({ turn, turns }: Progress): string =>
  turn === 0
    ? 'The first turn has not begun.'
    : turn > turns
      ? 'All turns are over.'
      : `Turn ${turn} of ${turns}.`

function Verbs({ panel, round, progress }: { panel: string; round: Round; progress: Progress }) {
  const at = { panel, round: round.id }
  const sitting = round.sittingId ? { ...at, sitting: round.sittingId } : null
  return (
    <div className="actions mt-6">
      {round.can.steward && sitting && (
        <LinkButton
          kind={progress.servings.submitted < progress.servings.planned ? 'primary' : 'secondary'}
          to={to('table', sitting)}
        >
          Steward the table
        </LinkButton>
      )}
      {round.can.tag && sitting && <LinkButton to={to('tags', sitting)}>Tag the pouches</LinkButton>}
      {round.you.seatId && (
        <LinkButton to={to('seat', { seat: round.you.seatId })}>Go to your seat</LinkButton>
      )}
      {round.can.handOutLinks && <LinkButton to={to('links', at)}>Hand out links</LinkButton>}
      {round.can.close && <CloseRound panel={panel} round={round} progress={progress} />}
      {round.can.cancel && <CancelRound panel={panel} round={round} />}
    </div>
  )
}

function OpenProgress({ at, round }: { at: At; round: Round }) {
  const { connected, interval } = useLive(addressOf(roundEvents, { params: at }), [
    keyOf(getProgress, { params: at }),
    keyOf(getRound, { params: at }),
  ])
  const query = useQuery({ ...progressQuery(at), refetchInterval: interval })
  return (
    <Asked query={query} waiting="Counting the servings">
      {(progress) => {
        const { planned, submitted, out, void: voided } = progress.servings
        const words = `${submitted} of ${planned} servings are rated`
        return (
          <>
            <FolioSection
              label={<RoundSelvedge panel={at.panel} round={round} />}
              note={
                <>
                  <p>
                    Progress is counted in servings. Until the round closes nobody sees a rating but who gave
                    it.
                  </p>
                  <p>{connected ? 'Changes show at once.' : 'Asked again every five seconds.'}</p>
                </>
              }
            >
              <PageTitle title={`Progress of ${round.title}`}>{round.title}</PageTitle>
              <p className="lead mt-3" role="status">
                {words}. {turnWords(progress)}
              </p>
              <ProgressThread done={submitted} total={planned} words={words} />
              <p className="text-muted">
                {sentenceCase(counted(progress.joined, 'listener has', 'listeners have'))} opened their seat,
                of {progress.seats}
                {progress.left > 0 && `; ${counted(progress.left, 'has', 'have')} left`}
                {out > 0 && `; ${counted(out, 'serving is', 'servings are')} in listeners’ hands`}
                {voided > 0 && `; ${counted(voided, 'serving was', 'servings were')} void`}.
              </p>
              <Verbs panel={at.panel} round={round} progress={progress} />
            </FolioSection>
            <FolioSection label="Still out">
              <WaitingFor progress={progress} />
            </FolioSection>
          </>
        )
      }}
    </Asked>
  )
}

export default function ProgressPage() {
  const { panel = '', round: id = '' } = useParams()
  const at = { panel, round: id }
  const query = useQuery(roundQuery(at))
  return (
    <Asked query={query} waiting="Reading the round">
      {(round) => {
        if (round.status === 'draft' || round.status === 'cancelled')
          return <Navigate to={to('plan', at)} replace />
        return (
          <Folio>
            {round.status === 'open' ? (
              <OpenProgress at={at} round={round} />
            ) : (
              <FolioSection label={<RoundSelvedge panel={panel} round={round} shown="open" />}>
                <PageTitle title={`Progress of ${round.title}`}>{round.title}</PageTitle>
                <p className="lead mt-3">The round is closed and its key is open.</p>
                <p className="mt-4">
                  {round.can.seeAgreement && <Link to={to('agreement', at)}>See how far they agreed</Link>}
                </p>
              </FolioSection>
            )}
          </Folio>
        )
      }}
    </Asked>
  )
}
