import { balanceOf, range } from './balance.ts'
import { type Group, restingGroup, type Slot, tableGroups } from './groups.ts'
import type { Stream } from './stream.ts'
import type { TurnPlan, TurnRow } from './types.ts'

/** Above this many units a search for rests seldom ends well, and whole tables take turns about instead. */
const MOST_UNITS_WITH_RESTS = 6

/** One listener more than units: see `turnsNeeded`. */
const needsExtraTurn = (units: number, listeners: number) => units > 2 && listeners === units + 1

const onlyTables = (units: number, listeners: number) =>
  listeners <= units || listeners % units === 0 || units > MOST_UNITS_WITH_RESTS

/**
 * Turns until every listener has heard every unit: the larger of units and listeners, but
 * - one more for n + 1 listeners (n = 3…6). In n + 1 turns each rests once, and (shown by enumeration for n = 2…6)
 *   positions within one then leave a single plan up to names: the n rotations of one circle. Whoever knew who rests
 *   when could tell which codes are one unit.
 * - with more than six units, whole tables: n for every n listeners begun. Should a search for rests ever end without
 *   positions within one, `drawTurns` falls back to this too: what holds is the `turns` that it returns. (Should a search for rests ever end without
 *   positions within one, `drawTurns` falls back to this too: what holds is the `turns` it returns.)
 */
export function turnsNeeded(units: number, listeners: number): number {
  if (onlyTables(units, listeners)) return units * Math.ceil(listeners / units)
  return listeners + (needsExtraTurn(units, listeners) ? 1 : 0)
}

/** Deals turns 1, 2, … to groups so that the slots of each are spread evenly over the evening. */
function turnsAbout(groups: readonly Group[]): number[][] {
  const slots = groups.flatMap((group, g) =>
    range(group.slots).map((slot) => ({ g, slot, due: 2 * (slot * groups.length + g) + 1, of: group.slots })),
  )
  slots.sort((a, b) => a.due * b.of - b.due * a.of || a.g - b.g)
  const turns: number[][] = groups.map(() => [])
  slots.forEach(({ g }, i) => turns[g]!.push(i + 1))
  return turns
}

const rowIn = (row: readonly Slot[], turns: readonly number[], after: number): TurnRow => ({
  places: row.map(({ slot, unit }, i) => ({ turn: after + turns[slot]!, position: i + 1, unit })),
})

/** Complete tables, and one group that rests for those who do not fill a table. */
function groupsFor(units: number, listeners: number, stream: Stream): Group[] {
  if (onlyTables(units, listeners)) return tableGroups(units, listeners, stream)
  const over = listeners % units
  const resting = Math.min(listeners, over + (over === 1 ? 2 : 1) * units)
  const beside = tableGroups(units, listeners - resting, stream)
  const ghosts = needsExtraTurn(units, listeners) ? 1 : 0
  const group = restingGroup({ units, listeners: resting, ghosts, beside, stream })
  return group === null ? tableGroups(units, listeners, stream) : [...beside, group]
}

/**
 * The evening: all listen in step, each hears each unit once and rests in the turns over, and no turn needs a unit
 * twice, spares included. Positions are within one over the listeners; followers are as even as the search finds
 * (`balance`). Spare rows first use what is free in step, then further turns after the last, again in step.
 * Units are named 0…n−1; which listener is which row is drawn by the caller.
 */
export function drawTurns(input: {
  units: number
  listeners: number
  spares: number
  stream: Stream
}): TurnPlan {
  const { units, listeners, spares, stream } = input
  const within = (value: number, least: number, most: number) =>
    Number.isInteger(value) && value >= least && value <= most
  if (!within(units, 2, 12) || !within(listeners, 1, 40) || !within(spares, 0, 40)) {
    throw new RangeError('a draw has 2 to 12 units, 1 to 40 listeners and 0 to 40 spare rows')
  }
  const place = (groups: readonly Group[], after: number) => {
    const turns = turnsAbout(groups)
    const rows = (of: 'rows' | 'spares') =>
      groups.flatMap((group, g) => group[of].map((row) => rowIn(row, turns[g]!, after)))
    return {
      turns: groups.reduce((sum, group) => sum + group.slots, 0),
      rows: rows('rows'),
      spares: rows('spares'),
    }
  }
  const evening = place(groupsFor(units, listeners, stream), 0)
  const inStep = evening.spares.slice(0, spares)
  const later = place(tableGroups(units, spares - inStep.length, stream), evening.turns)
  return {
    turns: evening.turns,
    rows: stream.shuffle(evening.rows),
    spareRows: [...inStep, ...later.rows],
    balance: balanceOf(evening.rows, units),
  }
}
