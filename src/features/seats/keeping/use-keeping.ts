import { useQueryClient } from '@tanstack/react-query'
import { useEffect, useMemo, useRef, useSyncExternalStore } from 'react'
import { getSeat, submitRatings } from '#shared/contracts/seats.ts'
import { call } from '#src/lib/call.ts'
import { seatQuery } from '../queries.ts'
import { createKeeping, type Keeping, type KeepingState } from './keeping.ts'
import { submissionOf, type KeptServing } from './kept-serving.ts'
import { openShelf } from './shelf.ts'

const channelName = 'scrim-seat'
const askAgainAfter = 5_000
const sendingTakesAtMost = 20_000

const openChannel = () => (typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(channelName))

const inTime = () =>
  typeof AbortSignal.timeout === 'function' ? { signal: AbortSignal.timeout(sendingTakesAtMost) } : {}

/**
 * What this browser keeps of every seat opened in it, and its outbox. Sends when a serving is submitted, when the
 * network or the page comes back, and every five seconds while something waits.
 */
export function useKeeping(): [Keeping, KeepingState] {
  const client = useQueryClient()
  const tabs = useRef<BroadcastChannel | null>(null)
  const keeping = useMemo(() => {
    const send = async (kept: KeptServing) => {
      const { seat, serving } = kept
      const { outcome, seat: now } = await call(submitRatings, {
        params: { seat, serving },
        body: submissionOf(kept),
        idempotencyKey: kept.outbox?.key ?? '',
        ...inTime(),
      })
      await client.cancelQueries({ queryKey: seatQuery(seat).queryKey })
      client.setQueryData(seatQuery(seat).queryKey, now)
      // A repeated key gets the first answer again, which may be old by now.
      void client.invalidateQueries({ queryKey: seatQuery(seat).queryKey })
      return outcome
    }
    return createKeeping({ open: openShelf, send, tell: () => tabs.current?.postMessage('changed') })
  }, [client])

  useEffect(() => {
    const send = () => {
      if ([...keeping.state().records.values()].some((kept) => kept.outbox?.state === 'queued'))
        void keeping.flush()
    }
    const back = () => {
      if (document.visibilityState === 'visible') void keeping.reread().then(send)
    }
    const other = async () => {
      const before = [...keeping.state().records.keys()]
      await keeping.reread()
      // Another tab has sent or put away what this one still shows: the seat has moved on.
      if (before.some((id) => !keeping.state().records.has(id)))
        await client.invalidateQueries({ queryKey: [getSeat.id] })
    }
    const told = () => void other()
    const channel = openChannel()
    tabs.current = channel
    back()
    window.addEventListener('online', send)
    document.addEventListener('visibilitychange', back)
    channel?.addEventListener('message', told)
    const timer = setInterval(send, askAgainAfter)
    return () => {
      window.removeEventListener('online', send)
      document.removeEventListener('visibilitychange', back)
      clearInterval(timer)
      tabs.current = null
      channel?.close()
    }
  }, [keeping, client])

  return [keeping, useSyncExternalStore(keeping.subscribe, keeping.state)]
}
