import { render, screen, within } from '@testing-library/react'
import { userEvent } from '@testing-library/user-event'
import { expect, test, vi } from 'vitest'
import { DataTable } from './DataTable.tsx'
import type { Sort } from './DataTable.tsx'

const rows = [
  { unit: 'Dunlin', liked: 71 },
  { unit: 'Knot', liked: 55 },
]

const table = (sort: Sort | null, onSort: (sort: Sort) => void) => (
  <DataTable
    caption="Units compared"
    rows={rows}
    rowKey={(row) => row.unit}
    sort={sort}
    onSort={onSort}
    columns={[
      { key: 'unit', header: 'Unit', cell: (row) => row.unit, sortable: true },
      { key: 'liked', header: 'Liked, median', cell: (row) => row.liked, numeric: true, sortable: true },
    ]}
  />
)

test('a table names its rows and says how it is sorted', () => {
  render(table({ key: 'liked', direction: 'descending' }, () => undefined))
  const shown = screen.getByRole('table', { name: 'Units compared' })
  expect(
    within(shown)
      .getAllByRole('rowheader')
      .map((cell) => cell.textContent),
  ).toEqual(['Dunlin', 'Knot'])
  expect(within(shown).getByRole('columnheader', { name: 'Liked, median' })).toHaveAttribute(
    'aria-sort',
    'descending',
  )
  expect(within(shown).getByRole('columnheader', { name: 'Unit' })).not.toHaveAttribute('aria-sort')
})

test('a second press on a heading turns the order; another heading starts upwards', async () => {
  const user = userEvent.setup()
  const sorted = vi.fn()
  render(table({ key: 'unit', direction: 'ascending' }, sorted))
  await user.click(screen.getByRole('button', { name: 'Unit' }))
  expect(sorted).toHaveBeenLastCalledWith({ key: 'unit', direction: 'descending' })
  await user.click(screen.getByRole('button', { name: 'Liked, median' }))
  expect(sorted).toHaveBeenLastCalledWith({ key: 'liked', direction: 'ascending' })
})

test('on a phone, where headings are gone, a list of orders does the same', async () => {
  const user = userEvent.setup()
  const sorted = vi.fn()
  render(table(null, sorted))
  await user.selectOptions(screen.getByRole('combobox', { name: 'Sort by' }), 'Liked, median, down')
  expect(sorted).toHaveBeenLastCalledWith({ key: 'liked', direction: 'descending' })
})
