import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import type { Descriptor } from '#shared/contracts/scorecard.ts'
import { agreementWords, steadinessSentence } from '#shared/domain/agreement-words.ts'
import { isCannot, sentenceFor, type Cannot } from '#shared/domain/result.ts'
import { differenceSentence, points } from '#shared/domain/verdict-words.ts'
import type { DescriptorAnalysis, IntervalEstimate, LongRating } from '#shared/stats/analysis-types.ts'
import type { StatedDescriptor } from '#shared/stats/stated-descriptors.ts'

type Figure = number | Cannot

const unsaid = (cannot: Cannot) => ({
  ok: false as const,
  reason: cannot.reason,
  sentence: sentenceFor(cannot.reason),
})
const orNull = (figure: Figure | undefined): number | null => (typeof figure === 'number' ? figure : null)

function interval(low: Figure | undefined, high: Figure | undefined) {
  return low === undefined || high === undefined || isCannot(low) || isCannot(high)
    ? null
    : { low, high, level: 0.95 }
}

function estimated(value: IntervalEstimate | Cannot, method: string, n: number) {
  return isCannot(value)
    ? unsaid(value)
    : { estimate: value.estimate, interval: interval(value.low, value.high), method, n }
}

function agreementOf(result: DescriptorAnalysis): DescriptorResult['agreement'] {
  const { counts, agreement } = result
  const model = agreement.iccFromModel
  const n = counts.panelists
  const single = isCannot(model) ? model : model.single
  const low = isCannot(model) ? model : model.singleLow
  const high = isCannot(model) ? model : model.singleHigh
  const w = agreement.kendallW
  return {
    sentence: agreementWords({ single, low, high, units: counts.units, listeners: n }).sentence,
    steadiness: steadinessSentence(
      isCannot(model)
        ? { average: model, low: model, high: model }
        : { average: model.average, low: model.averageLow, high: model.averageHigh },
    ),
    single: isCannot(model)
      ? unsaid(model)
      : isCannot(model.single)
        ? unsaid(model.single)
        : {
            estimate: model.single,
            interval: interval(model.singleLow, model.singleHigh),
            method: model.singleMethod,
            n,
          },
    average: isCannot(model)
      ? unsaid(model)
      : isCannot(model.average)
        ? unsaid(model.average)
        : {
            estimate: model.average,
            interval: interval(model.averageLow, model.averageHigh),
            method: 'ICC of the panel’s mean, absolute agreement',
            n,
          },
    alpha: estimated(
      agreement.krippendorffInterval,
      'Krippendorff’s alpha, interval; jackknife over listeners',
      n,
    ),
    w: isCannot(w)
      ? unsaid(w)
      : {
          w: w.w,
          p: w.p,
          pExact: orNull(w.pExact),
          chiSquare: w.chiSquare,
          df: w.df,
          listwise: { ...agreement.listwise },
        },
  }
}

function modelOf(result: DescriptorAnalysis): DescriptorResult['model'] {
  const { model } = result
  if (isCannot(model)) return unsaid(model)
  const { varianceComponents: components, unitTest } = model
  return {
    formula: model.formula,
    method: model.method,
    remlCriterion: model.remlCriterion,
    components: {
      panelist: components.panelist,
      panelistUnit: orNull(components['panelist:unit']),
      residual: components.residual,
    },
    boundary: [...model.boundary],
    unitTest: isCannot(unitTest)
      ? null
      : { f: unitTest.f, df1: unitTest.df1, df2: unitTest.df2, p: unitTest.p },
  }
}

