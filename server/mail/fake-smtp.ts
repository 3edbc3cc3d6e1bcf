import type { AddressInfo } from 'node:net'
import type { AddressObject } from 'mailparser'
import { SMTPServer } from 'smtp-server'
import type { Message } from './mailer.ts'

const text = (address: AddressObject | AddressObject[] | undefined): string =>
  [address ?? []]
    .flat()
    .map((one) => one.text)
    .join(', ')

/**
 * The demo's own mail server, on loopback and a free port: it delivers nothing and hands each message to `take`. Mail
 * passes through the same transport as in earnest.
 */
export async function startFakeSmtp(
  take: (message: Message) => Promise<void>,
): Promise<{ url: string; stop(): Promise<void> }> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    logger: false,
    onData: (stream, _session, done) => {
      // The parser is large, and most starts read no mail.
      import('mailparser')
        .then(({ simpleParser }) => simpleParser(stream))
        .then((mail) => take({ to: text(mail.to), subject: mail.subject ?? '', text: mail.text ?? '' }))
        .then(() => done(), done)
    },
  })
  server.on('error', () => undefined) // a client that hangs up is no fault of the demo's
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen(0, '127.0.0.1', resolve)
  })
  const { port } = server.server.address() as AddressInfo
  return {
    url: `smtp://127.0.0.1:${port}`,
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  }
}
