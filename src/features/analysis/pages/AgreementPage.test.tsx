import { screen } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { getAgreement, type Agreement } from '#shared/contracts/analysis.ts'
import { getRound, type Round } from '#shared/contracts/rounds.ts'
import { fakeServer, showPage } from '#tests/support/show-page.tsx'
import { exampleAgreement } from '../agreement.fixture.ts'
import { exampleRound } from '../round.fixture.ts'
import AgreementPage from './AgreementPage.tsx'

function open(agreement: Agreement = exampleAgreement, round: Round = exampleRound) {
  fakeServer()
    .on(getAgreement, () => agreement)
    .on(getRound, () => round)
  showPage(
    AgreementPage,
    '/p/:panel/rounds/:round/agreement',
    `/p/quayside-bench/rounds/${round.id}/agreement`,
  )
}

/** Row heads are looked up by their cell; role queries over a whole page of tables are slow. */
const rowOf = async (words: string) =>
  (await screen.findByText(words, { selector: 'th *, th' })).closest('tr')

describe('the agreement screen', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('says at a glance who agrees, how sure that is, alpha and W', async () => {
    open()
    expect(await screen.findByText('17 of 18 servings counted', { exact: false })).toBeInTheDocument()
    expect(screen.getAllByText(exampleAgreement.results[0]?.agreement.sentence ?? '').length).toBeGreaterThan(
      0,
    )
    expect(screen.getByText('0.61, between 0.30 and 0.80')).toBeInTheDocument()
    expect(screen.getByText(/^0\.86, p 0\.00[56]$/)).toBeInTheDocument()
  })

  it('shows names to the organiser and a number where no name is given', async () => {
    open()
    expect((await screen.findAllByText('Ines Falk')).length).toBeGreaterThan(0)
    expect(screen.getByText('Listener 10', { selector: 'th *, th' })).toBeInTheDocument()
  })

  it('says who was flagged by which rule and who recognised what', async () => {
    open()
    expect(await screen.findByText('Repeats differ by 31 points.')).toBeInTheDocument()
    expect(screen.getByText('flagged only')).toBeInTheDocument()
    expect(screen.getByText('“the warm one”')).toBeInTheDocument()
    expect(screen.getByText('fairly sure')).toBeInTheDocument()
  })

  it('carries its labels and what the intervals do not cover', async () => {
    open()
    expect(await screen.findByText('Single-blind')).toBeInTheDocument()
    expect(screen.getByText(/one specimen stands for its model/)).toBeInTheDocument()
  })

  it('calls under six listeners informal and promises no verdict sentence', async () => {
    open({ ...exampleAgreement, label: { key: 'informal', words: 'Informal', fewest: 5 } })
    expect(await screen.findByText('Informal: five listeners on some unit')).toBeInTheDocument()
    expect(screen.getByText(/there is no verdict sentence/)).toBeInTheDocument()
  })

  it('offers the verdict only to whoever may publish it', async () => {
    open({ ...exampleAgreement, can: { publish: false } })
    await rowOf('panelist')
    expect(screen.queryByText('Write the verdict', { selector: 'a.button *' })).not.toBeInTheDocument()
  })
})
