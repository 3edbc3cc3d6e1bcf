import { expect, it } from 'vitest'
import { blankEvening } from './blank-evening.ts'
import { tidyDraft } from './tidy-draft.ts'

const blank = blankEvening('Ines', new Date('2026-12-01T18:00:00Z'), 'UTC')

it('leaves empty rows out, but keeps as many as must be filled in', () => {
  const units = [{ maker: 'Lantern Reed', name: 'Dunlin' }, ...blank.units, { maker: ' ', name: '' }]
  const tidy = tidyDraft({ ...blank, units, tracks: ['A choir', '', ' '] })
  expect(tidy.units).toHaveLength(3)
  expect(tidy.units[0]?.name).toBe('Dunlin')
  expect(tidy.people.map((person) => person.name)).toEqual(['Ines', ''])
  expect(tidy.tracks).toEqual(['A choir'])
})

it('keeps a row that is half filled in', () => {
  const units = [...blank.units, { maker: '', name: 'Knot' }]
  expect(tidyDraft({ ...blank, units }).units.map((unit) => unit.name)).toContain('Knot')
})

it('names a unit that the panel knows by its own id, whatever its case', () => {
  const id = '33333333-3333-4333-8333-333333333333'
  const units = [{ maker: 'lantern reed', name: 'DUNLIN ' }, ...blank.units.slice(1)]
  const tidy = tidyDraft({ ...blank, units }, [{ id, maker: 'Lantern Reed', name: 'Dunlin' }])
  expect(tidy.units[0]?.id).toBe(id)
  expect(tidy.units[1]?.id).toBeUndefined()
})