function unitOf(
  name: string,
  result: DescriptorAnalysis,
  rows: readonly LongRating[],
): DescriptorResult['units'][number] | null {
  const unit = result.units[name]
  if (!unit) return null
  const { adjustedMean: mean, standardError, df, low, high, comparisonBar } = unit
  return {
    unit: name,
    n: unit.n,
    listeners: unit.listeners,
    cantTell: unit.cantTell,
    scores: rows.flatMap((row) =>
      row.unit === name && row.score !== null ? [{ listener: row.panelist, value: row.score }] : [],
    ),
    median: orNull(unit.median),
    q1: orNull(unit.q1),
    q3: orNull(unit.q3),
    mean: orNull(unit.mean),
    sd: orNull(unit.sd),
    adjusted:
      isCannot(mean) || isCannot(standardError) || isCannot(df) || isCannot(low) || isCannot(high)
        ? null
        : { mean, standardError, df, low, high, comparisonHalf: orNull(comparisonBar) },
  }
}

export interface DescriptorParts {
  descriptor: Descriptor
  result: DescriptorAnalysis
  /** With excluded listeners too, where there are any. */
  withAll: DescriptorAnalysis | null
  stated: StatedDescriptor
  units: readonly string[]
  rows: readonly LongRating[]
}

/** One descriptor's spread. `rows` are the counted ratings of this descriptor. */
export function presentDescriptorResult(parts: DescriptorParts): DescriptorResult {
  const { descriptor, result, stated } = parts
  const scale = {
    name: descriptor.name,
    ...descriptor.scale,
    lowWords: descriptor.words.low,
    highWords: descriptor.words.high,
  }
  const pairs = isCannot(result.pairs)
    ? []
    : result.pairs.map(({ pTukey, ...pair }) => ({ ...pair, p: pTukey }))
  const model = modelOf(result)
  const unitsDiffer = 'unitTest' in model && model.unitTest !== null && model.unitTest.p < 0.05
  return {
    descriptor,
    counts: {
      listeners: result.counts.panelists,
      units: result.counts.units,
      ratings: result.counts.ratings,
      missingCells: result.counts.missingCells,
      cantTell: result.counts.cantTell,
    },
    units: parts.units.map((name) => unitOf(name, result, parts.rows)).filter((unit) => unit !== null),
    agreement: agreementOf(result),
    model,
    pairs,
    sentence: differenceSentence(scale, pairs, unitsDiffer),
    stated: stated.isPrimary ? 'primary' : stated.stated ? 'stated' : 'hint',
    notes: notesOf(parts, scale),
  }
}

function notesOf(
  { result, withAll, units }: DescriptorParts,
  scale: { low: number; high: number },
): string[] {
  const notes: string[] = []
  if (!isCannot(result.model) && result.model.boundary.includes('panelist:unit'))
    notes.push('No sign that listeners order the units differently.')
  const { used, leftOut } = result.agreement.listwise
  if (leftOut * 5 > used + leftOut)
    notes.push(
      `${leftOut} of ${used + leftOut} listeners did not rate every unit; Kendall’s W leaves them out, the model’s figures do not.`,
    )
  if (
    withAll &&
    !isCannot(withAll.agreement.iccFromModel) &&
    !isCannot(withAll.agreement.iccFromModel.single)
  )
    notes.push(
      `With the excluded listeners too, one listener’s agreement is ${withAll.agreement.iccFromModel.single.toFixed(2)}.`,
    )
  for (const name of withAll ? units : []) {
    const [one, all] = [result.units[name]?.adjustedMean, withAll?.units[name]?.adjustedMean]
    if (one === undefined || all === undefined || isCannot(one) || isCannot(all)) continue
    if (Math.abs(one - all) * 50 > scale.high - scale.low)
      notes.push(`${name} would stand at ${points(all, scale)} instead of ${points(one, scale)} with them.`)
  }
  const shares = units
    .map((name) => result.units[name])
    .filter((unit) => unit !== undefined)
    .map((unit) => unit.cantTell / Math.max(1, unit.cantTell + unit.n))
  if (shares.length > 0 && Math.max(...shares) - Math.min(...shares) > 0.15)
    notes.push(
      '“Can’t tell” was said much more often of some units than of others: their means rest on those who could tell.',
    )
  return notes
}
