import type { DescriptorResult } from '#shared/contracts/analysis.ts'

type UnitResult = DescriptorResult['units'][number]

const unit = (name: string, scores: [string, number][], mean: number): UnitResult => ({
  unit: name,
  n: scores.length,
  listeners: new Set(scores.map(([listener]) => listener)).size,
  cantTell: 0,
  scores: scores.map(([listener, value]) => ({ listener, value })),
  median: mean,
  q1: mean - 3,
  q3: mean + 3,
  mean,
  sd: 4.2,
  adjusted: {
    mean,
    standardError: 2.48583,
    df: 8.52,
    low: mean - 5.67,
    high: mean + 5.67,
    comparisonHalf: 2.9,
  },
})

/**
 * The Machines data (Pinheiro & Bates; 6 workers, 3 machines, 3 replicates) as a descriptor's result: means, variance
 * components, criterion, F and pairs are the published ones; single scores and spreads are shortened.
 */
export const machines: DescriptorResult = {
  descriptor: {
    key: 'score',
    name: 'Score',
    family: 'timbre',
    sentence: 'As the file has it',
    scale: { low: 43, high: 72.1, step: 0.1 },
    sided: 'one',
    words: { low: 'low', middle: null, high: 'high' },
  },
  counts: { listeners: 6, units: 3, ratings: 54, missingCells: 0, cantTell: 0 },
  units: [
    unit(
      'A',
      [
        ['1', 52],
        ['1', 52.8],
        ['2', 51.8],
        ['10', 60],
      ],
      52.355556,
    ),
    unit(
      'B',
      [
        ['1', 62.1],
        ['2', 59.7],
        ['10', 68.6],
      ],
      60.322222,
    ),
    unit(
      'C',
      [
        ['1', 67.5],
        ['2', 61.5],
        ['10', 70.8],
      ],
      66.272222,
    ),
  ],
  agreement: {
    sentence: 'This panel cannot say how far listeners agree: only three units.',
    steadiness: 'The panel’s mean is steady.',
    single: { estimate: 0.58, interval: { low: 0.1, high: 0.95, level: 0.95 }, method: 'REML', n: 6 },
    average: { estimate: 0.9, interval: null, method: 'REML', n: 6 },
    alpha: { estimate: 0.61, interval: { low: 0.3, high: 0.8, level: 0.95 }, method: 'jackknife', n: 6 },
    w: { w: 0.86, p: 0.0057, pExact: 0.0055, chiSquare: 10.33, df: 2, listwise: { used: 6, leftOut: 0 } },
  },
  model: {
    formula: 'score ~ unit + (1 | panelist) + (1 | panelist:unit)',
    method: 'REML, Kenward–Roger',
    remlCriterion: 215.687568,
    components: { panelist: 22.858444, panelistUnit: 13.909457, residual: 0.92463 },
    boundary: [],
    unitTest: { f: 20.576083, df1: 2, df2: 10, p: 0.000286 },
  },
  pairs: [
    {
      a: 'A',
      b: 'B',
      difference: -7.966667,
      standardError: 2.176975,
      df: 10,
      low: -13.93,
      high: -2,
      p: 0.0111,
    },
    {
      a: 'A',
      b: 'C',
      difference: -13.916667,
      standardError: 2.176975,
      df: 10,
      low: -19.88,
      high: -7.95,
      p: 0.0002,
    },
    {
      a: 'B',
      b: 'C',
      difference: -5.95,
      standardError: 2.176975,
      df: 10,
      low: -11.92,
      high: 0.02,
      p: 0.0507,
    },
  ],
  sentence: 'C is rated higher than A; difference 13.92, between 7.95 and 19.88.',
  stated: 'primary',
  notes: [],
}

/** A descriptor about which nothing can be said: one listener, one unit rated, the other not. */
export const unsaid: DescriptorResult = {
  ...machines,
  descriptor: {
    ...machines.descriptor,
    key: 'warmth',
    name: 'Warmth',
    family: 'tonal-balance',
    sided: 'two',
  },
  counts: { listeners: 1, units: 2, ratings: 1, missingCells: 1, cantTell: 1 },
  units: [
    { ...unit('A', [['1', 52]], 52), adjusted: null, sd: null },
    {
      ...unit('B', [], 0),
      cantTell: 1,
      median: null,
      q1: null,
      q3: null,
      mean: null,
      sd: null,
      adjusted: null,
    },
  ],
  agreement: {
    sentence: 'Nothing can be said about agreement.',
    steadiness: '',
    single: { ok: false, reason: 'fewer-than-two-listeners', sentence: 'Only one listener rated it.' },
    average: { ok: false, reason: 'fewer-than-two-listeners', sentence: 'Only one listener rated it.' },
    alpha: { ok: false, reason: 'fewer-than-two-listeners', sentence: 'Only one listener rated it.' },
    w: { ok: false, reason: 'fewer-than-two-listeners', sentence: 'Only one listener rated it.' },
  },
  model: { ok: false, reason: 'fewer-than-two-listeners', sentence: 'Only one listener rated it.' },
  pairs: [],
  sentence: 'No unit can be set against another.',
  stated: 'hint',
}
