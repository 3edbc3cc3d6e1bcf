import { lexicon, liking } from '#shared/domain/lexicon.ts'
import type { RatingsFile } from '#shared/domain/ratings-file.ts'
import type { Context } from '#server/http/context.ts'
import { Descriptor } from '#server/models/descriptor.ts'
import { Scorecard } from '#server/models/scorecard.ts'

const shipped = [liking, ...lexicon]
const known = (name: string) =>
  shipped.find((entry) => entry.name.toLocaleLowerCase('en') === name.trim().toLocaleLowerCase('en'))

/**
 * A scorecard from the file's descriptors. The scale is the file's own range; a descriptor of the lexicon whose scores
 * all fit 0–100 keeps that scale, so that a published file comes back as it was.
 */
export async function importScorecard(
  context: Context,
  panelId: string,
  file: RatingsFile,
): Promise<{ scorecardId: string; idOf: Map<string, string>; keyOf: Map<string, string> }> {
  const scorecardId = context.deps.random.id()
  await Scorecard.create({ panelId, id: scorecardId, name: 'Imported', createdAt: context.now })
  // Overall liking first, then as the lexicon has them, then the file's own.
  const placeOf = (name: string): number => {
    const place = shipped.findIndex((entry) => entry === known(name))
    return place < 0 ? shipped.length : place
  }
  const ordered = [...file.descriptors].sort((a, b) => placeOf(a) - placeOf(b))
  const rows = ordered.map((name, place) => {
    const entry = known(name)
    const range = file.ranges.find((one) => one.name === name) ?? { low: 0, high: 1 }
    const ownScale =
      entry && range.low >= 0 && range.high <= 100 && range.high > 20
        ? { low: 0, high: 100 }
        : { low: range.low, high: range.high > range.low ? range.high : range.low + 1 }
    return {
      panelId,
      id: context.deps.random.id(),
      scorecardId,
      place,
      key: entry?.key ?? `d${place + 1}`,
      name,
      sentence: entry?.sentence ?? 'As the imported file names it',
      family: entry?.family ?? ('timbre' as const),
      scaleLow: ownScale.low,
      scaleHigh: ownScale.high,
      step: (ownScale.high - ownScale.low) / 100,
      sided: entry?.sided ?? ('one' as const),
      lowWords: entry?.low ?? 'lower',
      middleWords: entry?.middle ?? null,
      highWords: entry?.high ?? 'higher',
    }
  })
  await Descriptor.bulkCreate(rows)
  return {
    scorecardId,
    idOf: new Map(rows.map((row) => [row.name, row.id])),
    keyOf: new Map(rows.map((row) => [row.name, row.key])),
  }
}
