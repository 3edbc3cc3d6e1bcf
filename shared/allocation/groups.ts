import { followerCounts, range, spread } from './balance.ts'
import { evenOut, type Found } from './exchange.ts'
import { randomSquare } from './latin.ts'
import { drawRows } from './rows.ts'
import type { Stream } from './stream.ts'

/** People who share the slots of a group: in each slot a unit is with one of them at most. Slots count from 0. */
export type Group = { slots: number; rows: Slot[][]; spares: Slot[][] }
export type Slot = { slot: number; unit: number }

const STEPS = 6000
const RESTARTS = 4
const MOST_RESTARTS = 40

/** Tables of at most n, each in n slots of its own, none of which rests. */
export function tableGroups(units: number, listeners: number, stream: Stream): Group[] {
  if (listeners === 0) return []
  const { rows, tables, unused } = drawRows({ units, listeners, stream })
  const slots = (order: readonly number[]) => order.map((unit, slot) => ({ slot, unit }))
  const last = tables[tables.length - 1]!
  return range(last + 1).map((table) => ({
    slots: units,
    rows: rows.filter((_, i) => tables[i] === table).map(slots),
    spares: table === last ? unused.map(slots) : [],
  }))
}

/** The orders heard at these groups, rests left out. */
export function ordersOf(groups: readonly Group[]): number[][] {
  return groups.flatMap((group) => group.rows.map((row) => row.map((place) => place.unit)))
}

/**
 * More people than units, in as many slots as people (and `ghosts`, rows that nobody has yet): each rests in the
 * slots over. Restarted until positions are within one and followers within one (even n) or two (odd n), together
 * with the groups `beside`; after some restarts the best so far is kept. Null if positions never came within one.
 */
export function restingGroup(input: {
  units: number
  listeners: number
  ghosts: number
  beside: readonly Group[]
  stream: Stream
}): Group | null {
  const { units, listeners, ghosts, stream } = input
  const beside = ordersOf(input.beside)
  const slots = listeners + ghosts
  const allowed = units % 2 === 0 ? 1 : 2
  let best: Found | null = null
  let least = Infinity
  for (let i = 0; i < MOST_RESTARTS && (i < RESTARTS || best === null) && least > allowed; i += 1) {
    const start = randomSquare(slots, stream)
    const found = evenOut({ start, units, listeners, beside, steps: STEPS, stream })
    if (found === null) continue
    const orders = found.square.slice(0, listeners).map((row) => row.filter((symbol) => symbol < units))
    const uneven = spread(followerCounts([...beside, ...orders], units), true)
    if (uneven < least) [best, least] = [found, uneven]
  }
  if (best === null) return null
  const rows = best.square.map((row) => row.flatMap((unit, slot) => (unit < units ? [{ slot, unit }] : [])))
  return { slots, rows: rows.slice(0, listeners), spares: rows.slice(listeners) }
}
