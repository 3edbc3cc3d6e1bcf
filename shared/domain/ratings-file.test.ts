import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseRatingsFile, writeRatingsFile } from './ratings-file.ts'

const HEADER = 'panelist,unit,descriptor,replicate,position,score'
const file = (...lines: string[]): string => [HEADER, ...lines].join('\n')
const problemsOf = (text: string, most?: number) =>
  parseRatingsFile(text, most).problems.map(({ line, column, reason }) => [line, column, reason])

describe('a ratings file', () => {
  it('is read row by row; a blank score is missing', () => {
    const found = parseRatingsFile(
      file('1,Tern One,Bass,1,2,64', '1,Dunlin,Bass,1,1,', '2,Dunlin,Bass,2,,7.5'),
    )
    expect(found.problems).toEqual([])
    expect(found.rows[0]).toEqual({
      panelist: '1',
      unit: 'Tern One',
      descriptor: 'Bass',
      replicate: '1',
      position: 2,
      score: 64,
      cantTell: false,
      code: null,
      line: 2,
    })
    expect(found.rows[1]!.score).toBeNull()
    expect(found.scale).toEqual({ low: 7.5, high: 64 })
    expect(found.ranges).toEqual([{ name: 'Bass', low: 7.5, high: 64 }])
    expect([found.panelists, found.units, found.descriptors]).toEqual([
      ['1', '2'],
      ['Tern One', 'Dunlin'],
      ['Bass'],
    ])
  })

  it.each([
    ['comma', ',', '7.5'],
    ['semicolon and decimal comma', ';', '7,5'],
    ['semicolon and decimal point', ';', '7.5'],
    ['tab and decimal comma', '\t', '7,5'],
  ])('with %s says the same', (_, separator, score) => {
    const text = `\uFEFF${HEADER.replaceAll(',', separator)}\r\n${['a', 'A', 'Bass', '1', '', score].join(separator)}\r\n`
    const found = parseRatingsFile(text)
    expect(found.problems).toEqual([])
    expect(found.rows[0]!.score).toBe(7.5)
  })

  it('may order its columns otherwise, leave replicate and position out, and hold others', () => {
    const found = parseRatingsFile(
      'Score,Unit,Panelist,Descriptor,Code,Cant tell,Mood\n,A,x,Bass,417,yes,fine\n3,B,x,Bass,903,no,',
    )
    expect(found.problems).toEqual([])
    expect(found.ignoredColumns).toEqual(['Mood'])
    expect(found.rows[0]).toMatchObject({
      code: '417',
      cantTell: true,
      score: null,
      replicate: '1',
      position: null,
    })
  })

  it('takes names in any script, quoted commas and emoji; equal letters written two ways are one name', () => {
    const found = parseRatingsFile(
      file('"Étoile, one",A,Bass,1,,1', 'E\u0301toile two,שלום,👂 Bass,1,,2', 'Étoile two,B,👂 Bass,1,,2'),
    )
    expect(found.problems).toEqual([])
    expect(found.panelists).toEqual(['Étoile, one', 'Étoile two'])
    expect(found.units).toEqual(['A', 'שלום', 'B'])
  })
})

