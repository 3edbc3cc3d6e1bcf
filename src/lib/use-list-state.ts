import { useSearchParams } from 'react-router-dom'

export interface SortState {
  key: string
  direction: 'ascending' | 'descending'
}

/** How a list is sorted and filtered, kept in the address so that it can be shared, reloaded and gone back to. */
export function useListState(initial: SortState) {
  const [search, setSearch] = useSearchParams()
  const put = (name: string, value: string) =>
    setSearch(
      (now) => {
        const next = new URLSearchParams(now)
        if (value === '') next.delete(name)
        else next.set(name, value)
        return next
      },
      { replace: true },
    )
  const key = search.get('by') ?? initial.key
  const direction: SortState['direction'] = search.has('by')
    ? search.get('way') === 'down'
      ? 'descending'
      : 'ascending'
    : initial.direction
  return {
    sort: { key, direction },
    onSort: (sort: SortState) =>
      setSearch(
        (now) => {
          const next = new URLSearchParams(now)
          next.set('by', sort.key)
          next.set('way', sort.direction === 'descending' ? 'down' : 'up')
          return next
        },
        { replace: true },
      ),
    words: search.get('find') ?? '',
    onWords: (words: string) => put('find', words),
  }
}

type Value = string | number

/** Rows whose text holds the words, sorted by the value that `of` names; text as people sort it. */
export function sorted<Row>(
  rows: readonly Row[],
  { key, direction }: SortState,
  of: Record<string, (row: Row) => Value>,
): Row[] {
  const value = of[key]
  if (!value) return [...rows]
  const sign = direction === 'ascending' ? 1 : -1
  return [...rows].sort((a, b) => {
    const [x, y] = [value(a), value(b)]
    return (
      sign *
      (typeof x === 'number' && typeof y === 'number'
        ? x - y
        : String(x).localeCompare(String(y), 'en', { numeric: true, sensitivity: 'base' }))
    )
  })
}

/** Whether every typed word stands somewhere in the text. */
export const holds = (text: string, words: string): boolean =>
  words
    .toLocaleLowerCase('en')
    .split(/\s+/)
    .every((word) => text.toLocaleLowerCase('en').includes(word))
