import { foundation } from './0001-foundation.ts'
import { jobs } from './0002-jobs.ts'

/** In the order in which they run. A published migration is never edited: add another. */
export const migrations = [foundation, jobs] as const
