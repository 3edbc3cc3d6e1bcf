import type { Deps } from '#server/deps.ts'
import type { Message } from '#server/mail/mailer.ts'

export const sendMail = (message: Message, deps: Deps): Promise<void> => deps.mail.send(message)
