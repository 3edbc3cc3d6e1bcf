import { Link, useLocation } from 'react-router-dom'
import type { Round } from '#shared/contracts/rounds.ts'
import { RoundThread, type RoundStop } from '#src/components/layout/RoundThread.tsx'
import { day } from '#src/lib/dates.ts'
import { to } from './paths.ts'

interface RoundSelvedgeProps {
  panel: string
  round: Round
  /** Which stop this page belongs to, when that is not where the round is. */
  shown?: RoundStop['word']
}

type Place = [address: string, word: string, shown: boolean]

function stopsOf(round: Round, at: { panel: string; round: string }): RoundStop[] {
  const open = round.openedAt !== null
  const draft: RoundStop = { word: 'draft', to: to('plan', at) }
  const opened: RoundStop = { word: 'open', ...(open && { to: to('progress', at) }) }
  if (round.status === 'cancelled')
    return [draft, ...(open ? [opened] : []), { word: 'cancelled', to: to('plan', at) }]
  const closed: RoundStop = { word: 'closed', ...(round.can.seeAgreement && { to: to('agreement', at) }) }
  const published: RoundStop = { word: 'published', ...(round.can.publish && { to: to('publish', at) }) }
  return round.origin === 'imported' ? [closed, published] : [draft, opened, closed, published]
}

function placesOf(round: Round, panel: string): Place[] {
  const at = { panel, round: round.id }
  const sitting = { ...at, sitting: round.sittingId ?? '' }
  const running = round.status === 'open'
  return [
    [to('plan', at), 'Plan', round.origin === 'live'],
    [to('links', at), 'Links and QR codes', round.can.handOutLinks && running],
    [to('tags', sitting), 'Tag the pouches', round.can.tag && running && round.sittingId !== null],
    [to('table', sitting), 'Steward the table', round.can.steward && running && round.sittingId !== null],
    [to('progress', at), 'Progress', running],
    [to('seat', { seat: round.you.seatId ?? '' }), 'Your seat', running && round.you.seatId !== null],
    [to('agreement', at), 'Agreement', round.can.seeAgreement],
    [to('reveal', at), 'Reveal', round.can.seeAgreement && round.origin === 'live'],
    [
      to('publish', at),
      round.status === 'published' ? 'Correct the verdict' : 'Write the verdict',
      round.can.publish,
    ],
    [
      to('publicRound', { round: round.id }),
      'Public page',
      round.origin === 'live' && round.openedAt !== null,
    ],
    [to('verdict', { slug: round.verdictSlug ?? '' }), 'Verdict', round.verdictSlug !== null],
  ]
}

/** The selvedge of every page of a round: its number, its thread, its pages. */
export function RoundSelvedge({ panel, round, shown }: RoundSelvedgeProps) {
  const { pathname } = useLocation()
  const at = { panel, round: round.id }
  const since = round.closedAt ?? round.openedAt
  return (
    <>
      <div>
        Round {round.number} · {round.origin === 'imported' ? 'imported' : round.status}
      </div>
      {since && <div>{day(since)}</div>}
      <div className="mt-3 w-full">
        <RoundThread stops={stopsOf(round, at)} status={round.status} shown={shown} />
      </div>
      <nav aria-label="Pages of this round" className="no-print mt-3 w-full">
        <ul className="flex flex-wrap gap-x-4 page:block">
          {placesOf(round, panel)
            .filter(([, , visible]) => visible)
            .map(([address, word]) => (
              <li key={word}>
                <Link
                  to={address}
                  aria-current={address === pathname ? 'page' : undefined}
                  className="inline-flex min-h-[2rem] items-center aria-[current]:font-semibold aria-[current]:text-ink aria-[current]:no-underline"
                >
                  {word}
                </Link>
              </li>
            ))}
        </ul>
      </nav>
    </>
  )
}
