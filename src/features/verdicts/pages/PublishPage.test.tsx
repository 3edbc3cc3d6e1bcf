import { screen, waitFor, within } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { getMe } from '#shared/contracts/account.ts'
import { getRound } from '#shared/contracts/rounds.ts'
import {
  getVerdictDraft,
  publishVerdict,
  putPhoto,
  saveUnitFacts,
  saveVerdict,
  type VerdictDraft,
} from '#shared/contracts/verdicts.ts'
import { fakeServer, Refusal, showPage } from '#tests/support/show-page.tsx'
import { exampleDraft } from '../draft.fixture.ts'
import { exampleRound } from '../round.fixture.ts'
import PublishPage from './PublishPage.tsx'

const complete: VerdictDraft = {
  ...exampleDraft,
  headline: 'Dunlin is wider.',
  summary: 'Six of us.',
  missing: [],
}

function open(draft: VerdictDraft = exampleDraft) {
  const server = fakeServer()
    .on(getMe, () => ({
      user: null,
      panels: [{ slug: 'quayside-bench', name: 'The Quayside Bench', roles: [] }],
      seats: [],
      duties: [],
      mode: 'live' as const,
      mailSends: false,
    }))
    .on(getRound, () => exampleRound)
    .on(getVerdictDraft, () => draft)
    .on(saveVerdict, ({ body }) => ({
      ...draft,
      ...(body as { headline: string; summary: string }),
      version: 5,
    }))
    .on(saveUnitFacts, () => draft)
    .on(publishVerdict, () => ({ slug: 'three-earphones', version: 1 }))
  showPage(
    PublishPage,
    '/p/:panel/rounds/:round/verdict',
    `/p/quayside-bench/rounds/${exampleDraft.round.id}/verdict`,
    {
      '/verdicts/:slug': 'The public page',
    },
  )
  return server
}
const unit = async (name: string) => within(await screen.findByRole('region', { name }))

describe('the desk before publishing', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('lists what is missing and leads to its entry', async () => {
    open()
    await userEvent.click(await screen.findByText('How you got Knot'))
    await waitFor(() => expect(document.activeElement).toHaveAttribute('name', 'units.1.provenance'))
    expect(screen.getByText('3 things are missing, see above.')).toBeInTheDocument()
  })

  it('suggests a disclosure from where a unit came from, and keeps it with the price', async () => {
    const server = open()
    const knot = await unit('Knot')
    await userEvent.click(knot.getByLabelText(/^On loan/))
    await userEvent.type(knot.getByLabelText('From whom'), 'a shop')
    await userEvent.click(knot.getByText('Use the suggested wording'))
    await userEvent.type(knot.getByLabelText('Price'), '54,50')
    await userEvent.click(knot.getByText('Keep what is known of Knot'))
    await waitFor(() => expect(server.asked('saveUnitFacts')).toHaveLength(1))
    expect(server.asked('saveUnitFacts')[0]?.body).toMatchObject({
      provenance: 'loan',
      lender: 'a shop',
      disclosure: 'On loan from a shop; the lender saw nothing before this page.',
      price: { minor: 5450, currency: 'EUR' },
      priceUnknown: false,
    })
  })

  it('says at once, at its entry, that a loan needs a lender and a price an amount or the word none', async () => {
    const server = open()
    const knot = await unit('Knot')
    await userEvent.click(knot.getByLabelText(/^On loan/))
    await userEvent.click(knot.getByText('Keep what is known of Knot'))
    expect((await knot.findAllByText('Write the sentence readers will see.')).length).toBeGreaterThan(0)
    expect(server.asked('saveUnitFacts')).toHaveLength(0)
  })

  it('takes one of Scrim’s sentences as the headline, and does not publish words that were not kept', async () => {
    const server = open(complete)
    await userEvent.click(await screen.findByText('Take as headline'))
    expect(screen.getByLabelText('Headline')).toHaveValue(exampleDraft.sentences[0])
    expect(screen.getByText('Keep what you changed first: the words.')).toBeInTheDocument()
    await userEvent.click(screen.getByText('Keep the words'))
    await waitFor(() => expect(server.asked('saveVerdict')[0]?.body).toMatchObject({ summary: 'Six of us.' }))
    await waitFor(() => expect(screen.queryByText(/Keep what you changed first/)).not.toBeInTheDocument())
  })

  it('asks before publishing, then leads to the public page', async () => {
    const server = open(complete)
    await userEvent.click(await screen.findByText('Publish the verdict'))
    const question = await screen.findByRole('dialog')
    expect(question).toHaveTextContent('It cannot be taken back.')
    expect(server.asked('publishVerdict')).toHaveLength(0)
    await userEvent.click(within(question).getByText('Publish the verdict'))
    expect(await screen.findByText('The public page')).toBeInTheDocument()
    expect(server.asked('publishVerdict')[0]?.key).toBeTruthy()
  })

  it('publishes a correction only with what was wrong and what is right', async () => {
    const server = open({
      ...complete,
      published: { slug: 'three-earphones', version: 1, at: '2026-11-12T18:00:00Z' },
    })
    await userEvent.type(await screen.findByLabelText('What was wrong'), 'Knot was on loan.')
    expect(screen.getByText('Say what was wrong and what is right.')).toBeInTheDocument()
    await userEvent.type(screen.getByLabelText('What is right'), 'Knot was bought.')
    await userEvent.click(screen.getByText('Publish version 2'))
    expect(await screen.findByText('The public page')).toBeInTheDocument()
    expect(server.asked('publishVerdict')[0]?.body).toEqual({
      correction: 'Wrong: Knot was on loan. Right: Knot was bought.',
    })
  })

  it('says why a picture was refused, where it was chosen', async () => {
    open().on(putPhoto, () => new Refusal('invalid', 'Refused', { photo: 'This file is not a picture.' }))
    const knot = await unit('Knot')
    await userEvent.upload(
      knot.getByLabelText(/^Photograph/),
      new File(['MZ'], 'unit.png', { type: 'image/png' }),
    )
    expect(await knot.findByText('This file is not a picture.')).toBeInTheDocument()
  })
})
