import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import type { Handover } from '#shared/contracts/rounds.ts'
import { to } from '#src/app/paths.ts'
import { RoundSelvedge } from '#src/app/RoundSelvedge.tsx'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { HandoverCard } from '../components/HandoverCard.tsx'
import { handoversQuery, roundQuery, type At } from '../queries.ts'

function Cards({ at, list, what }: { at: At; list: Handover[]; what: Handover['what'] }) {
  const own = list.filter((handover) => handover.what === what)
  if (own.length === 0) return null
  return (
    <FolioSection label={what === 'seat' ? 'Seats' : 'Duties'} name={what === 'seat' ? 'Seats' : 'Duties'}>
      <ul className="rows -mt-6">
        {own.map((handover) => (
          <HandoverCard key={handover.id} at={at} handover={handover} />
        ))}
      </ul>
    </FolioSection>
  )
}

export default function LinksPage() {
  const { panel = '', round: id = '' } = useParams()
  const at = { panel, round: id }
  const round = useQuery(roundQuery(at))
  const links = useQuery({ ...handoversQuery(at), refetchInterval: 10_000 })
  return (
    <Folio>
      <Asked query={round} waiting="Reading the round">
        {(known) => (
          <FolioSection
            label={<RoundSelvedge panel={panel} round={known} />}
            note={
              <>
                <p>A link is a key to one seat. Give it to one person; a new link ends the old one.</p>
                <p>
                  New tips for each listener, nozzles wiped between. Stop on pain, ringing, dizziness or
                  fullness.
                </p>
              </>
            }
          >
            <PageTitle title={`Links of ${known.title}`}>Hand out the links</PageTitle>
            <p className="lead mt-3">
              Each listener opens their seat by QR code or link, on any phone and without an account. Two
              people may share one phone, in turn.
            </p>
            <div className="actions no-print mt-6">
              <LinkButton kind="primary" to={to('progress', at)}>
                Go to the evening
              </LinkButton>
              <Button kind="secondary" icon="print" onClick={() => window.print()}>
                Print them
              </Button>
              {known.can.tag && known.sittingId && (
                <LinkButton to={to('tags', { ...at, sitting: known.sittingId })}>Tag the pouches</LinkButton>
              )}
            </div>
          </FolioSection>
        )}
      </Asked>
      <Asked query={links} waiting="Making the links">
        {({ handovers }) =>
          handovers.length === 0 ? (
            <FolioSection label="Links">
              <Empty
                what="Links appear when the round opens."
                sentence="Each seat and each duty gets its own."
              />
            </FolioSection>
          ) : (
            <>
              <Cards at={at} list={handovers} what="duty" />
              <Cards at={at} list={handovers} what="seat" />
            </>
          )
        }
      </Asked>
    </Folio>
  )
}
