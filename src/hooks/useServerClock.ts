import { useEffect, useMemo, useState } from 'react'

/**
 * The server's time in milliseconds. Ticks once a second while `running`; the difference to this device's clock is
 * taken anew with each answer's `serverTime`, so a phone whose clock is wrong counts down rightly.
 */
export function useServerClock(serverTime: string, running: boolean): number {
  const [now, setNow] = useState(() => Date.now())
  const ahead = useMemo(() => Date.parse(serverTime) - Date.now(), [serverTime])
  useEffect(() => {
    if (!running) return
    setNow(Date.now())
    const timer = setInterval(() => setNow(Date.now()), 1000)
    return () => clearInterval(timer)
  }, [running, serverTime])
  return now + ahead
}
