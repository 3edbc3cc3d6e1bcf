import type { z } from 'zod'
import type { unitFacts } from '#shared/contracts/verdicts.ts'
import { unitsOf } from '#server/features/rounds/facts-service.ts'
import { putOnRecord } from '#server/features/record/service.ts'
import { fieldError, notFound, staleEdit } from '#server/http/api-error.ts'
import type { Context } from '#server/http/context.ts'
import { Photo } from '#server/models/photo.ts'
import type { Round } from '#server/models/round.ts'
import { RoundUnit } from '#server/models/round-unit.ts'
import { Unit } from '#server/models/unit.ts'
import { readPhoto } from '#server/uploads/photo.ts'
import type { UnitRow } from './presenter.ts'

/** The round's units with what readers must know of them. */
export async function unitRows(round: Round): Promise<UnitRow[]> {
  const units = await unitsOf(round)
  const photos = await Photo.findAll({
    where: { id: units.flatMap((unit) => (unit.photoId ? [unit.photoId] : [])) },
    attributes: ['id', 'width', 'height'],
  })
  return units.map((unit) => {
    const photo = photos.find((one) => one.id === unit.photoId)
    return {
      id: unit.id,
      maker: unit.maker,
      name: unit.name,
      provenance: unit.provenance ?? null,
      lender: unit.lender ?? null,
      returnOn: unit.returnOn ?? null,
      disclosure: unit.disclosure ?? null,
      priceMinor: unit.priceMinor ?? null,
      priceCurrency: unit.priceCurrency ?? null,
      priceOn: unit.priceOn ?? null,
      priceUnknown: unit.priceUnknown,
      version: unit.version,
      photo: photo ? { id: photo.id, width: photo.width, height: photo.height } : null,
    }
  })
}

async function lockUnit(round: Round, id: string): Promise<Unit> {
  const link = await RoundUnit.findOne({ where: { roundId: round.id, unitId: id } })
  const unit = link && (await Unit.findByPk(id, { lock: true }))
  if (!unit) throw notFound()
  return unit
}

export async function writeFacts(
  context: Context,
  round: Round,
  unitId: string,
  facts: z.output<typeof unitFacts>,
): Promise<void> {
  const unit = await lockUnit(round, unitId)
  if (context.version !== unit.version)
    throw staleEdit((await unitRows(round)).find((one) => one.id === unitId))
  await unit.update({
    provenance: facts.provenance,
    lender: facts.lender || null,
    returnOn: facts.returnOn,
    disclosure: facts.disclosure,
    priceMinor: facts.price ? String(facts.price.minor) : null,
    priceCurrency: facts.price?.currency ?? null,
    priceOn: facts.price?.on ?? null,
    priceUnknown: facts.price === null && facts.priceUnknown,
    version: unit.version + 1,
  })
  await putOnRecord(context, 'unit facts written', { roundId: round.id, facts: { unit: unit.id } })
}

export async function writePhoto(context: Context, round: Round, unitId: string): Promise<void> {
  const unit = await lockUnit(round, unitId)
  const file = context.request.file
  if (!file) throw fieldError('photo', 'Choose a picture.')
  const photo = await readPhoto(file.buffer)
  const id = context.deps.random.id()
  await Photo.create({ panelId: unit.panelId, id, ...photo, createdAt: context.now })
  await unit.update({ photoId: id, version: unit.version + 1 })
}

export async function dropPhoto(round: Round, unitId: string): Promise<void> {
  const unit = await lockUnit(round, unitId)
  if (unit.photoId) await unit.update({ photoId: null, version: unit.version + 1 })
}
