import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import type { PublicVerdict, VerdictDraft, VerdictLine } from '#shared/contracts/verdicts.ts'
import { FEWEST_FOR_FIGURES } from '#shared/domain/panel-label.ts'
import { differenceSentence } from '#shared/domain/verdict-words.ts'

export interface UnitRow {
  id: string
  maker: string
  name: string
  provenance: 'bought' | 'loan' | 'gift' | 'discounted' | 'prototype' | null
  lender: string | null
  returnOn: string | null
  disclosure: string | null
  priceMinor: string | null
  priceCurrency: string | null
  priceOn: string | null
  priceUnknown: boolean
  version: number
  photo: { id: string; width: number; height: number } | null
}

export const presentUnit = (row: UnitRow): VerdictDraft['units'][number] => ({
  id: row.id,
  maker: row.maker,
  name: row.name,
  provenance: row.provenance,
  lender: row.lender,
  returnOn: row.returnOn,
  disclosure: row.disclosure,
  price:
    row.priceMinor === null || row.priceCurrency === null || row.priceOn === null
      ? null
      : { minor: Number(row.priceMinor), currency: row.priceCurrency, on: row.priceOn },
  priceUnknown: row.priceUnknown,
  photo: row.photo
    ? {
        id: row.photo.id,
        url: `/api/photos/${row.photo.id}`,
        width: row.photo.width,
        height: row.photo.height,
      }
    : null,
  version: row.version,
})

/** What is still asked, by the name of its input on the desk. */
export function missingOf(
  words: { headline: string; summary: string },
  units: readonly UnitRow[],
): VerdictDraft['missing'] {
  const missing: VerdictDraft['missing'] = []
  const ask = (field: string, what: string): void => void missing.push({ field, what })
  if (words.headline === '') ask('headline', 'The headline')
  if (words.summary === '') ask('summary', 'The summary')
  units.forEach((unit, index) => {
    const name = unit.maker ? `${unit.maker} ${unit.name}` : unit.name
    if (unit.provenance === null) ask(`units.${index}.provenance`, `How you got ${name}`)
    if (!unit.disclosure) ask(`units.${index}.disclosure`, `The disclosure for ${name}`)
    if (unit.priceMinor === null && !unit.priceUnknown) ask(`units.${index}.price`, `The price of ${name}`)
  })
  return missing
}

/**
 * Results fit for the public: no figure of a unit, in numbers or in words, rests on fewer than five listeners (B7), and
 * where the round publishes no rows no single rating stands here either.
 */
export function publicResults(
  results: readonly DescriptorResult[],
  publishesRows: boolean,
): DescriptorResult[] {
  return results.map((result) => {
    const thin = result.units.filter((unit) => unit.listeners < FEWEST_FOR_FIGURES).map((unit) => unit.unit)
    const units = publishesRows ? result.units : result.units.map((unit) => ({ ...unit, scores: [] }))
    return thin.length === 0 ? { ...result, units } : withoutThin({ ...result, units }, thin)
  })
}

function withoutThin(result: DescriptorResult, thin: readonly string[]): DescriptorResult {
  const nothing = { scores: [], median: null, q1: null, q3: null, mean: null, sd: null, adjusted: null }
  const { descriptor, model } = result
  const pairs = result.pairs.filter((pair) => !thin.includes(pair.a) && !thin.includes(pair.b))
  const scale = {
    name: descriptor.name,
    ...descriptor.scale,
    lowWords: descriptor.words.low,
    highWords: descriptor.words.high,
  }
  const unitsDiffer = 'unitTest' in model && model.unitTest !== null && model.unitTest.p < 0.05
  return {
    ...result,
    units: result.units.map((unit) => (thin.includes(unit.unit) ? { ...unit, ...nothing } : unit)),
    pairs,
    sentence: differenceSentence(scale, pairs, unitsDiffer),
    notes: [
      ...result.notes.filter((note) => !thin.some((name) => note.includes(name))),
      `Not shown, since fewer than five listeners rated them here: ${thin.join(', ')}.`,
    ],
  }
}

/** One line of the contents: the sentence over a heard line of the primary descriptor. */
export function presentLine(content: PublicVerdict): VerdictLine {
  const leading = content.results.find((one) => one.stated === 'primary') ?? content.results[0]
  return {
    slug: content.slug,
    number: content.number,
    headline: content.headline,
    panelName: content.panelName,
    publishedAt: content.publishedAt,
    label: content.label.words,
    labels: content.labels,
    listeners: content.method.listeners,
    descriptor: leading?.descriptor ?? null,
    units: (leading?.units ?? []).flatMap((unit) =>
      unit.q1 === null || unit.median === null || unit.q3 === null
        ? []
        : [
            {
              name: unit.unit,
              scores: unit.scores.map((score) => score.value),
              q1: unit.q1,
              median: unit.median,
              q3: unit.q3,
            },
          ],
    ),
  }
}
