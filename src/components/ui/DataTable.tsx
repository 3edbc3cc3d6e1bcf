// The roles are written out because the phone's list (display: block) takes them away from a table's elements.
/* eslint-disable jsx-a11y/no-redundant-roles, jsx-a11y/no-interactive-element-to-noninteractive-role */
import type { ReactNode } from 'react'
import { Icon } from '../Icon.tsx'
import { SelectField } from './SelectField.tsx'

export interface Column<Row> {
  key: string
  header: string
  /** What stands in the column's head instead of the plain name, where that is a picture's ends or a sign. */
  head?: ReactNode
  cell: (row: Row) => ReactNode
  /** Numbers stand at the right, digits under digits. */
  numeric?: boolean
  sortable?: boolean
  /** The column that names the row: a row header, and the entry's heading on a phone. The first unless said. */
  names?: boolean
}

export interface Sort {
  key: string
  direction: 'ascending' | 'descending'
}

interface DataTableProps<Row> {
  caption: string
  captionHidden?: boolean
  columns: Column<Row>[]
  rows: Row[]
  rowKey: (row: Row) => string
  /** How the rows are sorted now; the caller sorts them and keeps this in the address. */
  sort?: Sort | null
  onSort?: (sort: Sort) => void
  /** close: for the table behind a picture. */
  density?: 'open' | 'close'
  /** Stays a table on a phone (few narrow columns); it then scrolls sideways if it must. */
  stays?: boolean
}

const turned = (sort: Sort | null | undefined, key: string): Sort => ({
  key,
  direction: sort?.key === key && sort.direction === 'ascending' ? 'descending' : 'ascending',
})

/** A table that becomes a list on a phone. */
export function DataTable<Row>(props: DataTableProps<Row>) {
  const { caption, captionHidden, columns, rows, rowKey, sort, onSort, density = 'open', stays } = props
  const naming = columns.find((column) => column.names) ?? columns[0]
  const sortable = onSort ? columns.filter((column) => column.sortable) : []
  const table = (
    <table className="data-table" role="table" data-density={density} data-stays={stays || undefined}>
      <caption>{captionHidden ? <span className="visually-hidden">{caption}</span> : caption}</caption>
      <thead role="rowgroup">
        <tr role="row">
          {columns.map((column) => (
            <th
              key={column.key}
              role="columnheader"
              scope="col"
              data-numeric={column.numeric || undefined}
              aria-sort={sort?.key === column.key ? sort.direction : undefined}
            >
              {column.sortable && onSort ? (
                <button
                  type="button"
                  className="data-table-sort"
                  onClick={() => onSort(turned(sort, column.key))}
                >
                  {column.header}
                  {sort?.key === column.key && (
                    <Icon name={sort.direction === 'ascending' ? 'up' : 'down'} size={14} />
                  )}
                </button>
              ) : (
                (column.head ?? column.header)
              )}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {rows.map((row) => (
          <tr key={rowKey(row)} role="row">
            {columns.map((column) =>
              column === naming ? (
                <th key={column.key} role="rowheader" scope="row" data-numeric={column.numeric || undefined}>
                  {column.cell(row)}
                </th>
              ) : (
                <td key={column.key} role="cell" data-numeric={column.numeric || undefined}>
                  <span className="data-table-cell-name" aria-hidden="true">
                    {column.header}
                  </span>
                  <span>{column.cell(row)}</span>
                </td>
              ),
            )}
          </tr>
        ))}
      </tbody>
    </table>
  )
  return (
    <>
      {onSort && sortable.length > 0 && !stays && (
        <div className="data-table-sort-phone">
          <SelectField
            label="Sort by"
            value={sort ? `${sort.key} ${sort.direction}` : ''}
            placeholder={sort ? undefined : 'As they come'}
            options={sortable.flatMap((column) => [
              { value: `${column.key} ascending`, label: `${column.header}, up` },
              { value: `${column.key} descending`, label: `${column.header}, down` },
            ])}
            onChange={(event) => {
              const [key, direction] = event.target.value.split(' ')
              if (key && (direction === 'ascending' || direction === 'descending')) onSort({ key, direction })
            }}
          />
        </div>
      )}
      {stays ? (
        // A region that scrolls must be reachable by keyboard.
        // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex
        <div className="data-table-scroll" role="region" aria-label={caption} tabIndex={0}>
          {table}
        </div>
      ) : (
        table
      )}
    </>
  )
}
