import type { ImportPreview } from '#shared/contracts/imports.ts'
import { parseRatingsFile } from '#shared/domain/ratings-file.ts'
import { counted, listed } from '#src/lib/counts.ts'

/** What the browser reads in a ratings file, in the shape in which the server confirms it. */
export function previewOf(text: string): ImportPreview {
  const file = parseRatingsFile(text)
  return {
    rows: file.rows.length,
    panelists: file.panelists.length,
    units: [...file.units],
    descriptors: file.ranges.map((range) => ({ ...range })),
    missing: file.rows.filter((row) => row.score === null).length,
    faults: file.problems.map(({ line, column, reason, text: sentence }) => ({
      line,
      column,
      reason,
      text: sentence,
    })),
    faultCount: file.problems.length,
  }
}

/** "54 rows: six listeners, three units (A, B and C), one descriptor. Two rows have no score." */
export function previewWords(preview: ImportPreview): string {
  const rows = preview.rows === 1 ? '1 row' : `${preview.rows} rows`
  const parts = [
    counted(preview.panelists, 'listener'),
    `${counted(preview.units.length, 'unit')} (${listed(preview.units)})`,
    counted(preview.descriptors.length, 'descriptor'),
  ]
  const missing =
    preview.missing === 0
      ? ''
      : ` ${preview.missing} ${preview.missing === 1 ? 'row has' : 'rows have'} no score: counted as not rated.`
  return `${rows}: ${listed(parts)}.${missing}`
}

/** Why this reading cannot be stored yet; null where it can. */
export function heldBack(preview: ImportPreview | null, leaveOut: boolean): string | null {
  if (preview === null) return 'Choose or paste a ratings file first.'
  if (preview.rows === 0) return 'No row of this file can be read.'
  if (preview.descriptors.length === 0) return 'No row has a score.'
  if (preview.units.length < 2) return 'There is one unit only; a comparison needs two.'
  if (preview.faultCount > 0 && !leaveOut)
    return preview.faultCount === 1
      ? 'Correct this row in the file and choose it again, or leave it out.'
      : 'Correct these rows in the file and choose it again, or leave them out.'
  return null
}

/** Whether browser and server counted the same; the server's reading is the one that counts. */
export const sameReading = (one: ImportPreview, other: ImportPreview): boolean =>
  one.rows === other.rows && one.panelists === other.panelists && one.faultCount === other.faultCount
