import { describe, expect, it } from 'vitest'
import { heldBack, previewOf, previewWords } from './preview.ts'

const good = `panelist;unit;descriptor;replicate;position;score
Ada;Dunlin;width;1;1;62,5
Ada;Knot;width;1;2;40
Bo;Dunlin;width;1;2;
Bo;Knot;width;1;1;41
`

describe('the preview of a ratings file', () => {
  it('says rows, listeners, units and what has no score', () => {
    expect(previewWords(previewOf(good))).toBe(
      '4 rows: two listeners, two units (Dunlin and Knot) and one descriptor. 1 row has no score: counted as not rated.',
    )
    expect(previewOf(good).descriptors).toEqual([{ name: 'width', low: 40, high: 62.5 }])
  })

  it('names every bad row with its line and the reason', () => {
    const bad = previewOf(`${good}Cy;Dunlin;width;1;1;loud\n;Knot;width;1;2;50\n`)
    expect(bad.faults.map((fault) => [fault.line, fault.column, fault.reason])).toEqual([
      [6, 'score', 'not-a-number'],
      [7, 'panelist', 'empty-name'],
    ])
    expect(bad.rows).toBe(4)
  })

  it('holds the file back until bad rows are left out by choice', () => {
    const bad = previewOf(`${good}Cy;Dunlin;width;1;1;loud\n`)
    expect(heldBack(bad, false)).toMatch(/or leave (it|them) out/)
    expect(heldBack(bad, true)).toBeNull()
    expect(heldBack(previewOf(good), false)).toBeNull()
  })

  it('says what is lacking where nothing can be compared', () => {
    expect(heldBack(null, false)).toMatch(/Choose or paste/)
    expect(heldBack(previewOf('panelist,unit,descriptor,score\n'), false)).toMatch(/No row/)
    expect(heldBack(previewOf('panelist,unit,descriptor,score\nAda,Dunlin,width,50\n'), false)).toMatch(
      /one unit only/,
    )
    expect(heldBack(previewOf('panelist,unit,descriptor,score\nAda,Dunlin,width,\n'), false)).toMatch(
      /No row has a score/,
    )
  })
})
