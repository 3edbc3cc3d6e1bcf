import { parse } from 'csv-parse/sync'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { asText, asWritten, csvLine, readCsv } from './csv.ts'

const fieldsOf = (text: string, separator = ','): string[][] =>
  readCsv(text, separator).map((record) => [...record.fields])

describe('reading comma-separated text', () => {
  it('takes quotes, doubled quotes and line ends inside them', () => {
    expect(fieldsOf('a,"b, ""c""\nd",e\n1,2,3')).toEqual([
      ['a', 'b, "c"\nd', 'e'],
      ['1', '2', '3'],
    ])
  })
  it('names the line on which each record begins, blank lines and quoted ones counted', () => {
    const found = readCsv('\uFEFFa,b\r\n\r\n"x\r\ny",2\r\n3,4\r\n', ',')
    expect(found.map((record) => record.line)).toEqual([1, 3, 5])
    expect(found[0]!.fields).toEqual(['a', 'b'])
  })
  it('takes LF, CRLF and CR alike, with or without an end to the last line', () => {
    const expected = [
      ['a', 'b'],
      ['1', '2'],
    ]
    for (const text of ['a,b\n1,2', 'a,b\r\n1,2\r\n', 'a,b\r1,2\r']) expect(fieldsOf(text)).toEqual(expected)
  })
  it('marks a quote that never closes', () => {
    expect(readCsv('a,b\n1,"2\n3,4', ',')[1]).toMatchObject({ line: 2, unclosed: true })
  })
  it('stops after as many records as it was asked for', () => {
    expect(readCsv('a\nb\nc', ',', 2)).toHaveLength(2)
  })
  it('agrees with csv-parse on any text it can write', () => {
    const field = fc.string({ unit: fc.constantFrom('a', 'é', ',', '"', ';', '\n', ' ', '=', '1', '👂') })
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.constant('x'), field, field), { minLength: 1 }), (rows) => {
        const text = rows.map(csvLine).join('\n')
        const ours = fieldsOf(text)
        expect(ours).toEqual(rows)
        expect(ours).toEqual(parse(text, { relax_column_count: true }))
      }),
    )
  })
})

describe('names that a spreadsheet would run', () => {
  it('get an apostrophe and come back as they were', () => {
    expect(asText('=1+1')).toBe("'=1+1")
    expect(asText('Tern One')).toBe('Tern One')
    fc.assert(
      fc.property(fc.string(), (name) => {
        expect(asWritten(asText(name))).toBe(name)
        expect(asText(name)).not.toMatch(/^[=+\-@\t\r]/)
      }),
    )
  })
})
