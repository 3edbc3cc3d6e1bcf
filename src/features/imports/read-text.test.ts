import { describe, expect, it } from 'vitest'
import { decodeText, refusedFile } from './read-text.ts'

describe('reading a ratings file', () => {
  it('reads UTF-8, with or without a byte-order mark', () => {
    expect(decodeText(new TextEncoder().encode('panelist,unit\nÅsa,Dunlin'))).toEqual({
      text: 'panelist,unit\nÅsa,Dunlin',
      encoding: null,
    })
    expect(decodeText(Uint8Array.of(0xef, 0xbb, 0xbf, 0x61)).text).toBe('a')
  })

  it('reads what an older spreadsheet saves: Windows-1252, and UTF-16 by its mark', () => {
    expect(decodeText(Uint8Array.of(0xc5, 0x73, 0x61))).toEqual({ text: 'Åsa', encoding: 'Windows-1252' })
    expect(decodeText(Uint8Array.of(0xff, 0xfe, 0xc5, 0x00, 0x73, 0x00))).toEqual({
      text: 'Ås',
      encoding: 'UTF-16',
    })
  })

  it('refuses an empty file and one that is too large, and says so', () => {
    expect(refusedFile({ size: 0 })).toBe('The file is empty.')
    expect(refusedFile({ size: 9 * 1024 * 1024 })).toMatch(/larger than 8 MB/)
    expect(refusedFile({ size: 10 })).toBeNull()
  })
})
