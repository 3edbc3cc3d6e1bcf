import { fireEvent, screen, waitFor, within } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import {
  askReset,
  createAccount,
  createSession,
  getMe,
  renameAccount,
  replacePassword,
  useReset as resetByLink,
  type Me,
} from '#shared/contracts/account.ts'
import { paths, to } from '#src/app/paths.ts'
import { fakeServer, Refusal, showPage } from '#tests/support/show-page.tsx'
import AccountPage from './AccountPage.tsx'
import ForgotPage from './ForgotPage.tsx'
import ResetPage from './ResetPage.tsx'
import SignInPage from './SignInPage.tsx'
import SignUpPage from './SignUpPage.tsx'

const nobody: Me = { user: null, panels: [], seats: [], duties: [], mode: 'live', mailSends: true }
const ines: Me = {
  ...nobody,
  user: {
    id: '33333333-3333-4333-8333-333333333333',
    name: 'Ines Falk',
    email: 'ines@example.org',
    version: 1,
  },
  panels: [{ slug: 'quayside-bench', name: 'The Quayside Bench', roles: ['organiser'] }],
}
const places = { [paths.panel.pattern]: 'The desk is shown', [paths.rounds.pattern]: 'The rounds are shown' }
const type = (label: string, text: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value: text } })
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }))

afterEach(() => vi.unstubAllGlobals())

describe('signing in', () => {
  const open = (me: Me, address = to('signIn')) => {
    const server = fakeServer().on(getMe, () => me)
    showPage(SignInPage, paths.signIn.pattern, address, places)
    return server
  }

  it('leads to where the person wanted to go, and nowhere outside', async () => {
    open(nobody, `/sign-in?next=${encodeURIComponent('/p/quayside-bench/rounds')}`).on(
      createSession,
      () => ines,
    )
    type('Email address', 'ines@example.org')
    type('Password', 'harbour at dusk')
    press('Sign in')
    expect(await screen.findByText('The rounds are shown')).toBeVisible()
  })

  it('goes to the desk when the address asks for another site', async () => {
    open(nobody, `/sign-in?next=${encodeURIComponent('//example.org/p')}`).on(createSession, () => ines)
    type('Email address', 'ines@example.org')
    type('Password', 'harbour at dusk')
    press('Sign in')
    expect(await screen.findByText('The desk is shown')).toBeVisible()
  })

  it('keeps what was typed when the password is wrong', async () => {
    open(nobody).on(createSession, () => new Refusal('not_signed_in', 'Address or password are not right.'))
    type('Email address', 'ines@example.org')
    type('Password', 'harbour at dawn')
    press('Sign in')
    expect((await screen.findAllByText('Address or password are not right.'))[0]).toBeVisible()
    expect(screen.getByLabelText('Email address')).toHaveValue('ines@example.org')
  })

  it('offers the invented people in the demo, and only there', async () => {
    const server = open({ ...nobody, mode: 'demo' }).on(createSession, () => ines)
    fireEvent.click(await screen.findByRole('button', { name: 'Sign in as Ines Falk' }))
    expect(await screen.findByText('The desk is shown')).toBeVisible()
    expect(server.asked('createSession')[0]?.body).toMatchObject({ email: 'ines@example.org' })
  })

  it('offers nobody where Scrim runs for real', async () => {
    const server = open(nobody)
    await waitFor(() => expect(server.asked('getMe')).toHaveLength(1))
    expect(screen.queryByText('In this demo')).toBeNull()
  })
})

