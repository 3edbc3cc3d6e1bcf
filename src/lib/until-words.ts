/** Minutes and seconds until an instant, "1:20"; null once it has passed. Both in milliseconds. */
export function untilWords(until: number, now: number): string | null {
  const seconds = Math.ceil((until - now) / 1000)
  if (seconds <= 0) return null
  return `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`
}
