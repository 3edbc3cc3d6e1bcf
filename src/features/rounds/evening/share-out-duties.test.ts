import { describe, expect, it } from 'vitest'
import { eveningDraft } from '#shared/contracts/evening-draft.ts'
import { blankEvening } from './blank-evening.ts'
import { giveDuty, holderOf, withDuties, type DraftPerson, type Tagging } from './share-out-duties.ts'

const people = (count: number): DraftPerson[] =>
  Array.from({ length: count }, (_, nth) => ({
    name: `Person ${nth + 1}`,
    listens: true,
    duty: 'none' as const,
    steward: false,
    you: nth === 0,
  }))

const evening = (tagging: Tagging, count: number) => ({
  ...blankEvening('Ines', new Date('2026-12-01T18:00:00Z'), 'UTC'),
  units: ['Dunlin', 'Knot', 'Avocet'].map((name) => ({ maker: 'Lantern Reed', name })),
  tagging,
  people: withDuties(people(count), tagging),
})

describe('who does what, before anybody chooses', () => {
  it.each([
    ['split', 2],
    ['split', 3],
    ['split', 7],
    ['keeper', 3],
    ['keeper', 7],
    ['single', 3],
    ['single', 7],
  ] as const)('makes a %s evening of %i people that the contract takes', (tagging, count) => {
    expect(eveningDraft.safeParse(evening(tagging, count)).error?.issues).toBeUndefined()
  })

  it('lets everybody listen under a split key, and spares the organiser the pouches', () => {
    const shared = withDuties(people(4), 'split')
    expect(shared.every((person) => person.listens)).toBe(true)
    expect(holderOf(shared, 'letters')).not.toBe(holderOf(shared, 'codes'))
    expect(shared[0]?.duty).toBe('none')
    expect(holderOf(shared, 'steward')).toBe(0)
  })
})

describe('a change of the way of tagging', () => {
  it('gives whoever kept the code their seat back', () => {
    const kept = withDuties(people(4), 'keeper')
    expect(kept[holderOf(kept, 'keeper')]?.listens).toBe(false)
    expect(withDuties(kept, 'split').every((person) => person.listens)).toBe(true)
  })

  it('parts keeper and steward again after a single-blind round', () => {
    const parted = withDuties(withDuties(people(4), 'single'), 'keeper')
    expect(holderOf(parted, 'steward')).not.toBe(holderOf(parted, 'keeper'))
  })

  it('leaves those who were chosen in their duty', () => {
    const chosen = giveDuty(withDuties(people(5), 'split'), 'letters', 4, 'split')
    expect(holderOf(withDuties(chosen, 'split'), 'letters')).toBe(4)
  })
})

it('hands a duty on when its holder leaves', () => {
  const shared = withDuties(people(4), 'split')
  const left = shared.filter((_, nth) => nth !== holderOf(shared, 'letters'))
  expect(holderOf(withDuties(left, 'split'), 'letters')).toBeGreaterThanOrEqual(0)
})
