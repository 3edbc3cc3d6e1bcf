/** One message; text first, HTML beside it where there is any. */
export interface Message {
  to: string
  subject: string
  text: string
  html?: string
}

/** Sends mail, or says that nothing can be sent. */
export interface Mailer {
  /** False where no mail server is set up: screens then show links to hand over. */
  sends: boolean
  send(message: Message): Promise<void>
}
