import { createHash } from 'node:crypto'
import { writeRatingsFile } from '#shared/domain/ratings-file.ts'
import { unitNames } from '#shared/domain/unit-names.ts'
import { descriptorsOf, unitsOf } from '#server/features/rounds/facts-service.ts'
import type { Context } from '#server/http/context.ts'
import type { Round } from '#server/models/round.ts'
import { countedRatings } from './ratings-service.ts'

/**
 * Writes the round's ratings file and fixes its fingerprint: listener numbers, codes, units by name, no seat, sitting or
 * time (B7). Called in the transaction that closes the round, before anybody can see the key.
 */
export async function fixRatingsFile(context: Context, round: Round): Promise<void> {
  const names = unitNames(await unitsOf(round))
  const descriptors = new Map((await descriptorsOf(round)).map((one) => [one.key, one.name]))
  const ratings = await countedRatings(context, round)
  const text = writeRatingsFile(
    ratings.map((one) => ({
      panelist: String(one.listener),
      unit: names.get(one.unitId) ?? '',
      descriptor: descriptors.get(one.descriptor) ?? one.descriptor,
      replicate: one.replicate,
      position: one.position,
      score: one.value,
      cantTell: one.cantTell,
      code: one.code === '' ? null : one.code,
    })),
  )
  await round.update({
    ratingsFile: text,
    ratingsFingerprint: createHash('sha256').update(text, 'utf8').digest('hex'),
  })
}
