import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import { kept, type Kept } from '#src/lib/kept.ts'

/** What this tab keeps of an evening that is being typed; `of` is a panel's slug or a round's id. */
export const keptEvening = (of: string): Kept<EveningDraftInput> => kept<EveningDraftInput>(`evening.${of}`)

/** What was kept, laid over a blank evening so that a shape from before an update does no harm. */
export function takenUp(blank: EveningDraftInput, found: EveningDraftInput | undefined): EveningDraftInput {
  if (!found || !Array.isArray(found.units) || !Array.isArray(found.people)) return blank
  return { ...blank, ...found, tracks: Array.isArray(found.tracks) ? found.tracks : [] }
}
