import type { Router } from 'express'
import type { Deps } from '../deps.ts'
import type { Mount } from './mount.ts'

/** A feature mounts its endpoints; streams of events and uploads need the router itself. */
export type Feature = (mount: Mount, router: Router, deps: Deps) => void
