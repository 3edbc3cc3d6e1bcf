import { QueryClientProvider } from '@tanstack/react-query'
import { render, screen, within } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest'
import { createQueryClient } from '#src/lib/query-client.ts'
import { exampleVerdict } from '../verdict.fixture.ts'
import { CheckIt } from './CheckIt.tsx'

const ratings = 'panelist,unit,descriptor,score\n'
const onlyRatings = { ...exampleVerdict, fingerprints: { plan: null, key: null, ratings: 'c'.repeat(64) } }

const show = (verdict = onlyRatings) =>
  render(
    <QueryClientProvider client={createQueryClient()}>
      <CheckIt verdict={verdict} />
    </QueryClientProvider>,
  )

describe('checking a verdict in the reader’s own browser', () => {
  // The page loads this part when it is asked to check; here it is loaded beforehand.
  beforeAll(() => import('#shared/allocation/key-files.ts'))
  afterEach(() => vi.unstubAllGlobals())

  it('says each check by name, and which one failed', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(new Response(ratings)))
    show()
    await userEvent.click(screen.getByRole('button', { name: 'Check it' }))
    const failed = await screen.findByText('1 of 1 checks failed.')
    const list = failed.nextElementSibling as HTMLElement
    expect(within(list).getByText(/ratings\.csv has the published fingerprint/)).toHaveTextContent('failed')
  })

  it('says that a file could not be fetched, and offers to try again', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(new Response('', { status: 503 })))
    show()
    await userEvent.click(screen.getByRole('button', { name: 'Check it' }))
    expect(await screen.findByText('The check could not be made.')).toBeInTheDocument()
    expect(screen.getByText(/could not be fetched \(503\)/)).toBeInTheDocument()
    expect(screen.getByRole('button', { name: 'Try again' })).toBeInTheDocument()
  })

  it('says of imported ratings that there is no key to check', () => {
    show()
    expect(screen.getByText(/there is no key to check/)).toBeInTheDocument()
  })
})
