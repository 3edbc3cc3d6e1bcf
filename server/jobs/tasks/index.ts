import type { Deps } from '#server/deps.ts'
import type { TaskData, TaskName } from '../queue.ts'
import { sendMail } from './send-mail.ts'
import { sendResetLink } from './send-reset-link.ts'

/** Each runs inside a transaction that is undone when it fails; it is then tried again. */
export const tasks: { [N in TaskName]: (data: TaskData[N], deps: Deps) => Promise<void> } = {
  'send-mail': sendMail,
  'send-reset-link': sendResetLink,
}
