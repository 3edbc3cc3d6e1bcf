/**
 * What an analysis says. Plain data: it survives JSON unchanged, nothing in it is null, NaN or infinite, and what
 * cannot be said is `{ ok: false, reason }` in the place of the figure (test with `isCannot`).
 * All scores, means, errors and differences are in points of the round's own scale.
 */
import type { Cannot, Reason } from './cannot.ts'

/** One rating of one descriptor at one serving, as in one line of the long file. */
export interface LongRating {
  readonly panelist: string
  readonly unit: string
  readonly descriptor: string
  readonly replicate: string | number
  readonly position: number | null
  /** null: no number was given (not rated, or "can't tell"). */
  readonly score: number | null
  readonly cantTell?: boolean
}

export interface AnalyseOptions {
  /** Monte-Carlo draws where exact enumeration is too long; 0 switches every resampling off. Default 2000. */
  readonly draws?: number
  /** Any text; the same text gives the same draws. Default 'scrim'. */
  readonly seed?: string
  /** Adjust for position as a factor; only when the frozen plan says so. Default false. */
  readonly position?: boolean
}

/** A number, or why there is none. */
export type Figure = number | Cannot

/** An estimate with its 95 % interval; a limit that cannot be given is left out and its reason said. */
export interface IntervalEstimate {
  readonly estimate: number
  readonly low?: number
  readonly high?: number
  readonly lowReason?: string
  readonly highReason?: string
}

export interface Counts {
  /** Listeners with at least one score on this descriptor. */
  readonly panelists: number
  readonly units: number
  /** Scores given. */
  readonly ratings: number
  /** Listener × unit pairs without a score, over listeners with at least one. */
  readonly missingCells: number
  readonly cantTell: number
}

export interface UnitSummary {
  /** Scores, repeats included. */
  readonly n: number
  /** People who gave at least one score: labels use this. */
  readonly listeners: number
  readonly cantTell: number
  readonly mean: Figure
  readonly median: Figure
  readonly q1: Figure
  readonly q3: Figure
  readonly sd: Figure
  readonly adjustedMean: Figure
  readonly standardError: Figure
  readonly df: Figure
  /** 95 % interval of the adjusted mean: where other listeners like these would put it. Not cut at the scale's ends. */
  readonly low: Figure
  readonly high: Figure
  /** Half-length of the comparison bar: two bars that do not touch differ. */
  readonly comparisonBar: Figure
}

export const ICC_FORMS = ['ICC(1,1)', 'ICC(2,1)', 'ICC(3,1)', 'ICC(1,k)', 'ICC(2,k)', 'ICC(3,k)'] as const
export type IccForm = (typeof ICC_FORMS)[number]

export interface IccEstimate extends IntervalEstimate {
  /** Cannot be said where listeners leave no difference at all. */
  readonly f: Figure
  readonly df1: number
  readonly df2: number
  readonly p: Figure
}

export interface KendallW {
  readonly w: number
  readonly chiSquare: number
  readonly df: number
  /** Upper tail of the chi-square. */
  readonly p: number
  readonly pExact: Figure
  /** How pExact was found, where it was. */
  readonly exactMethod?: 'enumeration' | 'monte-carlo'
  readonly listeners: number
}

export interface IccFromModel {
  /** One listener, one serving, absolute agreement: "listeners agree" stands on this. */
  readonly single: Figure
  readonly singleLow: Figure
  readonly singleHigh: Figure
  /** How the interval of `single` was found. */
  readonly singleMethod: string
  /** The panel's mean. */
  readonly average: Figure
  readonly averageLow: Figure
  readonly averageHigh: Figure
  /** As `single`, leaving out how high or low a listener rates throughout. */
  readonly consistency: Figure
  readonly varianceComponents: {
    readonly unit: number
    readonly panelist: number
    /** Cannot be said where nothing came back: it is then part of the residual. */
    readonly 'panelist:unit': Figure
    readonly residual: number
  }
}

export interface Agreement {
  readonly krippendorffInterval: IntervalEstimate | Cannot
  readonly krippendorffOrdinal: IntervalEstimate | Cannot
  readonly icc: Readonly<Record<IccForm, IccEstimate | Cannot>>
  readonly listwise: { readonly used: number; readonly leftOut: number }
  readonly iccFromModel: IccFromModel | Cannot
  readonly kendallW: KendallW | Cannot
}

export type Component = 'panelist' | 'panelist:unit' | 'residual'

export interface UnitTest {
  readonly f: number
  readonly df1: number
  readonly df2: number
  readonly p: number
}

export interface Model {
  readonly formula: string
  readonly method: string
  readonly remlCriterion: number
  readonly varianceComponents: {
    readonly panelist: number
    /** Cannot be said where nothing came back: it is then part of the residual. */
    readonly 'panelist:unit': Figure
    readonly residual: number
  }
  /** Components estimated at zero; they stay in the model. */
  readonly boundary: readonly Component[]
  readonly unitTest: UnitTest | Cannot
}

export interface PairDifference {
  readonly a: string
  readonly b: string
  /** a − b, adjusted means, in points. */
  readonly difference: number
  readonly standardError: number
  readonly df: number
  /** Simultaneous 95 % interval (Tukey–Kramer). */
  readonly low: number
  readonly high: number
  readonly pTukey: number
}

export interface Durbin {
  readonly chiSquare: number
  readonly df: number
  readonly p: number
  readonly f: Figure
  readonly df1: number
  readonly df2: number
  readonly pF: Figure
}

export interface BlockRanks {
  readonly chiSquare: number
  readonly df: number
  readonly p: number
}

export interface PanelistSummary {
  readonly discriminationF: Figure
  readonly discriminationP: Figure
  /** Mean square between repeats of a unit, in points². */
  readonly repeatability: Figure
  /** Correlation with the panel without this listener. */
  readonly agreement: Figure
  /** 1: same spread as the others; below: narrower. */
  readonly slope: Figure
  /** Points above (+) or below (−) the others. */
  readonly bias: Figure
  readonly scores: number
  readonly cantTell: number
}

export interface DescriptorAnalysis {
  readonly counts: Counts
  readonly units: Readonly<Record<string, UnitSummary>>
  readonly agreement: Agreement
  readonly model: Model | Cannot
  /** Every pair once, a before b in the order of `order.units`. */
  readonly pairs: readonly PairDifference[] | Cannot
  readonly durbin: Durbin | Cannot
  readonly blockRanks: BlockRanks | Cannot
  readonly panelists: Readonly<Record<string, PanelistSummary>>
}

export interface Analysis {
  readonly version: string
  readonly seed: string
  readonly draws: number
  readonly position: boolean
  /** Names in a fixed order (objects with keys like "7" lose theirs). */
  readonly order: {
    readonly descriptors: readonly string[]
    readonly units: readonly string[]
    readonly panelists: readonly string[]
  }
  readonly descriptors: Readonly<Record<string, DescriptorAnalysis>>
}

export type { Cannot, Reason }
