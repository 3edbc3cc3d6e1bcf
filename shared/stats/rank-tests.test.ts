import { describe, expect, it } from 'vitest'
import { blockRanks } from './block-ranks.ts'
import { isCannot } from './cannot.ts'
import { durbin } from './durbin.ts'
import { friedman } from './kendall-w.ts'

const _ = null
/** Ice cream, Conover 1999, p. 391 (data as in the R package PMCMRplus). */
const iceCream = [
  [2, 3, _, 1, _, _, _],
  [_, 3, 1, _, 2, _, _],
  [_, _, 2, 1, _, 3, _],
  [_, _, _, 1, 2, _, 3],
  [3, _, _, _, 1, 2, _],
  [_, 3, _, _, _, 1, 2],
  [3, _, 1, _, _, _, 2],
]
const complete = [
  [4, 3, 2, 1],
  [4, 2, 3, 1],
  [3, 1.5, 1.5, 4],
  [2, 2, 2, 4],
]

describe('Durbin’s test', () => {
  it('ice cream: chi-square form p .062, F form p .0049, on the same data', () => {
    const found = durbin(iceCream)
    if (isCannot(found)) throw new Error(found.reason)
    expect(found.chiSquare).toBeCloseTo(12, 10)
    expect(found.p).toBeCloseTo(0.061969, 6)
    expect(found.f).toBeCloseTo(8, 10)
    expect([found.df1, found.df2]).toEqual([6, 8])
    expect(found.pF).toBeCloseTo(0.004904, 6)
  })
  it('is Friedman’s on a complete table, ties and all', () => {
    const ours = durbin(complete)
    const theirs = friedman(complete)
    if (isCannot(ours) || isCannot(theirs)) throw new Error('expected both')
    expect(ours.chiSquare).toBeCloseTo(theirs.chiSquare, 10)
    expect(ours.f).toBeCloseTo(theirs.f as number, 10)
  })
  it('cannot be said for any other pattern, for one listener, or when all are tied', () => {
    expect(durbin(iceCream.slice(1))).toEqual({ ok: false, reason: 'not-a-balanced-design' })
    expect(durbin([[1, 2]])).toEqual({ ok: false, reason: 'fewer-than-two-listeners' })
    expect(
      durbin([
        [4, 4],
        [7, 7],
      ]),
    ).toEqual({ ok: false, reason: 'all-constant' })
    expect(
      durbin([
        [1, 2, _, _],
        [_, _, 1, 2],
      ]),
    ).toEqual({ ok: false, reason: 'not-a-balanced-design' })
  })
})

describe('block ranks', () => {
  it('equal Friedman’s chi-square on a complete table', () => {
    const ours = blockRanks(complete)
    const theirs = friedman(complete)
    if (isCannot(ours) || isCannot(theirs)) throw new Error('expected both')
    expect(ours.chiSquare).toBeCloseTo(theirs.chiSquare, 10)
    expect(ours.p).toBeCloseTo(theirs.p, 10)
  })
  it('equal Durbin’s chi-square in a balanced incomplete design', () => {
    expect(blockRanks(iceCream)).toMatchObject({ df: 6 })
    expect((blockRanks(iceCream) as { chiSquare: number }).chiSquare).toBeCloseTo(12, 10)
  })
  it('take any pattern; a listener with one unit, or all tied, carries nothing', () => {
    const ragged = [...complete, [5, _, 7, 1], [_, 2, _, 9]]
    const with_ = blockRanks(ragged)
    const without = blockRanks([...ragged, [_, 3, _, _], [6, 6, 6, _]])
    if (isCannot(with_) || isCannot(without)) throw new Error('expected both')
    expect(without.chiSquare).toBeCloseTo(with_.chiSquare, 12)
  })
  it('lose a degree of freedom where units fall into two groups that never met', () => {
    expect(
      blockRanks([
        [1, 2, _, _],
        [2, 1, _, _],
        [_, _, 1, 2],
        [_, _, 1, 2],
      ]),
    ).toMatchObject({ df: 2 })
  })
  it('cannot be said when everybody gave one rating throughout', () => {
    expect(
      blockRanks([
        [5, 5],
        [6, 6],
      ]),
    ).toEqual({ ok: false, reason: 'all-constant' })
  })
})
