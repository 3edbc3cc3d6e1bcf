import type { Sequelize } from 'sequelize'
import { inTransaction } from '../db/transaction.ts'
import type { Deps } from '../deps.ts'
import type { Env } from '../env.ts'
import { DemoMessage } from '../models/demo-message.ts'
import { startFakeSmtp } from './fake-smtp.ts'
import type { Mailer } from './mailer.ts'
import { handedOverMailer, smtpMailer } from './transport.ts'

type World = Pick<Deps, 'clock' | 'random'> & { sequelize: Sequelize; print: (text: string) => void }

/** The demo keeps its mail to itself; in earnest it goes where SMTP_URL says, or nowhere. */
export async function mailerFor(env: Env, world: World): Promise<Mailer & { stop(): Promise<void> }> {
  if (env.mode === 'demo') {
    const server = await startFakeSmtp(async (message) => {
      await inTransaction(world.sequelize, {}, () =>
        DemoMessage.create({
          id: world.random.id(),
          recipient: message.to,
          subject: message.subject,
          body: message.text,
          receivedAt: world.clock.now(),
        }),
      )
    })
    const mailer = smtpMailer({ url: server.url, from: 'Scrim <scrim@example.org>' })
    return {
      ...mailer,
      stop: async () => {
        mailer.stop()
        await server.stop()
      },
    }
  }
  const mailer = env.smtp ? smtpMailer(env.smtp) : handedOverMailer(world.print)
  return { ...mailer, stop: async () => mailer.stop() }
}
