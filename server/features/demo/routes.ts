import { getMailbox } from '#shared/contracts/account.ts'
import type { Feature } from '#server/http/feature.ts'
import { presentMail } from './presenter.ts'
import { messagesTakenIn } from './service.ts'

export const demo: Feature = (mount) => {
  mount(getMailbox, async (_input, context) => ({
    messages: (await messagesTakenIn(context)).map(presentMail),
  }))
}
