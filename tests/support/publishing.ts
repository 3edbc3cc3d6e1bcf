import { randomUUID } from 'node:crypto'
import { closeRound, getRound } from '#shared/contracts/rounds.ts'
import { getVerdictDraft, publishVerdict, saveUnitFacts, saveVerdict } from '#shared/contracts/verdicts.ts'
import type { OpenEvening } from './evening.ts'
import type { Visitor } from './visitor.ts'

export const factsOfUnit = {
  provenance: 'bought',
  disclosure: 'Bought by the panel at the usual price.',
  price: { minor: 5400, currency: 'EUR', on: '2031-03-01' },
} as const

/** Everything that is asked before publishing. */
export async function fillDesk(organiser: Visitor, at: { panel: string; round: string }): Promise<void> {
  const desk = await organiser.call(getVerdictDraft, { params: { panel: at.panel, round: at.round } })
  await organiser.call(saveVerdict, {
    params: { panel: at.panel, round: at.round },
    version: desk.version,
    body: { headline: 'Small ones, heard on one evening', summary: 'Nobody knew which was which.' },
  })
  for (const unit of desk.units)
    await organiser.call(saveUnitFacts, {
      params: { panel: at.panel, round: at.round, unit: unit.id },
      version: unit.version,
      body: factsOfUnit,
    })
}

export async function closeEvening({ organiser, panel, round }: OpenEvening): Promise<void> {
  const { version } = await organiser.call(getRound, { params: { panel, round } })
  await organiser.call(closeRound, { params: { panel, round }, body: { evenIfOut: true }, version })
}

/** Closes a played evening and publishes its verdict. @returns the verdict's slug */
export async function publishEvening(evening: OpenEvening): Promise<string> {
  const { organiser, panel, round } = evening
  await closeEvening(evening)
  await fillDesk(organiser, { panel, round })
  const made = await organiser.call(publishVerdict, {
    params: { panel, round },
    body: {},
    idempotencyKey: randomUUID(),
  })
  return made.slug
}
