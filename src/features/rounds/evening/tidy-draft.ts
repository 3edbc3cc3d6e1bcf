import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import { limits } from '#shared/domain/limits.ts'

const isEmpty = (text: string): boolean => text.trim() === ''

/** Rows that nobody filled in are left out, as long as enough are left to say what is missing in them. */
function withoutEmpty<T>(rows: readonly T[], empty: (row: T) => boolean, least: number): T[] {
  const filled = rows.filter((row) => !empty(row))
  const missing = Math.max(0, least - filled.length)
  let kept = 0
  return rows.filter((row) => !empty(row) || (kept += 1) <= missing)
}

type KnownUnit = { id: string; maker: string; name: string }
const spoken = ({ maker, name }: { maker: string; name: string }): string =>
  `${maker.trim()}\n${name.trim()}`.toLocaleLowerCase('en')

/** A draft as it is sent: without empty rows, and with units that the panel knows named by their own id. */
export function tidyDraft(draft: EveningDraftInput, known: readonly KnownUnit[] = []): EveningDraftInput {
  const ids = new Map(known.map((unit) => [spoken(unit), unit.id]))
  const { eveningUnits, eveningListeners } = limits
  const units = withoutEmpty(
    draft.units,
    (unit) => isEmpty(unit.maker) && isEmpty(unit.name),
    eveningUnits.least,
  )
  return {
    ...draft,
    units: units.map(({ id, ...unit }) => {
      const own = ids.get(spoken(unit)) ?? (known.length === 0 ? id : undefined)
      return own ? { id: own, ...unit } : unit
    }),
    people: withoutEmpty(
      draft.people,
      (person) => isEmpty(person.name) && !person.you,
      eveningListeners.least,
    ),
    tracks: (draft.tracks ?? []).filter((track) => !isEmpty(track)),
  }
}
