/** Sentences that Scrim writes from the numbers. Every "between … and …" is a simultaneous 95 % interval. */

export interface WordedPair {
  a: string
  b: string
  difference: number
  low: number
  high: number
}

export interface WordedScale {
  name: string
  low: number
  high: number
  lowWords: string
  highWords: string
}

/** A number in points of a scale, with no more decimals than the scale can bear. */
export function points(value: number, scale: Pick<WordedScale, 'low' | 'high'>): string {
  const span = scale.high - scale.low
  const decimals = span >= 50 ? 0 : span >= 5 ? 1 : 2
  const text = value.toFixed(decimals)
  return Number(text) === 0 ? (0).toFixed(decimals) : text
}

/** The pair whose adjusted means lie furthest apart, turned so that the difference is positive. */
export function widestPair(pairs: readonly WordedPair[]): WordedPair | null {
  let widest: WordedPair | null = null
  for (const pair of pairs)
    if (!widest || Math.abs(pair.difference) > Math.abs(widest.difference)) widest = pair
  if (!widest || widest.difference >= 0) return widest
  return { a: widest.b, b: widest.a, difference: -widest.difference, low: -widest.high, high: -widest.low }
}

/** The larger end in size of any pair's simultaneous interval: larger differences are unlikely. */
export const largestAllowed = (pairs: readonly WordedPair[]): number =>
  Math.max(...pairs.map((pair) => Math.max(Math.abs(pair.low), Math.abs(pair.high))))

/**
 * What may be said of one descriptor: its widest pair where the test of units holds and that pair's interval leaves 0
 * out, else that no difference was found and what the data exclude.
 *
 * @param unitsDiffer whether the descriptor's own test of units holds (p < .05)
 */
export function differenceSentence(
  scale: WordedScale,
  pairs: readonly WordedPair[],
  unitsDiffer: boolean,
): string {
  const widest = widestPair(pairs)
  if (!widest) return 'Differences between units cannot be worked out here.'
  if (unitsDiffer && widest.low > 0) {
    const by = `${points(widest.difference, scale)}, between ${points(widest.low, scale)} and ${points(widest.high, scale)}`
    return `${widest.a} lies further towards “${scale.highWords}” than ${widest.b}; difference ${by}.`
  }
  return `No difference found; differences larger than ${points(largestAllowed(pairs), scale)} are unlikely.`
}

/** The same as a sentence of a verdict: "Width: Dunlin lies further towards …". */
export const verdictSentence = (scale: WordedScale, difference: string, hint: boolean): string =>
  `${scale.name}: ${difference.replace(/^No difference/, 'no difference').replace(/^Differences/, 'differences')}${hint ? ' As a hint only.' : ''}`

/** What no interval covers; stands beside every result. */
export const scopeSentences: readonly string[] = [
  'The intervals say where other listeners like these would put these units, with these specimens, tips, tracks and this chain.',
  'The listeners were not drawn at random, and one specimen stands for its model.',
  'Nothing here says how a unit sounds in other ears, with another seal or at another level.',
]
