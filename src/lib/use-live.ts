import { useQueryClient, type QueryKey } from '@tanstack/react-query'
import { useEffect, useState } from 'react'
import { follow } from './follow.ts'

/**
 * Keeps answers of the cache up to date: they are asked for again on every event, and every five seconds (`interval`,
 * for `refetchInterval`) while no events arrive. Pass a null address to follow nothing.
 *
 * @example
 * const { interval } = useLive(addressOf(roundEvents, { params }), [keyOf(getProgress, { params })])
 * const { data } = useQuery({ ...progressQuery(panel, round), refetchInterval: interval })
 */
export function useLive(
  address: string | null,
  keys: readonly QueryKey[],
): { connected: boolean; interval: number | false } {
  const client = useQueryClient()
  const [connected, setConnected] = useState(false)
  const names = JSON.stringify(keys)
  useEffect(() => {
    if (address === null) return
    return follow(address, {
      connected: setConnected,
      changed: () => {
        for (const queryKey of JSON.parse(names) as QueryKey[]) void client.invalidateQueries({ queryKey })
      },
    })
  }, [address, names, client])
  return { connected, interval: connected || address === null ? false : 5_000 }
}
