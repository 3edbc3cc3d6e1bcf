import { familyNames, families, type Family } from '#shared/domain/lexicon.ts'
import type { Descriptor } from '#shared/contracts/scorecard.ts'

export const mostLines = 4

/** One screen of rating lines: one family, at most four lines. */
export interface FamilyScreen {
  family: Family
  /** Which screen of its family, counted from 1, and how many the family has. */
  part: number
  parts: number
  lines: readonly Descriptor[]
}

/** Splits a list into as few runs of at most `most` as possible, as even as possible: 5 lines become 3 and 2. */
export function evenRuns<T>(list: readonly T[], most: number): T[][] {
  const runs = Math.ceil(list.length / most)
  const short = Math.floor(list.length / runs)
  const longer = list.length % runs
  let from = 0
  return Array.from({ length: runs }, (_, nth) => {
    const to = from + short + (nth < longer ? 1 : 0)
    const run = list.slice(from, to)
    from = to
    return run
  })
}

/** The scorecard as screens: overall liking first and alone, then family after family in the lexicon's order. */
export function familyScreens(scorecard: readonly Descriptor[]): FamilyScreen[] {
  return families.flatMap((family) => {
    const lines = scorecard.filter((line) => line.family === family)
    if (lines.length === 0) return []
    const runs = evenRuns(lines, mostLines)
    return runs.map((run, nth) => ({ family, part: nth + 1, parts: runs.length, lines: run }))
  })
}

/** The families that still follow a screen, each once: "tonal balance", "staging". */
export function laterFamilies(screens: readonly FamilyScreen[], at: number): string[] {
  const here = screens[at]?.family
  const later = screens.slice(at + 1).map(({ family }) => family)
  return [...new Set(later)]
    .filter((family) => family !== here)
    .map((family) => familyNames[family].toLowerCase())
}

/** "staging", or "staging, 2 of 2": how a verb names a screen. */
export function screenName(screen: FamilyScreen): string {
  const name = screen.family === 'liking' ? 'overall liking' : familyNames[screen.family].toLowerCase()
  return screen.parts > 1 ? `${name}, ${screen.part} of ${screen.parts}` : name
}
