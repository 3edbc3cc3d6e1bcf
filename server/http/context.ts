import type { Request } from 'express'
import type { Deps } from '../deps.ts'
import type { ApiError } from './api-error.ts'

/** Who asks: a signed-in user, and the seats and duties (round roles) that links opened in this browser. */
export interface Actor {
  userId: string | null
  seatIds: readonly string[]
  dutyIds: readonly string[]
  /** Which version of its link opened each duty: a renewed link ends what the old one opened. Absent: not by a link. */
  dutyVersions?: Readonly<Record<string, number>>
}

/** What a service gets beside its input. Every query inside takes part in the request's transaction. */
export interface Context {
  deps: Deps
  now: Date
  actor: Actor
  session: SessionHandle
  requestId: string
  idempotencyKey: string | undefined
  /** The version in `If-Match`; undefined where none was sent. */
  version: number | undefined
  /** Set by the first service that knows it: row-level security and stored answers need it. */
  panelId: string | undefined
  /** Runs once the transaction has committed. */
  afterCommit(work: () => void): void
  /** Answers with this error, yet keeps what was written: a wrong code changes nothing, but is counted. */
  refuse(error: ApiError): never
  /** The raw request, for uploads and streams only. */
  request: Request
}

export interface SessionHandle {
  /** Checks address and password by passport-local; null where they do not match. */
  authenticate(): Promise<string | null>
  signIn(userId: string): Promise<void>
  signOut(): Promise<void>
  id(): string
  openSeat(seatId: string): void
  forgetSeat(seatId: string): void
  openDuty(dutyId: string, linkVersion: number): void
}
