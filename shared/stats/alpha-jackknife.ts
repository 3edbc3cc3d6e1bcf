import type { IntervalEstimate } from './analysis-types.ts'
import { cannot, isCannot } from './cannot.ts'
import type { Cannot } from './cannot.ts'
import { tQuantile } from './student-t.ts'

/** One value of a listener for a unit. */
export interface AlphaValue {
  readonly listener: number
  readonly unit: number
  readonly value: number
}

/**
 * Krippendorff's alpha (interval or ordinal) with the delete-one-listener jackknife: log(1 − alpha) without each
 * listener in turn, its jackknife error, t on N − 1, back-transformed. "These units, other listeners like these."
 *
 * Use for the interval beside alpha; units count as fixed. Not a bootstrap over listeners: a listener drawn twice
 * agrees perfectly with himself. Needs two listeners, and alpha defined without each of them; with three and fewer the
 * interval is very wide. Cost: linear for interval; for ordinal each listener left out costs the distinct values held
 * by the units.
 *
 * @param values cell means, at most one for each listener and unit
 * @returns estimate and 95 % limits, or the estimate alone with the reason why there are none
 */
export function alphaWithJackknife(
  values: readonly AlphaValue[],
  metric: 'interval' | 'ordinal',
): IntervalEstimate | Cannot {
  const leaveOut = metric === 'interval' ? intervalEngine(values) : ordinalEngine(values)
  const estimate = leaveOut([])
  if (isCannot(estimate)) return estimate
  const byListener = new Map<number, AlphaValue[]>()
  for (const value of values) {
    const own = byListener.get(value.listener)
    if (own) own.push(value)
    else byListener.set(value.listener, [value])
  }
  const n = byListener.size
  if (n < 3) return withoutLimits(estimate, 'fewer-than-three-listeners')
  if (estimate >= 1) return withoutLimits(estimate, 'no-variation-left')
  const without: number[] = []
  for (const own of byListener.values()) {
    const alpha = leaveOut(own)
    if (isCannot(alpha) || alpha >= 1) return withoutLimits(estimate, 'not-estimable')
    without.push(Math.log(1 - alpha))
  }
  const centre = without.reduce((total, value) => total + value, 0) / n
  const squares = without.reduce((total, value) => total + (value - centre) ** 2, 0)
  const half = tQuantile(0.05, n - 1) * Math.sqrt(((n - 1) / n) * squares)
  const middle = Math.log(1 - estimate)
  return { estimate, low: 1 - Math.exp(middle + half), high: 1 - Math.exp(middle - half) }
}

const withoutLimits = (estimate: number, reason: string): IntervalEstimate => ({
  estimate,
  lowReason: reason,
  highReason: reason,
})

type LeaveOut = (own: readonly AlphaValue[]) => number | Cannot

/** Sums of a unit: how many values, their sum and their squares. */
interface UnitSums {
  m: number
  sum: number
  squares: number
}

/** Alpha from sums of units, those with one value left out. */
function alphaOf(units: Iterable<UnitSums>): number | Cannot {
  let n = 0
  let sum = 0
  let squares = 0
  let observed = 0
  for (const unit of units) {
    if (unit.m < 2) continue
    n += unit.m
    sum += unit.sum
    squares += unit.squares
    observed += (unit.m * unit.squares - unit.sum * unit.sum) / (unit.m - 1)
  }
  if (n === 0) return cannot('no-pair-of-scores')
  const total = squares - (sum * sum) / n
  if (!(total > 1e-12 * squares)) return cannot('no-variation')
  return observed <= 1e-12 * total ? 1 : 1 - (observed / n) * ((n - 1) / total)
}

function intervalEngine(values: readonly AlphaValue[]): LeaveOut {
  let centre = 0
  values.forEach((value, i) => (centre += (value.value - centre) / (i + 1)))
  const sums = new Map<number, UnitSums>()
  const add = (into: UnitSums, x: number, sign: 1 | -1): UnitSums => {
    into.m += sign
    into.sum += sign * x
    into.squares += sign * x * x
    return into
  }
  for (const { unit, value } of values) {
    sums.set(unit, add(sums.get(unit) ?? { m: 0, sum: 0, squares: 0 }, value - centre, 1))
  }
  return (own) => {
    const changed = new Map(sums)
    for (const { unit, value } of own) {
      changed.set(unit, add({ ...(changed.get(unit) ?? { m: 0, sum: 0, squares: 0 }) }, value - centre, -1))
    }
    return alphaOf(changed.values())
  }
}

/** Ordinal alpha is interval alpha on mid-ranks, which change with every value left out: counts by distinct value. */
function ordinalEngine(values: readonly AlphaValue[]): LeaveOut {
  const distinct = [...new Set(values.map(({ value }) => value))].sort((a, b) => a - b)
  const place = new Map(distinct.map((value, i) => [value, i]))
  const byUnit = new Map<number, Map<number, number>>()
  for (const { unit, value } of values) {
    const counts = byUnit.get(unit) ?? new Map<number, number>()
    const at = place.get(value) ?? 0
    counts.set(at, (counts.get(at) ?? 0) + 1)
    byUnit.set(unit, counts)
  }
  const units = [...byUnit.keys()]
  const sparse = [...byUnit.values()].map((counts) => ({
    place: Int32Array.from(counts.keys()),
    count: Int32Array.from(counts.values()),
    m: [...counts.values()].reduce((total, count) => total + count, 0),
  }))
  const slot = new Map(units.map((unit, i) => [unit, new Map([...sparse[i]!.place].map((at, j) => [at, j]))]))
  const index = new Map(units.map((unit, i) => [unit, i]))
  return (own) => {
    const taken = own.map(({ unit, value }) => {
      const counts = sparse[index.get(unit)!]!
      return { counts, slot: slot.get(unit)!.get(place.get(value)!)! }
    })
    for (const { counts, slot: at } of taken) {
      counts.count[at]!--
      counts.m--
    }
    const alpha = alphaOf(rankSums(sparse, distinct.length))
    for (const { counts, slot: at } of taken) {
      counts.count[at]!++
      counts.m++
    }
    return alpha
  }
}

function rankSums(
  units: readonly { place: Int32Array; count: Int32Array; m: number }[],
  distinct: number,
): UnitSums[] {
  const marginal = new Float64Array(distinct)
  let n = 0
  for (const { place, count, m } of units) {
    if (m < 2) continue
    n += m
    for (let i = 0; i < place.length; i++) marginal[place[i]!]! += count[i]!
  }
  const rank = new Float64Array(distinct)
  let below = -n / 2
  for (let v = 0; v < distinct; v++) {
    rank[v] = below + marginal[v]! / 2
    below += marginal[v]!
  }
  return units.map(({ place, count, m }) => {
    let sum = 0
    let squares = 0
    for (let i = 0; i < place.length; i++) {
      const r = rank[place[i]!]!
      sum += count[i]! * r
      squares += count[i]! * r * r
    }
    return { m, sum, squares }
  })
}
