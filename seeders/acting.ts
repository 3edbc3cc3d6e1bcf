import type { Deps } from '#server/deps.ts'
import type { ApiError } from '#server/http/api-error.ts'
import type { Actor, Context } from '#server/http/context.ts'

/** Thrown where a service refuses and yet keeps what it wrote. */
export class Refused extends Error {
  readonly error: ApiError
  constructor(error: ApiError) {
    super(error.message)
    this.error = error
  }
}

const nobody: Actor = { userId: null, seatIds: [], dutyIds: [] }

/** What a service gets when an invented person does something at an invented time; there is no request behind it. */
export function acting(
  deps: Deps,
  who: Partial<Actor>,
  now: Date,
  more: { version?: number; key?: string; file?: Buffer } = {},
): Context {
  const unused = (): never => {
    throw new Error('Nobody signs in or out while the demo is seeded.')
  }
  return {
    deps,
    now,
    actor: { ...nobody, ...who },
    session: {
      authenticate: unused,
      signIn: unused,
      signOut: unused,
      id: () => 'seeding',
      openSeat: () => undefined,
      forgetSeat: () => undefined,
      openDuty: () => undefined,
    },
    requestId: 'seeding',
    idempotencyKey: more.key,
    version: more.version,
    panelId: undefined,
    afterCommit: () => undefined,
    refuse: (error) => {
      throw new Refused(error)
    },
    request: { file: more.file ? { buffer: more.file } : undefined } as unknown as Context['request'],
  }
}
