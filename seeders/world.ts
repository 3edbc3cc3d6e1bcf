import type { Deps } from '#server/deps.ts'

/** Where and when the demo plays: the panel, who organises, and the day on which it is seeded. */
export interface World {
  deps: Deps
  slug: string
  organiser: { userId: string }
  now: Date
}

const minute = 60_000

/** So many minutes before (below 0) or after the moment of seeding. */
export const fromNow = (world: World, minutes: number): Date =>
  new Date(world.now.getTime() + minutes * minute)

/** Half past seven in the evening, so many days before the day of seeding. */
export function eveningBefore(world: World, days: number): Date {
  const { now } = world
  return new Date(Date.UTC(now.getUTCFullYear(), now.getUTCMonth(), now.getUTCDate() - days, 19, 30))
}

export const later = (time: Date, minutes: number): Date => new Date(time.getTime() + minutes * minute)

/** A calendar date, so many days after (below 0: before) the day of seeding. */
export function dateFrom(world: World, days: number): string {
  const { now } = world
  return new Date(Date.UTC(now.getUTCFullYear(), now.getUTCMonth(), now.getUTCDate() + days))
    .toISOString()
    .slice(0, 10)
}
