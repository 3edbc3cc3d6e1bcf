import type { Router } from 'express'
import type { Deps } from '../deps.ts'
import type { Mount } from '../http/mount.ts'

/** A feature mounts its endpoints; streams of events and uploads need the router itself. */
export type Feature = (mount: Mount, router: Router, deps: Deps) => void

export const features: readonly Feature[] = []
