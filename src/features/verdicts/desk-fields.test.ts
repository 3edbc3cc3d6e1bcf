import { describe, expect, it } from 'vitest'
import { atUnit, cannotPublish, correctionWords, factsOf } from './desk-fields.ts'
import { exampleDraft } from './draft.fixture.ts'

describe('the desk before publishing', () => {
  it('links a fault to the entry of its unit', () => {
    expect(
      atUnit(
        [
          { field: 'price.minor', message: 'a' },
          { field: 'price.currency', message: 'b' },
        ],
        2,
      ).map((fault) => fault.field),
    ).toEqual(['units.2.price', 'units.2.price.currency'])
  })

  it('leaves an unanswered provenance unanswered', () => {
    const [unit] = exampleDraft.units
    if (!unit) throw new Error('The example has units.')
    expect(factsOf({ ...unit, provenance: null })).not.toHaveProperty('provenance')
    expect(factsOf({ ...unit, provenance: 'gift' }).provenance).toBe('gift')
  })

  it('holds publishing back for unsaved words first, then for what is missing', () => {
    expect(cannotPublish(exampleDraft, ['Dunlin'])).toBe('Keep what you changed first: Dunlin.')
    expect(cannotPublish(exampleDraft, [])).toMatch(/things are missing/)
    const complete = { ...exampleDraft, missing: [] }
    expect(cannotPublish(complete, [])).toBeNull()
    expect(cannotPublish({ ...complete, can: { publish: false } }, [])).toMatch(/Only the organiser/)
  })

  it('says of a correction what was wrong and what is right', () => {
    expect(correctionWords(' Knot was on loan. ', 'Knot was bought.')).toBe(
      'Wrong: Knot was on loan. Right: Knot was bought.',
    )
  })
})
