import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { roundEvents } from '#shared/contracts/rounds.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { addressOf } from '#src/lib/call.ts'
import { useLive } from '#src/lib/use-live.ts'
import { RunSheet } from '../components/RunSheet.tsx'
import { tableQuery } from '../queries.ts'
import '../table.css'

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
  return (
    <div className="folio">
      <Asked query={query} waiting="Reading the table">
        {(table) => <RunSheet at={at} table={table} connected={connected} />}
      </Asked>
    </div>
  )
}
