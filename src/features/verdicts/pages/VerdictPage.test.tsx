import { screen } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { getVerdict, listVerdicts, type PublicVerdict } from '#shared/contracts/verdicts.ts'
import { fakeServer, showPage } from '#tests/support/show-page.tsx'
import { exampleVerdict } from '../verdict.fixture.ts'
import VerdictPage from './VerdictPage.tsx'

const open = (verdict: PublicVerdict = exampleVerdict) => {
  fakeServer().on(getVerdict, () => verdict)
  showPage(VerdictPage, '/verdicts/:slug', `/verdicts/${verdict.slug}`)
}

describe('a public verdict', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('says the sentence first and who paid before any picture', async () => {
    open()
    const sentence = await screen.findByRole('heading', { level: 1 })
    expect(sentence).toHaveTextContent(exampleVerdict.headline)
    const paid = screen.getByText('Dunlin: on loan from a shop until 30 November 2026.')
    const picture = screen.getByAltText('Lantern Reed Dunlin')
    expect(sentence.compareDocumentPosition(paid) & Node.DOCUMENT_POSITION_FOLLOWING).toBeTruthy()
    expect(paid.compareDocumentPosition(picture) & Node.DOCUMENT_POSITION_FOLLOWING).toBeTruthy()
  })

  it('carries its labels, its limits, its corrections and how to cite it', async () => {
    open()
    expect(await screen.findByText('Small panel: at least six listeners on each unit')).toBeInTheDocument()
    expect(screen.getByText('Single-blind')).toBeInTheDocument()
    expect(screen.getByText(/These listeners, that evening/)).toBeInTheDocument()
    expect(screen.getByText(/Knot was bought\./, { selector: '.whitespace-pre-line' })).toBeInTheDocument()
    expect(screen.getByText(/Blind listening verdict 7, version 2\./)).toBeInTheDocument()
  })

  it('shows a price with its currency and its day, and says where there is none', async () => {
    open()
    expect((await screen.findAllByText('€54')).length).toBeGreaterThan(0)
    expect(screen.getAllByText('Price, 3 November 2026').length).toBeGreaterThan(0)
    expect(screen.getByText('no price')).toBeInTheDocument()
  })

  it('shows no figure where fewer than five took part', async () => {
    open({ ...exampleVerdict, label: { key: 'none', words: 'Informal', fewest: 4 }, results: [], files: [] })
    expect(await screen.findByText('No figures')).toBeInTheDocument()
    expect(screen.queryByText(/heard line/i)).not.toBeInTheDocument()
    expect(screen.queryByText('Liked, median')).not.toBeInTheDocument()
  })

  it('leads from the short address of a citation to the verdict', async () => {
    fakeServer().on(listVerdicts, () => ({
      verdicts: [
        {
          slug: exampleVerdict.slug,
          number: 7,
          headline: exampleVerdict.headline,
          panelName: exampleVerdict.panelName,
          publishedAt: exampleVerdict.publishedAt,
          label: 'Small panel',
          labels: [],
          listeners: 6,
          descriptor: null,
          units: [],
        },
      ],
    }))
    const { router } = showPage(VerdictPage, '/v/:number', '/v/7', {
      '/verdicts/:slug': 'The verdict itself',
    })
    expect(await screen.findByText('The verdict itself')).toBeInTheDocument()
    expect(router.state.location.pathname).toBe(`/verdicts/${exampleVerdict.slug}`)
  })
})
