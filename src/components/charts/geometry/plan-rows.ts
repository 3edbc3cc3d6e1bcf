import { shortNames } from './labels.ts'
import { textWidth } from './text-width.ts'

export interface PlanPlace {
  /** Turn, counted from 1. */
  turn: number
  /** What is heard: a unit's name for the organiser, nothing where codes must not be tied to anything. */
  label?: string
  /** A unit that comes back to this listener: its cells are knotted. */
  repeat?: boolean
}

export interface PlanRow {
  name: string
  places: PlanPlace[]
}

export interface PlanLayout {
  narrow: boolean
  left: number
  /** Middle of each turn's column. */
  turnX: number[]
  cellWidth: number
  /** Where each row's thread lies, and its name. */
  rowY: number[]
  nameY: number[]
  /** What stands in a cell for each label: the name, or its shortest telling beginning. */
  words: Map<string, string>
  height: number
}

const TEXT = 14
export const CELL_HEIGHT = 30
const HEAD = 26

/** Where the rows of a plan lie, for a width in pixels; names above their rows where the column is narrow. */
export function layOutPlan(rows: PlanRow[], turns: number, width: number): PlanLayout {
  const names = Math.max(0, ...rows.map((row) => textWidth(row.name, 16))) + 16
  const narrow = width < 560 || names > width * 0.3
  const left = narrow ? 0 : names
  const pitch = (width - left) / Math.max(1, turns)
  const cellWidth = Math.min(pitch - 8, 96)
  const labels = rows.flatMap((row) => row.places.flatMap((place) => place.label ?? []))
  const fits = labels.every((label) => textWidth(label, TEXT) + 10 <= cellWidth)
  const words = fits ? new Map(labels.map((label) => [label, label])) : shortNames(labels)
  const rowHeight = narrow ? 66 : 44
  return {
    narrow,
    left,
    turnX: Array.from({ length: turns }, (_, nth) => left + pitch * (nth + 0.5)),
    cellWidth,
    rowY: rows.map((_, nth) => HEAD + rowHeight * nth + (narrow ? 44 : 22)),
    nameY: rows.map((_, nth) => HEAD + rowHeight * nth + (narrow ? 18 : 27)),
    words,
    height: HEAD + rowHeight * rows.length,
  }
}

/** The stretches of a thread between its first and last serving, each said to be a way to a serving or a rest. */
export function threadStretches(places: PlanPlace[]): { from: number; to: number; rest: boolean }[] {
  const turns = places.map((place) => place.turn).sort((a, b) => a - b)
  return turns.slice(1).map((to, nth) => {
    const from = turns[nth] ?? to
    return { from, to, rest: to - from > 1 }
  })
}
