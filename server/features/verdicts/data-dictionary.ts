import type { PublicVerdict } from '#shared/contracts/verdicts.ts'

/** What each column of the ratings file holds; stands beside it as plain text. */
export function dictionary(verdict: PublicVerdict): string {
  const scales = verdict.method.scorecard.map(
    (one) =>
      `  ${one.name}: ${one.sentence}. ${one.scale.low} = ${one.words.low}; ${one.scale.high} = ${one.words.high}${one.words.middle ? `; the middle = ${one.words.middle}` : ''}.`,
  )
  return `Data dictionary of ratings.csv
Verdict ${verdict.number}: ${verdict.headline}
Panel: ${verdict.panelName}. Version ${verdict.version}, ${verdict.publishedAt.slice(0, 10)}.

UTF-8, comma between fields, one header line, lines end in LF. One line is one answer.
panelist    listener number; drawn for this file and kept in the key until closing. Not a name, a seat or an order.
unit        the unit's name; the key names specimens by id.
descriptor  what was rated.
replicate   1 for the first serving of a unit, 2 where it came back.
position    1 for the first unit a listener heard, and so on; empty where it is not known.
score       the rating; empty where none was given.
code        the three digits under which the listener had the unit; the key file holds the same triples.
cant_tell   yes where the listener answered "I can't tell".

Scales
${scales.join('\n')}

SHA-256 of ratings.csv, fixed when the round closed: ${verdict.fingerprints.ratings ?? 'none'}
`
}
