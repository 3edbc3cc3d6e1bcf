import type { Fault } from '#src/lib/form-faults.ts'
import type { UnitFactsInput, VerdictDraft } from '#shared/contracts/verdicts.ts'

type Unit = VerdictDraft['units'][number]

/** The id of a unit's entry on the desk; the list of what is missing links to it. */
export const unitField = (nth: number, field: string): string => `units.${nth}.${field}`

/** Faults of one unit's form under the ids that its entries have on the desk. */
export const atUnit = (faults: readonly Fault[], nth: number): Fault[] =>
  faults.map(({ field, message }) => ({
    field: unitField(nth, field === 'price.minor' ? 'price' : field),
    message,
  }))

/** What is known of a unit, as its form takes it. */
export const factsOf = (unit: Unit): Partial<UnitFactsInput> => ({
  ...(unit.provenance === null ? {} : { provenance: unit.provenance }),
  lender: unit.lender ?? '',
  returnOn: unit.returnOn,
  disclosure: unit.disclosure ?? '',
  price: unit.price,
  priceUnknown: unit.priceUnknown,
})

/** The one sentence of a correction, from its two halves. */
export const correctionWords = (wrong: string, right: string): string =>
  `Wrong: ${wrong.trim()} Right: ${right.trim()}`

/** Why the verb "publish" is off, or null. Unsaved words would not be published. */
export function cannotPublish(draft: VerdictDraft, unsaved: readonly string[]): string | null {
  if (unsaved.length > 0) return `Keep what you changed first: ${unsaved.join(', ')}.`
  if (draft.missing.length > 0)
    return draft.missing.length === 1
      ? 'One thing is missing, see above.'
      : `${draft.missing.length} things are missing, see above.`
  return draft.can.publish ? null : 'Only the organiser of this round publishes it.'
}
