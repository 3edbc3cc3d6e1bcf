import type { Blinding } from './round-status.ts'

/** What must stand wherever the result appears (B9). */
export interface LabelFacts {
  blinding: Blinding
  levelMatching: 'measured' | 'by-ear' | 'not-matched' | null
  stewardListened: boolean
  publishesRows: boolean
  /** A link to the key, or to a half of it, was opened and then renewed: somebody may have looked before the keeper. */
  keyLinkRenewed: boolean
}

const blindingWords: Record<Blinding, string | null> = {
  double: null,
  single: 'Single-blind: whoever handed the units over knew which was which',
  split: 'Split key: two people prepared the pouches, neither knew which code hid which unit',
  imported: 'Imported ratings: Scrim did not run this round and cannot say how blind it was',
}
const levelWords: Record<string, string | null> = {
  measured: null,
  'by-ear': 'Levels matched by ear',
  'not-matched': 'Not level-matched',
}

/** The labels of a round, most serious first. */
export function roundLabels(facts: LabelFacts): string[] {
  return [
    blindingWords[facts.blinding],
    facts.levelMatching === null ? null : levelWords[facts.levelMatching],
    facts.keyLinkRenewed ? 'A link to the key was opened, and then renewed, during the round' : null,
    facts.stewardListened ? 'The steward also listened' : null,
    facts.publishesRows ? null : 'Ratings are not published row by row',
  ].filter((words) => words !== null && words !== undefined)
}
