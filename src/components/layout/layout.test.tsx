import { render, screen } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { Link, MemoryRouter, Route, Routes } from 'react-router-dom'
import { expect, test } from 'vitest'
import { PageTitle } from '../ui/PageTitle.tsx'
import { RoundThread } from './RoundThread.tsx'
import { SeatLayout } from './SeatLayout.tsx'

test('a heading takes the focus after a way inside Scrim, not on the first page, and names the document', async () => {
  const user = userEvent.setup()
  render(
    <MemoryRouter initialEntries={['/rounds']}>
      <Link to="/units">Units</Link>
      <Routes>
        <Route path="/rounds" element={<PageTitle>Rounds</PageTitle>} />
        <Route path="/units" element={<PageTitle title="Units of the bench">Units</PageTitle>} />
      </Routes>
    </MemoryRouter>,
  )
  expect(screen.getByRole('heading', { level: 1 })).not.toHaveFocus()
  expect(document.title).toBe('Rounds · Scrim')
  await user.click(screen.getByRole('link', { name: 'Units' }))
  expect(screen.getByRole('heading', { name: 'Units' })).toHaveFocus()
  expect(document.title).toBe('Units of the bench · Scrim')
})

test('the round’s thread leads to the stops that can be visited and says which one is present', () => {
  render(
    <MemoryRouter>
      <RoundThread
        status="closed"
        stops={[
          { word: 'draft', to: '/plan' },
          { word: 'open', to: '/progress' },
          { word: 'closed', to: '/agreement' },
          { word: 'published' },
        ]}
      />
    </MemoryRouter>,
  )
  expect(screen.getAllByRole('link').map((link) => link.textContent)).toEqual(['draft', 'open'])
  expect(screen.getByText('closed').parentElement).toHaveAttribute('aria-current', 'step')
  expect(screen.getByText('published').closest('a')).toBeNull()
})

test('a listener’s screen says quietly what is kept, and can be skipped to', () => {
  render(<SeatLayout kept="saved on this phone · sent">Warmth</SeatLayout>)
  expect(screen.getByRole('status')).toHaveTextContent('saved on this phone · sent')
  expect(screen.getByRole('main')).toHaveAttribute('id', 'matter')
})
