import { randomBytes, randomUUID } from 'node:crypto'
import type { Deps } from './deps.ts'

export const systemClock: Deps['clock'] = { now: () => new Date() }

/** The system's cryptographic source. */
export const systemRandom: Deps['random'] = { bytes: (count) => randomBytes(count), id: () => randomUUID() }
