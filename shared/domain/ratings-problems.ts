export const problemReasons = [
  'empty-file',
  'not-a-text-file',
  'missing-column',
  'column-twice',
  'no-rows',
  'too-many-rows',
  'too-many-units',
  'unclosed-quote',
  'too-few-fields',
  'too-many-fields',
  'empty-name',
  'too-long',
  'unreadable-letters',
  'not-a-number',
  'number-too-large',
  'position-not-a-count',
  'cant-tell-not-yes-or-no',
  'cant-tell-with-score',
  'duplicate',
] as const

export type ProblemReason = (typeof problemReasons)[number]

/** One fault of a ratings file, as its preview lists it. */
export interface FileProblem {
  /** Line of the file, from 1. */
  readonly line: number
  /** Column's name, or null where the whole line or file is meant. */
  readonly column: string | null
  readonly reason: ProblemReason
  /** A sentence for the person who brought the file. */
  readonly text: string
}

/** What was found, short enough for a sentence. */
export const shown = (value: string): string =>
  `“${[...value].length > 30 ? `${[...value].slice(0, 30).join('')}…` : value}”`

/**
 * @example
 * problem(3, 'score', 'not-a-number', 'The score “x” is not a number.').line // => 3
 */
export const problem = (
  line: number,
  column: string | null,
  reason: ProblemReason,
  text: string,
): FileProblem => ({ line, column, reason, text })
