import { foundation } from './0001-foundation.ts'

/** In the order in which they run. A published migration is never edited: add another. */
export const migrations = [foundation] as const
