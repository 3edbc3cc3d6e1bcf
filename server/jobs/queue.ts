import type { Context } from '#server/http/context.ts'
import type { Message } from '#server/mail/mailer.ts'
import { Job } from '#server/models/job.ts'

/** What each task is told. Data lies in the database until the task is done: no secret, no rating, no unit. */
export interface TaskData {
  'send-mail': Message
  'send-reset-link': { email: string }
}
export type TaskName = keyof TaskData

/** Writes a job in the caller's transaction: it runs once that has committed, and never otherwise. */
export async function enqueue<N extends TaskName>(
  context: Pick<Context, 'deps' | 'now' | 'panelId'>,
  task: N,
  data: TaskData[N],
  { runAt = context.now }: { runAt?: Date } = {},
): Promise<void> {
  await Job.create({
    id: context.deps.random.id(),
    panelId: context.panelId ?? null,
    task,
    data,
    runAt,
    createdAt: context.now,
  })
}

/** Mail after commit. Where no mail server is set up nothing is written: screens show links to hand over instead. */
export async function enqueueMail(
  context: Pick<Context, 'deps' | 'now' | 'panelId'>,
  message: Message,
): Promise<void> {
  if (context.deps.mail.sends) await enqueue(context, 'send-mail', message)
}
