import { useQuery } from '@tanstack/react-query'
import { useEffect } from 'react'
import { useLocation, useNavigate, useParams } from 'react-router-dom'
import { seatEvents } from '#shared/contracts/seats.ts'
import { SeatLayout } from '#src/components/layout/SeatLayout.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { Waiting } from '#src/components/ui/Waiting.tsx'
import { addressOf, CallError } from '#src/lib/call.ts'
import { useLive } from '#src/lib/use-live.ts'
import { HandOverScreen } from '../components/HandOver.tsx'
import { placeOf, SeatScreens } from '../components/SeatScreens.tsx'
import { SeatAway } from '../components/SeatAway.tsx'
import { keptId } from '../keeping/kept-serving.ts'
import { useKeeping } from '../keeping/use-keeping.ts'
import { seatQuery } from '../queries.ts'

/** Even a stream of events that seems open is checked now and then: phones lose connections without a word. */
const checkAfter = 30_000

/** A listener's seat: one screen at a time, led by the server, kept on this phone. */
export default function SeatPage() {
  const { seat: id = '' } = useParams()
  const location = useLocation()
  const navigate = useNavigate()
  const [keeping, state] = useKeeping()
  const { interval } = useLive(addressOf(seatEvents, { params: { seat: id } }), [seatQuery(id).queryKey])
  const query = useQuery({
    ...seatQuery(id),
    refetchInterval: interval || checkAfter,
    refetchOnWindowFocus: 'always',
    networkMode: 'always',
  })
  const seat = query.data

  const place = seat ? placeOf(seat) : null
  const leftOver =
    seat?.serving?.state === 'submitted' && place && state.records.get(keptId(place))?.outbox === null
      ? keptId(place)
      : null
  useEffect(() => {
    // Sent from another phone or tab: a draft of what the server already has is of no use.
    if (leftOver) void keeping.discard(leftOver)
  }, [leftOver, keeping])

  if (!seat || !state.ready) {
    if (query.error && !seat)
      return (
        <SeatAway
          error={query.error}
          keeps={[...state.records.values()].some((kept) => kept.seat === id)}
          onRetry={() => void query.refetch()}
          retrying={query.isFetching}
        />
      )
    return (
      <SeatLayout>
        <Waiting label="Opening your seat" />
      </SeatLayout>
    )
  }
  const handed = (location.state as { handed?: boolean } | null)?.handed === true
  if (handed)
    return (
      <HandOverScreen
        key={id}
        label={seat.label}
        // Forgotten once taken, so that a reload does not ask again.
        onTaken={() => void navigate(location.pathname, { replace: true, state: null })}
      />
    )
  const refused = query.error instanceof CallError && query.error.problem.status < 500
  if (refused)
    return (
      <SeatAway
        error={query.error}
        keeps={state.records.size > 0}
        onRetry={() => void query.refetch()}
        retrying={query.isFetching}
      />
    )
  const connection = query.error ? (
    <Notice title="No connection just now" live>
      You can go on; what you rate is kept on this phone and sent when the network is back.
    </Notice>
  ) : null
  return <SeatScreens key={id} seat={seat} keeping={keeping} state={state} connection={connection} />
}
