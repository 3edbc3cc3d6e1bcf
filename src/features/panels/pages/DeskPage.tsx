import { useQuery } from '@tanstack/react-query'
import { Link, useParams } from 'react-router-dom'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { RoundEntry } from '../components/RoundEntry.tsx'
import { panelQuery, roundsQuery } from '../queries.ts'
import { byUrgency, needsAHand } from '../what-is-next.ts'

export default function DeskPage() {
  const { panel: slug = '' } = useParams()
  const panel = useQuery(panelQuery(slug))
  const rounds = useQuery(roundsQuery(slug))
  return (
    <Asked query={panel} waiting="Reading the panel">
      {({ name, timeZone, can, you }) => (
        <Folio>
          <FolioSection
            label={
              <>
                <div>Desk</div>
                <div>you: {you.roles.join(', ')}</div>
                <div>
                  <Link to={to('settings', { panel: slug })}>Settings of the panel</Link>
                </div>
              </>
            }
            note={
              can.startRound && (
                <p>
                  An evening needs three to six earphones, two listeners or more, opaque pouches and a phone
                  each. Scrim plays no sound: the music comes from your own source.{' '}
                  <Link to={to('how')}>How a round works</Link>
                </p>
              )
            }
          >
            <PageTitle>{name}</PageTitle>
            {can.startRound && (
              <div className="actions mt-6">
                <LinkButton kind="primary" to={to('newRound', { panel: slug })}>
                  Start an evening
                </LinkButton>
                <LinkButton to={to('importRound', { panel: slug })}>Bring ratings you have</LinkButton>
              </div>
            )}
          </FolioSection>
          <FolioSection label="What is next" name="What is next in each round">
            <Asked query={rounds} waiting="Reading the rounds">
              {({ rounds: list }) => {
                const waiting = byUrgency(list.filter(needsAHand))
                if (list.length === 0)
                  return (
                    <Empty
                      what="A round is one blind comparison."
                      sentence="Units go round under three-digit codes; when it closes, Scrim says how far the listeners agreed and what they heard."
                    />
                  )
                if (waiting.length === 0)
                  return (
                    <p>
                      Nothing waits for you. <Link to={to('rounds', { panel: slug })}>All rounds</Link>
                    </p>
                  )
                return (
                  <ul className="rows -mt-4">
                    {waiting.map((round) => (
                      <RoundEntry key={round.id} panel={slug} round={round} zone={timeZone} />
                    ))}
                  </ul>
                )
              }}
            </Asked>
          </FolioSection>
          {rounds.data?.rounds.some((round) => !needsAHand(round)) && (
            <FolioSection label="Before" name="Finished rounds">
              <ul className="rows -mt-4">
                {byUrgency(rounds.data.rounds)
                  .filter((round) => !needsAHand(round))
                  .slice(0, 3)
                  .map((round) => (
                    <RoundEntry key={round.id} panel={slug} round={round} zone={timeZone} />
                  ))}
              </ul>
              <p className="mt-2">
                <Link to={to('rounds', { panel: slug })}>All rounds</Link>
              </p>
            </FolioSection>
          )}
        </Folio>
      )}
    </Asked>
  )
}