describe('creating an account', () => {
  it('says at each field what is missing, in a summary that takes focus', async () => {
    fakeServer()
    showPage(SignUpPage, paths.signUp.pattern, to('signUp'))
    type('Password', 'short')
    press('Create the account')
    const summary = await screen.findByRole('alert')
    expect(summary).toHaveFocus()
    expect(
      within(summary)
        .getAllByRole('link')
        .map((link) => link.textContent),
    ).toEqual([
      'Enter your name.',
      'Enter an address like name@example.org.',
      'At least 10 characters.',
      'Name your panel.',
    ])
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(/At least 10 characters\.$/)
    expect(screen.getByLabelText('Password')).toHaveValue('short')
  })

  it('puts the server’s fault at its field, and one without a field in the summary', async () => {
    fakeServer().on(
      createAccount,
      () =>
        new Refusal('invalid', 'Look at these again.', {
          email: 'An account has this address. Sign in instead.',
          first: 'This address has been used.',
        }),
    )
    showPage(SignUpPage, paths.signUp.pattern, `${to('signUp')}?first=once`)
    type('Your name', 'Ines Falk')
    type('Email address', 'ines@example.org')
    type('Password', 'harbour at dusk')
    type('Panel', 'The Quayside Bench')
    press('Create the account')
    await waitFor(() =>
      expect(screen.getByLabelText('Email address')).toHaveAccessibleDescription(
        'An account has this address. Sign in instead.',
      ),
    )
    expect(screen.getByRole('link', { name: 'This address has been used.' })).toBeVisible()
    expect(screen.getByLabelText('Panel')).toHaveValue('The Quayside Bench')
  })
})

describe('a forgotten password', () => {
  it('says the same whether the address has an account or not', async () => {
    fakeServer()
      .on(getMe, () => nobody)
      .on(askReset, () => ({ done: true as const }))
    showPage(ForgotPage, paths.forgot.pattern, to('forgot'))
    type('Email address', 'Nobody@example.org')
    press('Send the link')
    expect(await screen.findByRole('status')).toHaveTextContent('If nobody@example.org has an account here')
  })

  it('says plainly that this Scrim sends no mail', async () => {
    fakeServer().on(getMe, () => ({ ...nobody, mailSends: false }))
    showPage(ForgotPage, paths.forgot.pattern, to('forgot'))
    expect(await screen.findByText('This Scrim sends no mail')).toBeVisible()
  })

  it('offers another link where the old one is spent', async () => {
    fakeServer().on(resetByLink, () => new Refusal('not_found', 'No such link.'))
    showPage(ResetPage, paths.reset.pattern, to('reset', { token: 'abcdefghijkl' }))
    type('New password', 'harbour at dusk')
    press('Change the password')
    expect(await screen.findByText('This link no longer works')).toBeVisible()
    expect(screen.getByRole('link', { name: 'Send another link' })).toHaveAttribute('href', to('forgot'))
  })
})

describe('one’s own account', () => {
  it('changes name and password, each with its own word that it is done', async () => {
    const server = fakeServer()
      .on(getMe, () => ines)
      .on(renameAccount, () => ({ ...ines, user: { ...ines.user!, name: 'Ines Marsh', version: 2 } }))
      .on(replacePassword, () => ({ done: true as const }))
    showPage(AccountPage, paths.account.pattern, to('account'))
    expect(await screen.findByRole('heading', { name: 'Ines Falk' })).toBeVisible()
    type('Your name', 'Ines Marsh')
    press('Save the name')
    expect(await screen.findByText('Saved: Ines Marsh')).toBeVisible()
    type('Present password', 'harbour at dusk')
    type('New password', 'four quiet herons')
    press('Change the password')
    expect(await screen.findByText(/Password changed/)).toBeVisible()
    expect(server.asked('replacePassword')[0]?.body).toEqual({
      current: 'harbour at dusk',
      next: 'four quiet herons',
    })
    expect(screen.getByLabelText('New password')).toHaveValue('')
  })

  it('puts a wrong present password at its field', async () => {
    fakeServer()
      .on(getMe, () => ines)
      .on(
        replacePassword,
        () => new Refusal('invalid', 'Look again.', { current: 'This is not your password.' }),
      )
    showPage(AccountPage, paths.account.pattern, to('account'))
    await screen.findByRole('heading', { name: 'Ines Falk' })
    type('Present password', 'harbour at dawn')
    type('New password', 'four quiet herons')
    press('Change the password')
    await waitFor(() =>
      expect(screen.getByLabelText('Present password')).toHaveAccessibleDescription(
        'This is not your password.',
      ),
    )
    expect(screen.getByLabelText('New password')).toHaveValue('four quiet herons')
  })
})
