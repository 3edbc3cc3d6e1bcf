/**
 * The descriptors that Scrim ships. Own wording over the attribute groups of Report ITU-R BS.2399 (read in a digest).
 * Scales run from 0 to 100; `sided: 'two'` has its middle at "about right" or "neutral".
 */
export const families = ['liking', 'tonal-balance', 'staging', 'timbre'] as const
export type Family = (typeof families)[number]

export const familyNames: Record<Family, string> = {
  liking: 'Overall liking',
  'tonal-balance': 'Tonal balance',
  staging: 'Staging',
  timbre: 'Timbre',
}

export interface LexiconEntry {
  key: string
  name: string
  family: Family
  sentence: string
  sided: 'one' | 'two'
  low: string
  middle: string | null
  high: string
  core: boolean
}

const entry = (
  key: string,
  name: string,
  family: Family,
  sentence: string,
  [low, middle, high]: readonly [string, string | null, string],
  core = false,
): LexiconEntry => ({
  key,
  name,
  family,
  sentence,
  sided: middle === null ? 'one' : 'two',
  low,
  middle,
  high,
  core,
})

export const liking: LexiconEntry = entry(
  'overall-liking',
  'Overall liking',
  'liking',
  'How much you like the sound as a whole',
  ['dislike', null, 'like very much'],
  true,
)

export const lexicon: readonly LexiconEntry[] = [
  entry(
    'deep-bass',
    'Deep bass',
    'tonal-balance',
    'How far down the lowest notes are still felt and heard',
    ['none', null, 'reaches right down'],
    true,
  ),
  entry(
    'bass-amount',
    'Bass amount',
    'tonal-balance',
    'How much bass guitar and kick there is against the rest',
    ['lean', 'about right', 'heavy'],
    true,
  ),
  entry('bass-control', 'Bass control', 'timbre', 'Whether bass notes start and stop cleanly', [
    'loose, lingering',
    null,
    'tight, quick',
  ]),
  entry(
    'warmth',
    'Warmth',
    'tonal-balance',
    'Fullness of low voices and cello',
    ['cool, thin', 'neutral', 'warm, thick'],
    true,
  ),
  entry('note-weight', 'Note weight', 'timbre', 'Felt body and size of each single note', [
    'light',
    'neutral',
    'weighty',
  ]),
  entry(
    'voice-position',
    'Voice position',
    'tonal-balance',
    'Where the singer stands against the band',
    ['set back', 'level with it', 'pushed forward'],
    true,
  ),
  entry(
    'upper-mid-bite',
    'Upper-mid bite',
    'tonal-balance',
    'Edge on loud voices, brass and guitar',
    ['soft, veiled', 'neutral', 'shouty'],
    true,
  ),
  entry('s-sounds', 'S-sounds', 'tonal-balance', 'Hiss on s, t and cymbals', [
    'smooth',
    null,
    'splashy, hissing',
  ]),
  entry(
    'brightness',
    'Brightness',
    'tonal-balance',
    'The overall lean from dark to bright',
    ['dark', 'neutral', 'bright'],
    true,
  ),
  entry('air', 'Air', 'tonal-balance', 'Openness and shimmer above the cymbals', [
    'shut in',
    null,
    'open, airy',
  ]),
  entry(
    'width',
    'Width',
    'staging',
    'How far sounds spread left and right',
    ['inside the head', null, 'well outside the ears'],
    true,
  ),
  entry('height', 'Height', 'staging', 'Vertical size of the picture', ['flat strip', null, 'tall']),
  entry('depth', 'Depth', 'staging', 'Distance between near and far sounds', [
    'all at one distance',
    null,
    'near and far',
  ]),
  entry('layering', 'Layering', 'staging', 'Whether you can follow several rows of sounds at once', [
    'single sheet',
    null,
    'many rows',
  ]),
  entry(
    'placement',
    'Placement',
    'staging',
    'Whether you can point to each sound',
    ['vague', null, 'pin-point'],
    true,
  ),
  entry('separation', 'Separation', 'staging', 'Whether busy passages stay apart', [
    'blended',
    null,
    'distinct',
  ]),
  entry(
    'resolution',
    'Resolution',
    'timbre',
    'Small details, tails and room sounds you can hear',
    ['smeared', null, 'revealing'],
    true,
  ),
  entry(
    'natural-tone',
    'Natural tone',
    'timbre',
    'Whether instruments and voices sound real',
    ['artificial', null, 'lifelike'],
    true,
  ),
]

/** The short scorecard for an evening: liking first, then five lines. */
export const shortScorecard: readonly string[] = [
  'bass-amount',
  'voice-position',
  'brightness',
  'width',
  'natural-tone',
]
/** The ten core descriptors. */
export const coreScorecard: readonly string[] = lexicon.filter((one) => one.core).map((one) => one.key)

const byKey = new Map([liking, ...lexicon].map((one) => [one.key, one]))
/** The lexicon's entry with this key, or undefined. */
export const lexiconEntry = (key: string): LexiconEntry | undefined => byKey.get(key)
