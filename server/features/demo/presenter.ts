import type { getMailbox } from '#shared/contracts/account.ts'
import type { ResponseOf } from '#shared/contracts/endpoint.ts'

type Mail = ResponseOf<typeof getMailbox>['messages'][number]

interface MessageRow {
  id: string
  recipient: string
  subject: string
  body: string
  receivedAt: Date
}

export const presentMail = (row: MessageRow): Mail => ({
  id: row.id,
  to: row.recipient,
  subject: row.subject,
  text: row.body,
  receivedAt: row.receivedAt.toISOString(),
})
