import { getMe } from '#shared/contracts/account.ts'
import { ask } from './ask.ts'

/** Who is looking, and how this Scrim runs. */
export const meQuery = { ...ask(getMe), staleTime: 60_000 }
