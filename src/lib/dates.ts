const zoneOf = (zone: string | undefined): string | undefined => {
  if (zone === undefined) return undefined
  try {
    return new Intl.DateTimeFormat('en', { timeZone: zone }).resolvedOptions().timeZone
  } catch {
    return undefined
  }
}

/** A day, "12 November 2026"; `zone` is an IANA name, the reader's own zone without one. */
export const day = (instant: string | Date, zone?: string): string =>
  new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: zoneOf(zone) }).format(new Date(instant))

/** A day and a time with its zone, "12 November 2026, 21:40 UTC". */
export function moment(instant: string | Date, zone?: string): string {
  const at = new Date(instant)
  const timeZone = zoneOf(zone)
  const time = new Intl.DateTimeFormat('en-GB', {
    hour: '2-digit',
    minute: '2-digit',
    timeZoneName: 'short',
    timeZone,
  }).format(at)
  return `${day(at, zone)}, ${time}`
}

/** The reader's own time zone as an IANA name. */
export const ownZone = (): string => Intl.DateTimeFormat().resolvedOptions().timeZone || 'UTC'

/** Every time zone the browser knows, the given ones first, each once. */
export function zones(first: readonly string[]): string[] {
  const known = typeof Intl.supportedValuesOf === 'function' ? Intl.supportedValuesOf('timeZone') : []
  return [...new Set([...first, 'UTC', ...known])]
}
