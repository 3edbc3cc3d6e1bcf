import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'
import { endpoint } from './endpoint.ts'
import { emailAddress, id, instant, line, password, slug } from './text.ts'

const personName = line(limits.name, 'Enter your name.')

/** Who is looking: a signed-in user, the seats and round roles that links opened in this browser, and how Scrim runs. */
export const me = z.strictObject({
  user: z.strictObject({ id, name: z.string(), email: z.string(), version: z.number().int() }).nullable(),
  panels: z.array(z.strictObject({ slug, name: z.string(), roles: z.array(z.string()) })),
  seats: z.array(z.strictObject({ id, label: z.string(), roundTitle: z.string() })),
  duties: z.array(z.strictObject({ role: z.string(), roundTitle: z.string(), path: z.string() })),
  mode: z.enum(['demo', 'live']),
  mailSends: z.boolean(),
})
export type Me = z.infer<typeof me>

export const signUp = z.strictObject({
  name: personName,
  email: emailAddress,
  password,
  panelName: line(limits.name, 'Name your panel.'),
  timeZone: z.string().max(64).default('UTC'),
  /** What the first organiser's one-time address carries; empty otherwise. */
  first: z.string().max(100).default(''),
})
export const signIn = z.strictObject({
  email: emailAddress,
  password: z.string().min(1, 'Enter your password.').max(limits.passwordMost),
})
export const changeName = z.strictObject({ name: personName })
export const changePassword = z.strictObject({
  current: z.string().min(1, 'Enter your present password.').max(limits.passwordMost),
  next: password,
})
export const forgotPassword = z.strictObject({ email: emailAddress })
export const resetPassword = z.strictObject({ password })

const done = z.strictObject({ done: z.literal(true) })
const token = z.strictObject({ token: z.string().min(10).max(100) })

export const getMe = endpoint('GET /api/me', {
  id: 'getMe',
  audience: 'anyone',
  summary: 'Who is looking',
  response: me,
})
export const createAccount = endpoint('POST /api/account', {
  id: 'createAccount',
  audience: 'anyone',
  summary: 'Create an account and its panel; signs in',
  body: signUp,
  response: me,
})
export const renameAccount = endpoint('PATCH /api/account', {
  id: 'renameAccount',
  audience: 'signed-in',
  summary: 'Change one’s name',
  body: changeName,
  response: me,
  versioned: true,
})
export const replacePassword = endpoint('POST /api/account/password', {
  id: 'replacePassword',
  audience: 'signed-in',
  summary: 'Change one’s password; ends the other sessions',
  body: changePassword,
  response: done,
})
export const createSession = endpoint('POST /api/session', {
  id: 'createSession',
  audience: 'anyone',
  summary: 'Sign in',
  body: signIn,
  response: me,
})
export const endSession = endpoint('DELETE /api/session', {
  id: 'endSession',
  audience: 'anyone',
  summary: 'Sign out',
  response: done,
})
export const askReset = endpoint('POST /api/password-resets', {
  id: 'askReset',
  audience: 'anyone',
  summary: 'Ask for a link to choose a new password; the answer is the same for every address',
  body: forgotPassword,
  response: done,
})
export const useReset = endpoint('POST /api/password-resets/:token', {
  id: 'useReset',
  audience: 'anyone',
  summary: 'Choose a new password by a mailed link',
  params: token,
  body: resetPassword,
  response: done,
})

export const demoMail = z.strictObject({
  id,
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  receivedAt: instant,
})
export const getMailbox = endpoint('GET /api/demo/mailbox', {
  id: 'getMailbox',
  audience: 'anyone',
  summary: 'Mail that the demo’s own mail server took in; answers 404 outside the demo',
  response: z.strictObject({ messages: z.array(demoMail) }),
})