describe('every fault is named with its line', () => {
  it('in the rows, and the good rows are still there', () => {
    const text = file(
      '1,A,Bass,1,1,50',
      '1,B,Bass,1,2,fifty',
      ',C,Bass,1,3,50',
      '1,C,,1,zero,50',
      '1,D,Bass,1,4,50,extra',
      '1,E,Bass,1',
      '1,A,Bass,1,5,51',
      `${'x'.repeat(81)},A,Bass,1,1,50`,
      '2,A,Bass,1,1,1e12',
      '3,\uFFFDA,Bass,1,1,5',
      '4,A,Bass,1,1,NaN',
      '5,A,Bass,1,1,50',
    )
    const found = parseRatingsFile(text)
    expect(problemsOf(text)).toEqual([
      [3, 'score', 'not-a-number'],
      [4, 'panelist', 'empty-name'],
      [5, 'descriptor', 'empty-name'],
      [5, 'position', 'position-not-a-count'],
      [6, null, 'too-many-fields'],
      [7, null, 'too-few-fields'],
      [8, null, 'duplicate'],
      [9, 'panelist', 'too-long'],
      [10, 'score', 'number-too-large'],
      [11, 'unit', 'unreadable-letters'],
      [12, 'score', 'not-a-number'],
    ])
    expect(found.problems.find(({ reason }) => reason === 'duplicate')!.text).toContain('Line 2')
    expect(found.rows.map((row) => row.line)).toEqual([2, 13])
  })
  it('in the can’t-tell column', () => {
    expect(problemsOf(`${HEADER},cant_tell\n1,A,Bass,1,,5,yes\n1,B,Bass,1,,,perhaps`)).toEqual([
      [2, 'cant_tell', 'cant-tell-with-score'],
      [3, 'cant_tell', 'cant-tell-not-yes-or-no'],
    ])
  })
  it('in the header', () => {
    expect(problemsOf('panelist,unit,score\n1,A,5')).toEqual([[1, 'descriptor', 'missing-column']])
    expect(problemsOf('panelist,unit,descriptor,score,score\n1,A,b,5,5')).toEqual([
      [1, 'score', 'column-twice'],
    ])
    expect(problemsOf('hello').map(([, , reason]) => reason)).toEqual(
      Array.from({ length: 4 }, () => 'missing-column'),
    )
  })
  it('in the file as a whole', () => {
    expect(problemsOf('')).toEqual([[1, null, 'empty-file']])
    expect(problemsOf(' \n ')).toEqual([[1, null, 'empty-file']])
    expect(problemsOf('MZ\u0000\u0003')).toEqual([[1, null, 'not-a-text-file']])
    expect(problemsOf(`${HEADER}\n`)).toEqual([[1, null, 'no-rows']])
    expect(problemsOf(file('1,A,Bass,1,1,"50', '1,B,Bass,1,1,50'))).toEqual([[2, null, 'unclosed-quote']])
    const three = file('1,A,b,1,1,5', '1,B,b,1,1,5', '1,C,b,1,1,5')
    expect(problemsOf(three, 2)).toEqual([[4, null, 'too-many-rows']])
    expect(problemsOf(three, 3)).toEqual([])
  })
  it('stops at more units than one analysis compares', () => {
    const many = file(...Array.from({ length: 502 }, (_, i) => `1,U${i},Bass,1,,5`))
    expect(problemsOf(many)).toEqual([[502, 'unit', 'too-many-units']])
  })
  it('keeps a comma between digits from being guessed at where the comma separates', () => {
    expect(problemsOf(file('1,A,Bass,1,1,"7,5"'))).toEqual([[2, 'score', 'not-a-number']])
  })
})

describe('writing', () => {
  const name = fc
    .string({
      unit: fc.constantFrom('a', 'Z', '=', '-', "'", '"', ',', ';', ' ', 'é', '👂', '7'),
      minLength: 1,
      maxLength: 12,
    })
    .map((text) => text.trim().normalize('NFC'))
    .filter((text) => text !== '')
  const row = fc.record({
    panelist: name,
    unit: name,
    descriptor: name,
    replicate: fc.constantFrom('1', '2'),
    position: fc.option(fc.integer({ min: 1, max: 12 })),
    score: fc.option(
      fc.oneof(fc.integer({ min: -50, max: 150 }), fc.double({ min: -1e6, max: 1e6, noNaN: true })),
    ),
    code: fc.option(fc.constantFrom('417', '903')),
  })
  const rows = fc.uniqueArray(row, {
    minLength: 1,
    selector: ({ panelist, unit, descriptor, replicate }) =>
      JSON.stringify([panelist, unit, descriptor, replicate]),
  })

  it('is taken back by reading, formulas and quotes and all, and gives the same bytes again', () => {
    fc.assert(
      fc.property(rows, (given) => {
        const text = writeRatingsFile(given)
        const found = parseRatingsFile(text)
        expect(found.problems).toEqual([])
        const key = (entry: {
          panelist: string
          unit: string
          descriptor: string
          replicate: string | number
        }): string => JSON.stringify([entry.panelist, entry.unit, entry.descriptor, entry.replicate])
        const back = new Map(found.rows.map((entry) => [key(entry), entry]))
        for (const entry of given) {
          const read = back.get(key(entry))!
          expect(read.score).toBe(entry.score === null ? null : entry.score + 0)
          expect([read.position, read.code]).toEqual([entry.position, entry.code])
        }
        expect(writeRatingsFile(found.rows)).toBe(text)
        expect(writeRatingsFile([...given].reverse())).toBe(text)
      }),
    )
  })
  it('puts listener 2 before listener 10', () => {
    const text = writeRatingsFile(
      ['10', '2'].map((panelist) => ({
        panelist,
        unit: 'A',
        descriptor: 'b',
        replicate: 1,
        position: null,
        score: 5,
      })),
    )
    expect(text).toBe(`${HEADER}\n2,A,b,1,,5\n10,A,b,1,,5\n`)
  })
  it('says can’t tell only where somebody could not', () => {
    const rating = {
      panelist: '1',
      unit: 'A',
      descriptor: 'b',
      replicate: 1,
      position: 3,
      score: null,
      cantTell: true,
    }
    expect(writeRatingsFile([rating])).toBe(`${HEADER},cant_tell\n1,A,b,1,3,,yes\n`)
  })
})
