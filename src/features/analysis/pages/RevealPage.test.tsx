import { screen } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { getReveal } from '#shared/contracts/analysis.ts'
import { fakeServer, showPage } from '#tests/support/show-page.tsx'
import { exampleReveal } from '../reveal.fixture.ts'
import RevealPage from './RevealPage.tsx'

const at = '/p/quayside-bench/rounds/11111111-1111-4111-8111-111111111111/reveal'

function open(search = '') {
  fakeServer().on(getReveal, () => exampleReveal)
  return showPage(RevealPage, '/p/:panel/rounds/:round/reveal', at + search)
}

describe('the reveal for the room', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('has no unit’s name in the page before its cloth is drawn aside', async () => {
    open()
    expect(await screen.findByText('0 of 3 drawn aside')).toBeInTheDocument()
    for (const { name } of exampleReveal.units) expect(document.body.innerHTML).not.toContain(name)
    await userEvent.click(screen.getByRole('button', { name: 'Next' }))
    expect(await screen.findByText('Saltmarsh Audio Tern One')).toBeInTheDocument()
    expect(document.body.innerHTML).not.toContain('Dunlin')
  })

  it('goes on by key, back by key, and by a tap anywhere', async () => {
    open()
    await screen.findByText('0 of 3 drawn aside')
    await userEvent.keyboard('{PageDown}')
    expect(await screen.findByText('1 of 3 drawn aside')).toBeInTheDocument()
    await userEvent.click(screen.getByRole('img'))
    expect(await screen.findByText('2 of 3 drawn aside')).toBeInTheDocument()
    await userEvent.keyboard('{ArrowLeft}')
    expect(await screen.findByText('1 of 3 drawn aside')).toBeInTheDocument()
  })

  it('steps once when the verb itself is pressed by keyboard', async () => {
    open()
    await screen.findByText('0 of 3 drawn aside')
    screen.getByRole('button', { name: 'Next' }).focus()
    await userEvent.keyboard('{Enter}')
    expect(await screen.findByText('1 of 3 drawn aside')).toBeInTheDocument()
  })

  it('ends with the panel’s sentence and leads to the numbers', async () => {
    open('?step=4')
    expect(await screen.findByText(exampleReveal.sentence)).toBeInTheDocument()
    expect(screen.getByRole('link', { name: 'Read the numbers' })).toBeInTheDocument()
  })

  it('does not cover again after a reload what the room has seen', async () => {
    const { router } = open('?step=1')
    expect(await screen.findByText('1 of 3 drawn aside')).toBeInTheDocument()
    expect(router.state.location.search).toBe('?step=1')
  })
})
