const day = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
})

/** A calendar date (`2026-11-30`) in words: "30 November 2026". */
export const asDay = (date: string): string => day.format(new Date(`${date.slice(0, 10)}T00:00:00Z`))

/** The day of an instant in the reader's own zone: "12 November 2026". */
export const asInstantDay = (instant: string, zone?: string): string =>
  new Intl.DateTimeFormat('en-GB', {
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    ...(zone === undefined ? {} : { timeZone: zone }),
  }).format(new Date(instant))

/** An instant with its zone: "7 November 2026 at 21:40 UTC". */
export const asInstant = (instant: string, zone?: string): string =>
  new Intl.DateTimeFormat('en-GB', {
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    timeZoneName: 'short',
    ...(zone === undefined ? {} : { timeZone: zone }),
  }).format(new Date(instant))
