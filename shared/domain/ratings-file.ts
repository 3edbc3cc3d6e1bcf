import { MOST_UNITS } from '#shared/stats/descriptor-data.ts'
import type { LongRating } from '#shared/stats/analysis-types.ts'
import { asText, csvLine, readCsv } from './csv.ts'
import type { CsvRecord } from './csv.ts'
import { limits } from './limits.ts'
import { problem } from './ratings-problems.ts'
import type { FileProblem } from './ratings-problems.ts'
import { knownColumns, readHeader } from './ratings-header.ts'
import { rowReader } from './ratings-row.ts'

export type { FileProblem, ProblemReason } from './ratings-problems.ts'

/** One line of a ratings file. */
export interface FileRating extends LongRating {
  readonly replicate: string
  readonly cantTell: boolean
  /** Three digits, where the file carries them. */
  readonly code: string | null
  /** Line of the file, from 1. */
  readonly line: number
}

export interface RatingsFile {
  /** The good rows, in the file's order. */
  readonly rows: readonly FileRating[]
  readonly problems: readonly FileProblem[]
  /** Smallest and largest score, or null where there is none. */
  readonly scale: { readonly low: number; readonly high: number } | null
  /** The same for each descriptor, in the order in which they first appear; no score, no entry. */
  readonly ranges: readonly { readonly name: string; readonly low: number; readonly high: number }[]
  /** In the order in which they first appear among the good rows. */
  readonly descriptors: readonly string[]
  readonly units: readonly string[]
  readonly panelists: readonly string[]
  /** Columns that the file has and nothing reads. */
  readonly ignoredColumns: readonly string[]
}

/**
 * Reads a long ratings file: `panelist,unit,descriptor,replicate,position,score`, in any order of columns, `code` and
 * `cant_tell` besides where there are some. A blank score is missing; replicate is 1 and position unknown where they
 * are left out. Comma, semicolon or tab between fields, told from the header; a decimal comma where the comma does not
 * separate. Every bad row is named with its line and why; the good ones are returned all the same.
 *
 * @param text the file's text (UTF-8, with or without a byte-order mark)
 * @param mostRows how many rows are read
 */
export function parseRatingsFile(text: string, mostRows: number = limits.importRows): RatingsFile {
  if (text.trim() === '') return nothing(problem(1, null, 'empty-file', 'The file is empty.'))
  if (text.includes('\u0000')) {
    return nothing(problem(1, null, 'not-a-text-file', 'This is not a text file; save the table as CSV.'))
  }
  const header = readHeader(text)
  if (header.problems.length > 0) return { ...nothing(...header.problems), ignoredColumns: header.ignored }
  const records = readCsv(text, header.separator, mostRows + 2).slice(1)
  const problems: FileProblem[] = []
  const rows: FileRating[] = []
  const seen = new Map<string, number>()
  const units = new Set<string>()
  const readRow = rowReader(header)
  for (const record of records.slice(0, mostRows)) {
    const read = readRow(record)
    problems.push(...read.problems)
    if (!read.row) continue
    units.add(read.row.unit)
    if (units.size > MOST_UNITS) {
      problems.push(tooManyUnits(record))
      break
    }
    const first = seenBefore(seen, read.row)
    if (first !== null) problems.push(twice(record, first))
    else rows.push(read.row)
  }
  const beyond = records[mostRows]
  if (beyond) {
    const most = mostRows.toLocaleString('en')
    problems.push(
      problem(beyond.line, null, 'too-many-rows', `There are more than ${most} rows; the rest was not read.`),
    )
  }
  if (records.length === 0)
    problems.push(problem(1, null, 'no-rows', 'There is a header and nothing below it.'))
  return { ...summary(rows), problems, ignoredColumns: header.ignored }
}

function seenBefore(seen: Map<string, number>, row: FileRating): number | null {
  const key = [row.panelist, row.unit, row.descriptor, row.replicate].join('\u0001')
  const first = seen.get(key)
  if (first === undefined) seen.set(key, row.line)
  return first ?? null
}

const twice = (record: CsvRecord, first: number): FileProblem =>
  problem(
    record.line,
    null,
    'duplicate',
    `Line ${first} already holds this listener’s rating of this unit, descriptor and replicate.`,
  )

const tooManyUnits = (record: CsvRecord): FileProblem =>
  problem(
    record.line,
    'unit',
    'too-many-units',
    `This is the ${MOST_UNITS + 1}st unit; one analysis compares at most ${MOST_UNITS}. The rest was not read.`,
  )

function nothing(...problems: FileProblem[]): RatingsFile {
  return { ...summary([]), problems, ignoredColumns: [] }
}

function summary(rows: readonly FileRating[]): Omit<RatingsFile, 'problems' | 'ignoredColumns'> {
  const ranges = new Map<string, { low: number; high: number }>()
  let scale: { low: number; high: number } | null = null
  for (const { descriptor, score } of rows) {
    if (score === null) continue
    const range = ranges.get(descriptor)
    ranges.set(descriptor, widened(range, score))
    scale = widened(scale, score)
  }
  const names = (pick: (row: FileRating) => string): string[] => [...new Set(rows.map(pick))]
  return {
    rows,
    scale,
    ranges: [...ranges].map(([name, range]) => ({ name, ...range })),
    descriptors: names((row) => row.descriptor),
    units: names((row) => row.unit),
    panelists: names((row) => row.panelist),
  }
}

const widened = (
  range: { low: number; high: number } | null | undefined,
  score: number,
): { low: number; high: number } =>
  range ? { low: Math.min(range.low, score), high: Math.max(range.high, score) } : { low: score, high: score }

/**
 * Writes ratings as the long file, always in the same order (listener, unit, descriptor, replicate; numbers by size), so
 * that equal ratings give equal bytes. `parseRatingsFile` takes it back, names and all. Lines end in LF; `code` and
 * `cant_tell` are written where a row has one.
 */
export function writeRatingsFile(rows: readonly (LongRating & { readonly code?: string | null })[]): string {
  const withCode = rows.some((row) => row.code)
  const withCantTell = rows.some((row) => row.cantTell)
  const header = knownColumns.filter(
    (column) => (column !== 'code' || withCode) && (column !== 'cant_tell' || withCantTell),
  )
  const lines = [...rows].sort(inOrder).map((row) => {
    const fields = [
      asText(row.panelist.normalize('NFC')),
      asText(row.unit.normalize('NFC')),
      asText(row.descriptor.normalize('NFC')),
      asText(String(row.replicate)),
      row.position === null ? '' : String(row.position),
      row.score === null ? '' : String(row.score),
    ]
    if (withCode) fields.push(row.code ?? '')
    if (withCantTell) fields.push(row.cantTell ? 'yes' : '')
    return csvLine(fields)
  })
  return [header.join(','), ...lines, ''].join('\n')
}

const inOrder = (a: LongRating, b: LongRating): number =>
  compare(a.panelist, b.panelist) ||
  compare(a.unit, b.unit) ||
  compare(a.descriptor, b.descriptor) ||
  compare(String(a.replicate), String(b.replicate))

/** Whole numbers by size and before words; words by code point. */
function compare(a: string, b: string): number {
  const left = /^\d{1,15}$/.test(a)
  const right = /^\d{1,15}$/.test(b)
  if (left && right && Number(a) !== Number(b)) return Number(a) - Number(b)
  if (left !== right) return left ? -1 : 1
  return a < b ? -1 : a > b ? 1 : 0
}
