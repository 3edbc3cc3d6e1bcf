/**
 * Comma-separated text, read and written by RFC 4180. An own reader, because the library took over ten times as long for
 * 48,000 lines, in the browser too, and because every record must keep the line on which it begins; a test compares the
 * two.
 */
export interface CsvRecord {
  /** Line of the file on which the record begins, from 1. */
  readonly line: number
  readonly fields: readonly string[]
  /** A quoted field that never ends: the rest of the file is inside it. */
  readonly unclosed?: true
}

/**
 * Records of a text; empty lines are passed over, a byte-order mark is dropped, LF, CRLF and CR all end a line.
 *
 * @param most stop after this many records
 * @example
 * readCsv('a,b\n1,"2,5"', ',').map((record) => record.fields) // => [['a', 'b'], ['1', '2,5']]
 */
export function readCsv(text: string, separator: string, most = Infinity): CsvRecord[] {
  const clean = withPlainLineEnds(text)
  const records: CsvRecord[] = []
  let line = 1
  for (let at = 0; at < clean.length && records.length < most;) {
    const found = clean.indexOf('\n', at)
    const end = found < 0 ? clean.length : found
    const row = clean.slice(at, end)
    if (!row.includes('"')) {
      if (row.trim() !== '') records.push({ line, fields: row.split(separator) })
      at = end + 1
      line++
      continue
    }
    const quoted = readQuoted(clean, at, separator)
    records.push({ line, fields: quoted.fields, ...(quoted.unclosed ? { unclosed: true } : {}) })
    for (let i = at; i < quoted.end; i++) if (clean.charCodeAt(i) === 10) line++
    line++
    at = quoted.end + 1
  }
  return records
}

function withPlainLineEnds(text: string): string {
  const start = text.startsWith('\uFEFF') ? text.slice(1) : text
  return start.includes('\r') ? start.replace(/\r\n?/g, '\n') : start
}

/** One record that holds a quote, from `at` to its line end. */
function readQuoted(
  text: string,
  at: number,
  separator: string,
): { fields: string[]; end: number; unclosed: boolean } {
  const fields: string[] = []
  let field = ''
  let inside = false
  let fresh = true
  let i = at
  for (; i < text.length; i++) {
    const char = text[i]!
    if (inside) {
      if (char !== '"') field += char
      else if (text[i + 1] === '"') field += text[i++]
      else inside = false
    } else if (char === '\n') break
    else if (char === separator) {
      fields.push(field)
      field = ''
      fresh = true
      continue
    } else if (char === '"' && fresh) inside = true
    else field += char
    if (char !== ' ') fresh = false
  }
  fields.push(field)
  return { fields, end: i, unclosed: inside }
}

/**
 * One record as a line without its end. Fields with commas, quotes, line ends or spaces at an end are quoted.
 *
 * @example
 * csvLine(['a', 'say "so"', '1,5']) // => 'a,"say ""so""","1,5"'
 */
export const csvLine = (fields: readonly string[]): string => fields.map(quoted).join(',')

const quoted = (field: string): string =>
  /[",;\t\n\r]|^\s|\s$/.test(field) ? `"${field.replaceAll('"', '""')}"` : field

const FORMULA = /^[=+\-@\t\r']/

/** A name that a spreadsheet would run as a formula gets an apostrophe in front; `asWritten` takes it off again. */
export const asText = (name: string): string => (FORMULA.test(name) ? `'${name}` : name)

/** The name behind `asText`. */
export const asWritten = (field: string): string =>
  field.startsWith("'") && FORMULA.test(field.slice(1)) ? field.slice(1) : field
