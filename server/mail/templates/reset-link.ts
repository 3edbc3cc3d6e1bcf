import type { Message } from '../mailer.ts'

export const resetLink = ({ to, name, url }: { to: string; name: string; url: string }): Message => ({
  to,
  subject: 'Choose a new password for Scrim',
  text: `Hello ${name},

somebody asked for a new password for this address. To choose one, open

${url}

The link works once, within an hour. If it was not you, do nothing: your password stays as it is.
`,
})
