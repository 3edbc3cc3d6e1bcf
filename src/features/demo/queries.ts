import { getMailbox } from '#shared/contracts/account.ts'
import { ask } from '#src/lib/ask.ts'

export const mailboxQuery = ask(getMailbox)
