import { QueryClientProvider } from '@tanstack/react-query'
import { render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { MemoryRouter, Route, Routes } from 'react-router-dom'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { createQueryClient } from '#src/lib/query-client.ts'
import { previewOf } from '../preview.ts'
import ImportPage from './ImportPage.tsx'

const good = `panelist,unit,descriptor,replicate,position,score
Ada,Dunlin,width,1,1,62
Ada,Knot,width,1,2,40
Bo,Dunlin,width,1,2,58
Bo,Knot,width,1,1,41
`
const withFault = `${good}Cy,Knot,width,1,1,loud\n`
const round = '11111111-1111-4111-8111-111111111111'

interface Sent {
  url: string
  key: string | null
  body: Record<string, unknown>
}

/** Stands for the server: previews what it is sent, stores on the second try when `failFirst` is set. */
function standIn({ failFirst = false } = {}) {
  const stored: Sent[] = []
  const answer = (status: number, body: unknown) => new Response(JSON.stringify(body), { status })
  vi.stubGlobal('fetch', async (url: string, init: RequestInit) => {
    const body = JSON.parse(String(init.body)) as Record<string, unknown>
    if (url.endsWith('/preview')) return answer(200, previewOf(String(body.text)))
    stored.push({ url, key: new Headers(init.headers).get('Idempotency-Key'), body })
    if (failFirst && stored.length === 1) throw new TypeError('network')
    return answer(200, { round })
  })
  return stored
}

function open() {
  render(
    <QueryClientProvider client={createQueryClient()}>
      <MemoryRouter initialEntries={['/p/quayside-bench/import']}>
        <Routes>
          <Route path="/p/:panel/import" element={<ImportPage />} />
          <Route path="/p/:panel/rounds/:round/agreement" element={<h1>Agreement is shown</h1>} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  )
}

const chooseFile = (text: string) =>
  userEvent.upload(
    screen.getByLabelText('Ratings file'),
    new File([text], 'evening.csv', { type: 'text/csv' }),
  )

describe('importing ratings', () => {
  beforeEach(() => void standIn())
  afterEach(() => vi.unstubAllGlobals())

  it('shows what was read before anything is stored, and that Scrim reads the same', async () => {
    open()
    await chooseFile(good)
    expect(
      await screen.findByText(/4 rows: two listeners, two units \(Dunlin and Knot\)/),
    ).toBeInTheDocument()
    expect(await screen.findByText(/evening\.csv.*Scrim reads it the same way/)).toBeInTheDocument()
    expect(screen.getByText('Every row can be read.')).toBeInTheDocument()
  })

  it('names a bad row by line and reason and stores only when it is left out by choice', async () => {
    const stored = standIn()
    open()
    await chooseFile(withFault)
    expect(await screen.findByText('Line 6')).toBeInTheDocument()
    expect(screen.getByText(/The score “loud” is not a number/)).toBeInTheDocument()
    expect(screen.getByText(/or leave them out/)).toBeInTheDocument()
    await userEvent.type(screen.getByLabelText('Title'), 'Two on a Tuesday')
    await userEvent.type(screen.getByLabelText('Question'), 'Which is wider?')
    await userEvent.click(screen.getByRole('button', { name: 'Store the ratings' }))
    expect(stored).toHaveLength(0)
    await userEvent.click(screen.getByLabelText(/^Leave these rows out/))
    await userEvent.click(screen.getByRole('button', { name: 'Store the ratings' }))
    expect(await screen.findByText('Agreement is shown')).toBeInTheDocument()
    expect(stored[0]?.body).toMatchObject({
      leaveOutFaults: true,
      title: 'Two on a Tuesday',
      text: withFault,
    })
  })

  it('sends the same key when storing is tried again, so that it is stored once', async () => {
    const stored = standIn({ failFirst: true })
    open()
    await chooseFile(good)
    await userEvent.type(await screen.findByLabelText('Title'), 'Two on a Tuesday')
    await userEvent.type(screen.getByLabelText('Question'), 'Which is wider?')
    await userEvent.click(screen.getByRole('button', { name: 'Store the ratings' }))
    expect(await screen.findByText('The file and what you typed are still here.')).toBeInTheDocument()
    await userEvent.click(screen.getByRole('button', { name: 'Store the ratings' }))
    expect(await screen.findByText('Agreement is shown')).toBeInTheDocument()
    expect(stored.map((sent) => sent.key)).toEqual([stored[0]?.key, stored[0]?.key])
  })

  it('asks for a title and leads to it from the summary', async () => {
    open()
    await chooseFile(good)
    await userEvent.click(await screen.findByRole('button', { name: 'Store the ratings' }))
    const fault = await screen.findByRole('link', { name: 'Give the round a title.' })
    await userEvent.click(fault)
    await waitFor(() => expect(screen.getByLabelText('Title')).toHaveFocus())
  })

  it('reads rows that were pasted', async () => {
    open()
    await userEvent.click(screen.getByText('Paste the rows instead'))
    await userEvent.click(screen.getByLabelText('Rows with their header'))
    await userEvent.paste(good)
    await userEvent.click(screen.getByRole('button', { name: 'Read these rows' }))
    expect(await screen.findByText(/Read: what you pasted/)).toBeInTheDocument()
  })
})
