import type { Request, Response } from 'express'
import 'express-session'
import passport from 'passport'
import type { Actor, SessionHandle } from './context.ts'

declare module 'express-session' {
  interface SessionData {
    seats?: string[]
    duties?: string[]
    dutyVersions?: Record<string, number>
  }
}
/** What passport keeps of a signed-in user. */
export interface SignedIn {
  id: string
}

const most = 12
const added = (list: readonly string[] | undefined, id: string): string[] =>
  [id, ...(list ?? []).filter((one) => one !== id)].slice(0, most)

export const actorOf = (request: Request): Actor => ({
  userId: (request.user as SignedIn | undefined)?.id ?? null,
  seatIds: request.session?.seats ?? [],
  dutyIds: request.session?.duties ?? [],
  dutyVersions: request.session?.dutyVersions ?? {},
})

const settled = (work: (done: (error?: unknown) => void) => void): Promise<void> =>
  new Promise((resolve, reject) => work((error) => (error ? reject(error) : resolve())))

export function sessionHandle(request: Request, response: Response): SessionHandle {
  return {
    authenticate: () =>
      new Promise((resolve, reject) => {
        const verify = passport.authenticate('local', (error: unknown, user: SignedIn | false) =>
          error ? reject(error) : resolve(user ? user.id : null),
        )
        verify(request, response, reject)
      }),
    // Signing in makes a new session number; seats opened on this phone stay open.
    signIn: (userId) =>
      settled((done) =>
        request.login({ id: userId } satisfies SignedIn, { session: true, keepSessionInfo: true }, done),
      ),
    signOut: () => settled((done) => request.session.destroy(done)),
    id: () => request.sessionID,
    openSeat: (seatId) => {
      request.session.seats = added(request.session.seats, seatId)
    },
    forgetSeat: (seatId) => {
      request.session.seats = (request.session.seats ?? []).filter((one) => one !== seatId)
    },
    openDuty: (dutyId, linkVersion) => {
      request.session.dutyVersions = { ...request.session.dutyVersions, [dutyId]: linkVersion }
      request.session.duties = added(request.session.duties, dutyId)
    },
  }
}
