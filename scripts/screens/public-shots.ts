import { askReset, getMailbox } from '#shared/contracts/account.ts'
import { demoSignIns } from '#shared/domain/demo-sign-ins.ts'
import { to } from '#src/app/paths.ts'
import { visit } from '#tests/support/visitor.ts'
import type { Cast } from './cast.ts'
import { press, reader, type Shot } from './shot.ts'

const six = (cast: Cast): string => cast.round((line) => line.title.startsWith('Six small')).verdictSlug ?? ''

async function aLetter(cast: Cast): Promise<string> {
  await visit(cast.url).call(askReset, { body: { email: demoSignIns[0].email } })
  for (;;) {
    const { messages } = await cast.reader.call(getMailbox)
    const link = /\/reset\/(\S+)/.exec(messages[0]?.text ?? '')?.[1]
    if (link) return link
    await new Promise((resolve) => setTimeout(resolve, 200))
  }
}

/** What anybody may open. */
export const publicShots: readonly Shot[] = [
  { name: 'home', path: 'home', who: reader, go: () => to('home') },
  { name: 'how', path: 'how', who: reader, go: () => to('how') },
  { name: 'verdict', path: 'verdict', who: reader, go: (cast) => to('verdict', { slug: six(cast) }) },
  {
    name: 'verdict-check',
    path: 'verdict',
    who: reader,
    go: (cast) => to('verdict', { slug: six(cast) }),
    then: async (page) => {
      for (const summary of await page.locator('details > summary').all()) await summary.click()
      await press(page, /check/i)
      await page.waitForTimeout(2500)
    },
  },
  {
    name: 'verdict-imported',
    path: 'verdict',
    who: reader,
    go: (cast) =>
      to('verdict', { slug: cast.round((line) => line.origin === 'imported').verdictSlug ?? '' }),
  },
  {
    name: 'verdict-informal',
    path: 'verdict',
    who: reader,
    go: (cast) =>
      to('verdict', { slug: cast.round((line) => line.title === 'After the regatta').verdictSlug ?? '' }),
  },
  { name: 'verdictNumber', path: 'verdictNumber', who: reader, go: () => to('verdictNumber', { number: '2' }) },
  {
    name: 'publicRound-open',
    path: 'publicRound',
    who: reader,
    go: (cast) => to('publicRound', { round: cast.open.id }),
  },
  {
    name: 'publicRound-cancelled',
    path: 'publicRound',
    who: reader,
    go: (cast) => to('publicRound', { round: cast.round((line) => line.status === 'cancelled').id }),
  },
  { name: 'signIn', path: 'signIn', who: reader, go: () => to('signIn') },
  {
    name: 'signIn-wrong',
    path: 'signIn',
    who: reader,
    go: () => to('signIn'),
    then: async (page) => {
      await page.getByLabel('Email address').fill('ines@example.org')
      await page.getByLabel('Password').fill('harbour at noon')
      await press(page, /^Sign in$/)
      await page.getByText(/not|match/i).first().waitFor()
      await page.waitForTimeout(800)
    },
  },
  { name: 'signUp', path: 'signUp', who: reader, go: () => to('signUp') },
  { name: 'forgot', path: 'forgot', who: reader, go: () => to('forgot') },
  {
    name: 'reset',
    path: 'reset',
    who: reader,
    go: async (cast) => to('reset', { token: await aLetter(cast) }),
  },
  {
    name: 'mailbox',
    path: 'mailbox',
    who: reader,
    go: async (cast) => {
      await aLetter(cast)
      return to('mailbox')
    },
  },
  { name: 'join-unknown', path: 'join', who: reader, go: () => to('join', { token: 'AAAAAAAAAAAAAAAAAAAAAA' }) },
  { name: 'home-nothing', path: 'home', who: reader, go: () => '/there-is-nothing-here' },
]
