import { describe, expect, it } from 'vitest'
import { byFamily, fromTheTop } from './by-family.ts'
import { heardRows, heardScale, listenersOf, threadUnits } from './chart-input.ts'
import { machines, unsaid } from './result.fixture.ts'

describe('what the pictures are given', () => {
  it('puts the highest unit on the first row and a unit without scores last', () => {
    expect(fromTheTop(machines.units).map((unit) => unit.unit)).toEqual(['C', 'B', 'A'])
    expect(fromTheTop([...unsaid.units].reverse()).map((unit) => unit.unit)).toEqual(['A', 'B'])
  })

  it('keeps the row of a unit that nobody rated, with what nobody could tell', () => {
    const rows = heardRows(unsaid)
    expect(rows.map(({ name, n, cantTell }) => [name, n, cantTell])).toEqual([
      ['A', 1, 0],
      ['B', 0, 1],
    ])
    expect(rows[0]).not.toHaveProperty('adjusted')
  })

  it('orders listener numbers as numbers, so that 10 comes after 2', () => {
    expect(listenersOf(machines)).toEqual(['1', '2', '10'])
  })

  it('runs a thread through the mean of what a listener heard twice', () => {
    const [a] = threadUnits(machines, ['1', '2', '10'])
    expect(a?.scores).toEqual([52.4, 51.8, 60])
  })

  it('leaves a unit without any score out of the threads', () => {
    expect(threadUnits(unsaid, ['1']).map((unit) => unit.name)).toEqual(['A'])
  })

  it('gives the picture a middle word only where the scale has one', () => {
    expect(heardScale(machines.descriptor)).not.toHaveProperty('midWord')
  })

  it('groups results under their families in the order of the scorecard', () => {
    expect(byFamily([machines, unsaid]).map((group) => group.family)).toEqual(['tonal-balance', 'timbre'])
  })
})
