import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { roundEvents } from '#shared/contracts/rounds.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { addressOf, CallError } from '#src/lib/call.ts'
import { useLive } from '#src/lib/use-live.ts'
import { RunSheet } from '../components/RunSheet.tsx'
import { tableQuery } from '../queries.ts'
import '../table.css'

/** The round has closed, or the duty has passed to somebody else: what is on the screen is over. */
const isRefusal = (error: unknown): error is CallError =>
  error instanceof CallError && error.problem.status < 500

/** Even a stream of events that seems open is checked now and then. */
const checkAfter = 30_000

/** The steward's table, live. */
export default function TablePage() {
  const { panel = '', round = '', sitting = '' } = useParams()
  const at = { panel, round, sitting }
  const { connected, interval } = useLive(addressOf(roundEvents, { params: { panel, round } }), [
    tableQuery(at).queryKey,
  ])
  const query = useQuery({
    ...tableQuery(at),
    refetchInterval: interval || checkAfter,
    refetchOnWindowFocus: 'always',
    networkMode: 'always',
  })
  if (query.data && isRefusal(query.error))
    return (
      <div className="folio">
        <PageTitle size="plain">Run sheet</PageTitle>
        <div className="mt-4">
          <Notice title={query.error.problem.title} live>
            {query.error.problem.detail}
          </Notice>
        </div>
      </div>
    )
  return (
    <div className="folio">
      <Asked query={query} waiting="Reading the table">
        {(table) => <RunSheet at={at} table={table} connected={connected} />}
      </Asked>
    </div>
  )
}
