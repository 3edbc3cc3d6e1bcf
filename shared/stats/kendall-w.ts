import type { KendallW } from './analysis-types.ts'
import { cannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { chiSquareUpperTail } from './chi-square.ts'
import { exactRankTail } from './kendall-w-exact.ts'
import { midRanks, rounded } from './mid-ranks.ts'

/**
 * Kendall's coefficient of concordance W, corrected for ties: 0 when listeners' orders have nothing in common, 1 when
 * all put the units in the same order. Levels and spreads of the scale do not count.
 *
 * Use beside the ICC where only order is trusted. Not with holes (listwise), and there are no accepted bands. Listeners
 * who rate everything alike stay, all tied. p is the upper chi-square tail of m(n−1)W; with few units and listeners
 * read pExact. Cost: n log n for each listener, plus the draws.
 *
 * Sources: Kendall 1948; Siegel 1956; Friedman's chi-square is the same statistic.
 *
 * @param scores listeners × units, complete, at least 2 × 2
 * @param draws Monte-Carlo draws where exact enumeration is too long; 0: no exact p at all
 * @param random stream in [0, 1) for the draws
 * @throws RangeError on a ragged table
 * @example
 * kendallW([[1, 6, 3, 2, 5, 4], [1, 5, 6, 4, 2, 3], [6, 3, 2, 5, 4, 1]], 0).w // => 0.161905
 */
export function kendallW(
  scores: readonly (readonly number[])[],
  draws: number,
  random?: () => number,
): KendallW | Cannot {
  const m = scores.length
  const n = scores[0]?.length ?? 0
  if (scores.some((row) => row.length !== n))
    throw new RangeError('kendallW: every listener needs every unit')
  if (m < 2) return cannot('fewer-than-two-complete-listeners')
  if (n < 2) return cannot('fewer-than-two-units')
  const ranked = scores.map((row) => midRanks(row.map(rounded)))
  const ties = ranked.reduce((total, { ties: own }) => total + own, 0)
  const room = m * m * (n ** 3 - n) - m * ties
  if (room === 0) return cannot('all-constant')
  const ranks = ranked.map((row) => row.ranks)
  const sums = ranks[0]!.map((_, unit) => ranks.reduce((total, row) => total + row[unit]!, 0))
  const s = sums.reduce((total, value) => total + (value - (m * (n + 1)) / 2) ** 2, 0)
  const w = (12 * s) / room
  const chiSquare = m * (n - 1) * w
  const exact = exactRankTail(ranks, draws, random)
  return {
    w,
    chiSquare,
    df: n - 1,
    p: chiSquareUpperTail(chiSquare, n - 1),
    listeners: m,
    ...exact,
  }
}

/**
 * Friedman's test that no unit is ranked above another, with Iman and Davenport's F (which keeps its level better).
 *
 * Use for complete tables of ranks or scores; assumes listeners rank independently. F cannot be said when all agree
 * perfectly. Source: Friedman 1937; Iman & Davenport 1980; tie correction as in W.
 *
 * @param scores listeners × units, complete
 * @example
 * friedman([[4, 3, 2, 1], [4, 2, 3, 1]]).chiSquare // => 5.4
 */
export function friedman(
  scores: readonly (readonly number[])[],
): { chiSquare: number; df: number; p: number; f: number | Cannot; df1: number; df2: number } | Cannot {
  const found = kendallW(scores, 0)
  if ('ok' in found) return found
  const m = found.listeners
  const f = found.w < 1 ? ((m - 1) * found.w) / (1 - found.w) : cannot('no-variation-left')
  return { chiSquare: found.chiSquare, df: found.df, p: found.p, f, df1: found.df, df2: found.df * (m - 1) }
}
