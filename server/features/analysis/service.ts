import type { Agreement, DescriptorResult, Reveal } from '#shared/contracts/analysis.ts'
import { panelLabel } from '#shared/domain/panel-label.ts'
import { roundLabels } from '#shared/domain/round-labels.ts'
import { unitNames } from '#shared/domain/unit-names.ts'
import { statedDescriptors } from '#shared/stats/stated-descriptors.ts'
import { enterRound } from '#server/features/rounds/access-service.ts'
import { unitsOf } from '#server/features/rounds/facts-service.ts'
import { describeRound, planOfRound } from '#server/features/rounds/listener-service.ts'
import type { Context } from '#server/http/context.ts'
import { permit } from '#server/http/permit.ts'
import type { Round } from '#server/models/round.ts'
import * as may from '#server/policies/round.ts'
import { analysed, type Analysed } from './analysed-service.ts'
import { presentDescriptorResult } from './presenter.ts'
import { countedRatings } from './ratings-service.ts'
import {
  keyLinkRenewed,
  listenersOf,
  recognisedIn,
  servingCounts,
  stewardListened,
} from './quality-service.ts'

interface At {
  panel: string
  round: string
}

/** Everything that agreement screen, reveal and verdict are made of. */
export interface RoundResults {
  analysed: Analysed
  results: DescriptorResult[]
  label: Agreement['label']
  labels: string[]
  servings: Agreement['servings']
}

export async function resultsOf(context: Context, round: Round): Promise<RoundResults> {
  const units = await unitsOf(round)
  const names = [...unitNames(units).values()]
  const { scorecard } = await describeRound(round)
  const done = await analysed(context, round, units.length)
  const primary = scorecard.find((one) => one.key === round.primaryDescriptor)?.name ?? null
  const stated = statedDescriptors(done.analysis, primary)
  const out = new Set(done.exclusions.filter((one) => one.excluded).map((one) => one.listener))
  const results = scorecard.flatMap((descriptor) => {
    const result = done.analysis.descriptors[descriptor.name]
    const told = stated.find((one) => one.descriptor === descriptor.name)
    if (!result || !told) return []
    const rows = done.rows.filter((row) => row.descriptor === descriptor.name && !out.has(row.panelist))
    return [
      presentDescriptorResult({
        descriptor,
        result,
        withAll: done.withAll?.descriptors[descriptor.name] ?? null,
        stated: told,
        units: names,
        rows,
      }),
    ]
  })
  // A unit's count is that of the primary descriptor: what a verdict says first rests on it.
  const leading = results.find((one) => one.stated === 'primary') ?? results[0]
  const { key, words, fewest } = panelLabel(leading?.units.map((unit) => unit.listeners) ?? [])
  const plan = planOfRound(round)
  const labels = roundLabels({
    blinding: round.blinding,
    levelMatching: plan?.levelMatching ?? null,
    stewardListened: await stewardListened(round),
    keyLinkRenewed: await keyLinkRenewed(round),
    publishesRows: round.publishesRows,
  })
  return {
    analysed: done,
    results,
    label: { key, words, fewest },
    labels,
    servings: await servingCounts(context, round),
  }
}

export async function showAgreement(context: Context, at: At): Promise<Agreement> {
  const access = await enterRound(context, at.panel, at.round)
  permit(may.maySeeAgreement(access.facts), {
    detail: 'Nobody sees ratings in sum before the round is closed.',
  })
  const { round, facts } = access
  const { analysed: done, results, label, labels, servings } = await resultsOf(context, round)
  return {
    round: {
      id: round.id,
      title: round.title,
      status: round.status,
      origin: round.origin,
      blinding: round.blinding,
    },
    label,
    labels,
    listeners: await listenersOf(context, round, may.maySeeListenerNames(facts)),
    servings,
    exclusions: done.exclusions,
    recognised: await recognisedIn(context, round),
    results,
    computed: { at: done.at.toISOString(), digest: done.digest, library: done.library, seed: done.seed },
    can: { publish: may.mayPublish(facts) },
  }
}

/** For the room: the primary descriptor's units, least first, so that the last one drawn out stands highest. */
export async function showReveal(context: Context, at: At): Promise<Reveal> {
  const access = await enterRound(context, at.panel, at.round)
  permit(may.maySeeReveal(access.facts), { detail: 'The key opens when the round closes.' })
  const { round } = access
  const { results, label } = await resultsOf(context, round)
  const leading = results.find((one) => one.stated === 'primary') ?? results[0]
  if (!leading) throw new Error('A closed round has a primary descriptor.')
  const units = await unitsOf(round)
  const names = unitNames(units)
  const ratings = await countedRatings(context, round)
  const shown = units
    .map((unit) => ({ unit, result: leading.units.find((one) => one.unit === names.get(unit.id)) }))
    .sort((a, b) => (a.result?.median ?? 0) - (b.result?.median ?? 0))
  const listeners = [
    ...new Set(leading.units.flatMap((unit) => unit.scores.map((score) => score.listener))),
  ].sort()
  const meanOf = (values: readonly number[]): number | null =>
    values.length === 0 ? null : values.reduce((sum, value) => sum + value, 0) / values.length
  return {
    title: round.title,
    descriptor: leading.descriptor,
    label: label.words,
    units: shown.map(({ unit, result }) => ({
      maker: unit.maker,
      name: unit.name,
      codes: [
        ...new Set(ratings.filter((one) => one.unitId === unit.id && one.code !== '').map((one) => one.code)),
      ].sort(),
      median: result?.median ?? null,
      q1: result?.q1 ?? null,
      q3: result?.q3 ?? null,
      n: result?.listeners ?? 0,
    })),
    threads: listeners.map((listener) => ({
      values: shown.map(({ result }) =>
        meanOf(
          result?.scores.filter((score) => score.listener === listener).map((score) => score.value) ?? [],
        ),
      ),
    })),
    sentence: leading.sentence,
  }
}
