import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { to } from '#src/app/paths.ts'
import type { StewardTable } from '#shared/contracts/table.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { useServerClock } from '#src/hooks/useServerClock.ts'
import { roundQuery, type AtTable } from '../queries.ts'
import { IncidentDialog } from './IncidentDialog.tsx'
import { LateDialog } from './LateDialog.tsx'
import { NextTurn } from './NextTurn.tsx'
import { SeatDialog } from './SeatDialog.tsx'
import { SeatLine } from './SeatLine.tsx'

type Asked = { what: 'seat' | 'incident' | 'late'; seat: string | null } | null

interface RunSheetProps {
  at: AtTable
  table: StewardTable
  /** Whether events arrive; otherwise the sheet asks every five seconds. */
  connected: boolean
}

/** The steward's sheet: one line a seat, one verb under the thumb. Codes only, never a rating. */
export function RunSheet({ at, table, connected }: RunSheetProps) {
  const { sitting, seats } = table
  const [asked, setAsked] = useState<Asked>(null)
  const [said, setSaid] = useState('')
  const resting = seats.some(({ serving }) => typeof serving?.restUntil === 'string')
  const now = useServerClock(table.serverTime, resting)
  const own = useQuery({ ...roundQuery(at), staleTime: 60_000 })
  const seatId = table.youListen ? own.data?.you.seatId : null
  const close = () => setAsked(null)
  const seat = seats.find(({ id }) => id === asked?.seat)
  const where = sitting.ended
    ? 'listening is over'
    : sitting.turn === 0
      ? `${sitting.turns} turns, not started`
      : `turn ${sitting.turn} of ${sitting.turns}`
  return (
    <>
      <div className="run-head">
        <PageTitle size="plain" title={`Run sheet, ${table.round.title}`}>
          Run sheet
        </PageTitle>
        <p>
          {sitting.name} · <span role="status">{where}</span>
        </p>
        <p className="note page:ml-auto">{connected ? 'follows live' : 'asks every five seconds'}</p>
      </div>
      {table.round.status !== 'open' && (
        <div className="mb-4">
          <Notice title="This round is not open">Nothing can be handed over or rated in it now.</Notice>
        </div>
      )}
      <ol aria-label="Seats">
        {seats.map((one) => (
          <SeatLine
            key={one.id}
            seat={one}
            sitting={sitting}
            now={now}
            onMore={() => setAsked({ what: 'seat', seat: one.id })}
          />
        ))}
      </ol>
      <div className="actions py-4">
        {table.can.addListener && (
          <Button kind="secondary" onClick={() => setAsked({ what: 'late', seat: null })}>
            Someone came late
          </Button>
        )}
        <Button kind="secondary" onClick={() => setAsked({ what: 'incident', seat: null })}>
          Something went wrong
        </Button>
        {own.data?.can.handOutLinks && (
          <LinkButton to={to('links', { panel: at.panel, round: at.round })}>Seats’ links</LinkButton>
        )}
        {seatId && <LinkButton to={to('seat', { seat: seatId })}>Your own seat</LinkButton>}
      </div>
      <p className="note pb-2" role="status">
        {said}
      </p>
      <p className="note measure pb-8">
        Stop anyone who feels pain, ringing, dizziness or fullness. New tips for each listener, nozzles wiped
        between, hands washed; nobody with an ear infection or recent ear surgery. You see codes only: if you
        learn which unit is which, write it down and hand the table over.
      </p>
      <div className="run-foot no-print">
        <NextTurn at={at} table={table} />
        {sitting.ended && <p className="note">The listening is over. The organiser closes the round.</p>}
      </div>
      {asked?.what === 'seat' && seat && (
        <SeatDialog
          at={at}
          seat={seat}
          onClose={close}
          onIncident={() => setAsked({ what: 'incident', seat: seat.id })}
        />
      )}
      {asked?.what === 'incident' && (
        <IncidentDialog
          at={at}
          seats={seats}
          seat={asked.seat}
          onClose={close}
          onDone={() => {
            close()
            setSaid('The incident is on record.')
          }}
        />
      )}
      {asked?.what === 'late' && (
        <LateDialog
          at={at}
          table={table}
          onClose={close}
          onDone={(name) => {
            close()
            setSaid(`${name} has a seat. Its link stands on the organiser’s page of links.`)
          }}
        />
      )}
    </>
  )
}
