import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { askReset, createAccount, getMailbox } from '#shared/contracts/account.ts'
import { inTransaction } from '#server/db/transaction.ts'
import { enqueue, enqueueMail } from '#server/jobs/queue.ts'
import { runNextJob } from '#server/jobs/worker.ts'
import { mailerFor } from '#server/mail/mailer-for.ts'
import type { Mailer, Message } from '#server/mail/mailer.ts'
import { roundOpened } from '#server/mail/templates/round-opened.ts'
import { handedOverMailer } from '#server/mail/transport.ts'
import { Job } from '#server/models/job.ts'
import { startApp, type TestApp } from '#tests/support/app.ts'
import { standingClock } from '#tests/support/clock.ts'
import { visit } from '#tests/support/visitor.ts'

const clock = standingClock()
const mail: Mailer & { now: Mailer['send'] } = {
  sends: true,
  now: async () => undefined,
  send: (message) => mail.now(message),
}
let app: TestApp
let demo: Mailer & { stop(): Promise<void> }

beforeAll(async () => {
  app = await startApp({ clock, mail })
  const { sequelize, random } = app.deps
  demo = await mailerFor(app.deps.env, { sequelize, random, clock, print: () => undefined })
})
afterAll(async () => {
  await demo.stop()
  await app.close()
})

const note: Message = { to: 'ines@example.org', subject: 'A note', text: 'One line.\n' }
const context = () => ({ deps: app.deps, now: clock.now(), panelId: undefined })
const inOne = <T>(work: () => Promise<T>) => inTransaction(app.deps.sequelize, {}, work)

describe('mail in the demo', () => {
  it('goes through a mail server of its own into the mailbox page', async () => {
    mail.now = demo.send
    const visitor = visit(app.url)
    const email = 'birgit@example.org'
    const body = { name: 'Birgit Ö. 🎧', email, password: 'three quiet herons', panelName: 'Bench' }
    await visitor.call(createAccount, { body })
    await visitor.call(askReset, { body: { email } })
    expect((await visitor.call(getMailbox)).messages).toEqual([])
    await app.runJobs()
    const { messages } = await visitor.call(getMailbox)
    expect(messages).toMatchObject([{ to: email, subject: 'Choose a new password for Scrim' }])
    expect(messages[0]?.text).toContain('Hello Birgit Ö. 🎧,')
    expect(messages[0]?.text).toMatch(new RegExp(`^${app.url}/reset/[\\w-]{43}$`, 'm'))
  })

  it('carries both fingerprints of an opened round whole', async () => {
    mail.now = demo.send
    const [planFingerprint, keyFingerprint] = ['a1'.repeat(32), 'b2'.repeat(32)] as const
    const opened = roundOpened({
      to: 'wanda@example.org',
      name: 'Wanda Osei',
      panelName: 'The Quayside Bench',
      roundTitle: 'Four at dusk',
      url: `${app.url}/rounds/7`,
      planFingerprint,
      keyFingerprint,
    })
    await inOne(() => enqueueMail(context(), opened))
    await app.runJobs()
    const { messages } = await visit(app.url).call(getMailbox)
    const text = messages.find(({ to }) => to === 'wanda@example.org')?.text
    expect(text).toMatch(new RegExp(`^${planFingerprint}$`, 'm'))
    expect(text).toMatch(new RegExp(`^${keyFingerprint}$`, 'm'))
  })
})

describe('a mail job', () => {
  it('is there only when the request was kept', async () => {
    const fails = inOne(async () => {
      await enqueue(context(), 'send-mail', note)
      throw new Error('the request failed')
    })
    await expect(fails).rejects.toThrow('the request failed')
    expect(await runNextJob(app.deps)).toBe(false)
  })

  it('is done once, however many workers look', async () => {
    const sent: Message[] = []
    mail.now = async (message) => void sent.push(message)
    await inOne(async () => {
      for (let number = 1; number <= 5; number += 1)
        await enqueue(context(), 'send-mail', { ...note, subject: `Note ${number}` })
    })
    const worker = async () => {
      while (await runNextJob(app.deps));
    }
    await Promise.all([worker(), worker(), worker()])
    expect(sent.map(({ subject }) => subject).sort()).toEqual(
      [1, 2, 3, 4, 5].map((number) => `Note ${number}`),
    )
    expect(await inOne(() => Job.count())).toBe(0)
  })

  it('is tried again later and later while the mail server is away, and then kept as failed', async () => {
    let tries = 0
    mail.now = async () => {
      tries += 1
      throw new Error('connection refused')
    }
    await inOne(() => enqueue(context(), 'send-mail', note))
    await app.runJobs()
    expect(tries).toBe(1)
    clock.advance(9)
    await app.runJobs()
    expect(tries).toBe(1)
    for (const seconds of [1, 40, 160, 640, 2560]) {
      clock.advance(seconds)
      await app.runJobs()
    }
    expect(tries).toBe(6)
    clock.advance(7 * 24 * 3600)
    await app.runJobs()
    expect(tries).toBe(6)
    const [kept] = await inOne(() => Job.findAll())
    expect(kept).toMatchObject({ task: 'send-mail', attempts: 6, lastError: 'connection refused' })
    expect(kept?.failedAt).toBeInstanceOf(Date)
    await inOne(() => Job.destroy({ where: {} }))
  })

  it('runs at its time and not before', async () => {
    const sent: Message[] = []
    mail.now = async (message) => void sent.push(message)
    const runAt = new Date(clock.now().getTime() + 60_000)
    await inOne(() => enqueue(context(), 'send-mail', note, { runAt }))
    await app.runJobs()
    expect(sent).toEqual([])
    clock.advance(60)
    await app.runJobs()
    expect(sent).toEqual([note])
  })
})

describe('an installation without a mail server', () => {
  it('pretends to send nothing, and prints a reset link for whoever runs it to hand over', async () => {
    const printed: string[] = []
    const silent = await startApp({ mode: 'live', mail: handedOverMailer((text) => printed.push(text)) })
    try {
      const visitor = visit(silent.url)
      const none = { deps: silent.deps, now: silent.deps.clock.now(), panelId: undefined }
      await inTransaction(silent.deps.sequelize, {}, () => enqueueMail(none, note))
      await silent.runJobs()
      expect(printed).toEqual([])
      await silent.owner.query(
        `insert into users (id, email, name, password_hash, created_at)
         values ('0b0f9a3e-0000-4000-8000-000000000001', 'ines@example.org', 'Ines', '', now())`,
      )
      await visitor.call(askReset, { body: { email: 'ines@example.org' } })
      await silent.runJobs()
      expect(printed).toHaveLength(1)
      expect(printed[0]).toMatch(/hand over to ines@example\.org[\s\S]*\/reset\/[\w-]{43}/)
    } finally {
      await silent.close()
    }
  })
})
