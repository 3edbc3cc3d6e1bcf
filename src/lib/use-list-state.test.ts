import { expect, it } from 'vitest'
import { holds, sorted } from './use-list-state.ts'

const rows = [
  { name: 'Round 10', listeners: 3 },
  { name: 'round 2', listeners: 14 },
]
const of = { name: (row: (typeof rows)[0]) => row.name, listeners: (row: (typeof rows)[0]) => row.listeners }

it('sorts text as people do and numbers as numbers, both ways', () => {
  const names = (key: string, direction: 'ascending' | 'descending') =>
    sorted(rows, { key, direction }, of).map((row) => row.name)
  expect(names('name', 'ascending')).toEqual(['round 2', 'Round 10'])
  expect(names('listeners', 'ascending')).toEqual(['Round 10', 'round 2'])
  expect(names('listeners', 'descending')).toEqual(['round 2', 'Round 10'])
  expect(names('colour', 'descending')).toEqual(['Round 10', 'round 2'])
})

it('finds rows that hold every typed word, whatever its case', () => {
  expect(holds('Lantern Reed Dunlin', 'dun lantern')).toBe(true)
  expect(holds('Lantern Reed Dunlin', 'dun knot')).toBe(false)
  expect(holds('Lantern Reed Dunlin', '')).toBe(true)
})
