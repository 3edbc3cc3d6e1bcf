import { readCsv } from './csv.ts'
import { problem, shown } from './ratings-problems.ts'
import type { FileProblem } from './ratings-problems.ts'

export const knownColumns = [
  'panelist',
  'unit',
  'descriptor',
  'replicate',
  'position',
  'score',
  'code',
  'cant_tell',
] as const
export type KnownColumn = (typeof knownColumns)[number]

const needed: readonly KnownColumn[] = ['panelist', 'unit', 'descriptor', 'score']

export interface Header {
  readonly separator: string
  /** Fields in the header line. */
  readonly width: number
  readonly place: ReadonlyMap<KnownColumn, number>
  readonly ignored: readonly string[]
  readonly problems: readonly FileProblem[]
}

/** Finds the separator that makes most of the header known, and where each column stands. */
export function readHeader(text: string): Header {
  const readings = [',', ';', '\t'].map((separator) => readWith(text, separator))
  return readings.reduce((best, reading) =>
    reading.place.size > best.place.size ||
    (reading.place.size === best.place.size && reading.width > best.width)
      ? reading
      : best,
  )
}

function readWith(text: string, separator: string): Header {
  const record = readCsv(text, separator, 1)[0]
  const line = record?.line ?? 1
  const names = (record?.fields ?? []).map((name) =>
    name
      .trim()
      .toLowerCase()
      .replace(/[\s-]+/g, '_'),
  )
  const place = new Map<KnownColumn, number>()
  const ignored: string[] = []
  const problems: FileProblem[] = []
  names.forEach((name, i) => {
    const column = knownColumns.find((known) => known === name)
    if (!column) {
      if (name !== '') ignored.push(record?.fields[i]?.trim() ?? name)
    } else if (place.has(column)) {
      problems.push(
        problem(line, column, 'column-twice', `The header names the column ${shown(column)} twice.`),
      )
    } else place.set(column, i)
  })
  for (const column of needed) {
    if (place.has(column)) continue
    problems.push(problem(line, column, 'missing-column', `The header has no column ${shown(column)}.`))
  }
  return { separator, width: names.length, place, ignored, problems }
}
