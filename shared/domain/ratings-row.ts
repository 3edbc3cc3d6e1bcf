import { asWritten } from './csv.ts'
import type { CsvRecord } from './csv.ts'
import { limits } from './limits.ts'
import type { FileRating } from './ratings-file.ts'
import type { Header, KnownColumn } from './ratings-header.ts'
import { problem, shown } from './ratings-problems.ts'
import type { FileProblem, ProblemReason } from './ratings-problems.ts'

const NUMBER = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i
const LARGEST = 1e9

type Fault = (column: KnownColumn | null, reason: ProblemReason, text: string) => void

export interface ReadRow {
  readonly row: FileRating | null
  readonly problems: readonly FileProblem[]
}

/**
 * A reader of one file's records: each becomes a rating, or everything that is wrong with it. Fields that were good once
 * are not looked at again: a long file repeats few names and numbers.
 */
export function rowReader(header: Header): (record: CsvRecord) => ReadRow {
  let problems: FileProblem[] = []
  let line = 0
  const fault: Fault = (column, reason, text) => problems.push(problem(line, column, reason, text))
  const remembered = <T>(read: (field: string) => T): ((field: string) => T) => {
    const good = new Map<string, T>()
    return (field) => {
      const known = good.get(field)
      if (known !== undefined) return known
      const before = problems.length
      const value = read(field)
      if (problems.length === before) good.set(field, value)
      return value
    }
  }
  const at = (column: KnownColumn): ((record: CsvRecord) => string) => {
    const place = header.place.get(column)
    return place === undefined ? () => '' : (record) => record.fields[place] ?? ''
  }
  const text = (column: KnownColumn, needed: boolean): ((record: CsvRecord) => string) => {
    const field = at(column)
    const read = remembered((raw) => readText(column, raw, needed, fault))
    return (record) => read(field(record))
  }
  const panelist = text('panelist', true)
  const unit = text('unit', true)
  const descriptor = text('descriptor', true)
  const replicate = text('replicate', false)
  const code = text('code', false)
  const decimalComma = header.separator !== ','
  const scoreField = at('score')
  const score = remembered((raw) => readScore(raw.trim(), decimalComma, fault))
  const positionField = at('position')
  const position = remembered((raw) => readPosition(raw.trim(), fault))
  const cantTellField = at('cant_tell')
  return (record) => {
    problems = []
    line = record.line
    checkShape(record, header.width, fault)
    if (problems.length > 0) return { row: null, problems }
    const given = score(scoreField(record))
    const row: FileRating = {
      panelist: panelist(record),
      unit: unit(record),
      descriptor: descriptor(record),
      replicate: replicate(record) || '1',
      position: position(positionField(record)),
      score: given,
      cantTell: readCantTell(cantTellField(record).trim(), given, fault),
      code: code(record) || null,
      line,
    }
    return { row: problems.length === 0 ? row : null, problems }
  }
}

function checkShape(record: CsvRecord, width: number, fault: Fault): void {
  if (record.unclosed) {
    fault(null, 'unclosed-quote', 'A quotation mark is opened here and never closed.')
    return
  }
  const found = record.fields.length
  if (found === width) return
  const counts = `There are ${found} fields under ${width} columns.`
  if (found < width) fault(null, 'too-few-fields', counts)
  else if (record.fields.slice(width).some((field) => field.trim() !== ''))
    fault(null, 'too-many-fields', counts)
}

function readText(column: KnownColumn, field: string, needed: boolean, fault: Fault): string {
  const value = asWritten(field.trim()).trim().normalize('NFC')
  if (value === '' && needed) fault(column, 'empty-name', `The ${column} is empty.`)
  if (value.length > limits.name) {
    fault(column, 'too-long', `The ${column} ${shown(value)} is longer than ${limits.name} characters.`)
  }
  if (value.includes('\uFFFD')) {
    fault(
      column,
      'unreadable-letters',
      `The ${column} has letters that cannot be read; save the file as UTF-8.`,
    )
  }
  return value
}

function readScore(field: string, decimalComma: boolean, fault: Fault): number | null {
  if (field === '') return null
  const plain = decimalComma ? field.replace(',', '.') : field
  if (!NUMBER.test(plain)) {
    fault(
      'score',
      'not-a-number',
      `The score ${shown(field)} is not a number; leave it blank where there is none.`,
    )
    return null
  }
  const score = Number(plain)
  if (Math.abs(score) <= LARGEST) return score
  fault('score', 'number-too-large', `The score ${shown(field)} is too large.`)
  return null
}

function readPosition(field: string, fault: Fault): number | null {
  if (field === '') return null
  if (/^[1-9]\d{0,3}$/.test(field)) return Number(field)
  fault('position', 'position-not-a-count', `The position ${shown(field)} is not a whole number from 1 on.`)
  return null
}

function readCantTell(field: string, score: number | null, fault: Fault): boolean {
  if (field === '' || /^(no|false|0)$/i.test(field)) return false
  if (!/^(yes|true|1)$/i.test(field)) {
    fault('cant_tell', 'cant-tell-not-yes-or-no', `${shown(field)} is neither yes nor no.`)
    return false
  }
  if (score !== null)
    fault('cant_tell', 'cant-tell-with-score', 'This row has a score and says “can’t tell”.')
  return true
}
