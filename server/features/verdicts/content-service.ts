import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import { panelLabel } from '#shared/domain/panel-label.ts'
import { scopeSentences, verdictSentence } from '#shared/domain/verdict-words.ts'
import { resultsOf, type RoundResults } from '#server/features/analysis/service.ts'
import { describeRound, planOfRound } from '#server/features/rounds/listener-service.ts'
import { turnsOfRound } from '#server/features/rounds/facts-service.ts'
import type { Context } from '#server/http/context.ts'
import type { Panel } from '#server/models/panel.ts'
import type { Round } from '#server/models/round.ts'
import { presentUnit, publicResults } from './presenter.ts'
import { unitRows } from './units-service.ts'

/** The sentences Scrim writes: the primary descriptor first, then what survives; none for an informal round. */
export function sentencesOf({ results, label }: RoundResults): string[] {
  if (!panelLabel([label.fewest]).verdictSentence) return []
  const order = { primary: 0, stated: 1, hint: 2 }
  return [...results]
    .filter((one) => one.stated !== 'hint' || one.agreement.sentence.startsWith('Listeners hardly'))
    .sort((a, b) => order[a.stated] - order[b.stated])
    .map(({ descriptor, sentence, stated, agreement }) => {
      if (stated === 'hint')
        return `${descriptor.name}: ${agreement.sentence.slice(0, 1).toLowerCase()}${agreement.sentence.slice(1)}.`
      const scale = {
        name: descriptor.name,
        ...descriptor.scale,
        lowWords: descriptor.words.low,
        highWords: descriptor.words.high,
      }
      return verdictSentence(scale, sentence, false)
    })
}

function certaintyOf(done: RoundResults, listeners: number): string[] {
  const leading = done.results.find((one) => one.stated === 'primary') ?? done.results[0]
  const { label } = done
  const who = `${label.words}: ${listeners} ${listeners === 1 ? 'listener' : 'listeners'}; the fewest that any unit had is ${label.fewest}.`
  if (!leading || !panelLabel([label.fewest]).publicFigures) return [who]
  return [
    who,
    `${leading.descriptor.name}: ${leading.agreement.sentence.slice(0, 1).toLowerCase()}${leading.agreement.sentence.slice(1)}.`,
    `${leading.agreement.steadiness}.`,
  ]
}

/** A version of the verdict, whole: what readers get is frozen as it was published. */
export async function composeVerdict(
  context: Context,
  panel: Panel,
  round: Round,
  words: { headline: string; summary: string },
  at: {
    slug: string
    number: number
    version: number
    publishedAt: Date
    corrections: PublicVerdict['corrections']
  },
): Promise<PublicVerdict> {
  const done = await resultsOf(context, round)
  const rows = await unitRows(round)
  const units = rows.map((row) => {
    const { version: _version, ...unit } = presentUnit(row)
    return unit
  })
  const { scorecard, tracks } = await describeRound(round)
  const plan = planOfRound(round)
  const results = publicResults(done.results, round.publishesRows)
  const figures = panelLabel([done.label.fewest]).publicFigures
  const listeners = new Set(done.analysed.rows.map((row) => row.panelist)).size
  const fileNames = [
    ...(round.origin === 'live' ? (['plan.json', 'key.json'] as const) : []),
    ...(figures && round.publishesRows ? (['ratings.csv', 'data-dictionary.txt'] as const) : []),
  ]
  return {
    slug: at.slug,
    number: at.number,
    version: at.version,
    publishedAt: at.publishedAt.toISOString(),
    panelName: panel.name,
    title: round.title,
    question: round.question,
    headline: words.headline,
    summary: words.summary,
    sentences: sentencesOf({ ...done, results }),
    certainty: certaintyOf(done, listeners),
    label: done.label,
    labels: done.labels,
    disclosures: units.map((unit) => `${unit.name}: ${unit.disclosure ?? ''}`),
    units,
    results: figures ? results : [],
    method: {
      origin: round.origin,
      blinding: round.blinding,
      openedAt: round.openedAt?.toISOString() ?? null,
      closedAt: round.closedAt?.toISOString() ?? null,
      listeners,
      turns: await turnsOfRound(round),
      scorecard,
      primaryDescriptor: round.primaryDescriptor,
      tracks,
      sourceChain: plan?.sourceChain ?? '',
      levelMatching: plan?.levelMatching ?? 'not known',
      hiding: plan?.hiding ?? 'not known',
      servings: done.servings,
      exclusions: done.analysed.exclusions.map(
        (one) => `Listener ${one.listener} left out by the rule “${one.rule}”. ${one.reason}`,
      ),
      library: done.analysed.library,
      seed: done.analysed.seed,
    },
    limits: [
      ...scopeSentences,
      'The round held no positive control: where no difference was found, sensitivity is not shown.',
    ],
    fingerprints: {
      plan: round.planFingerprint ?? null,
      key: round.keyFingerprint ?? null,
      ratings: round.ratingsFingerprint ?? null,
    },
    files: fileNames.map((name) => ({ name, url: `/api/verdicts/${at.slug}/files/${name}` })),
    corrections: at.corrections,
  }
}
