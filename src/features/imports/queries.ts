import { queryOptions } from '@tanstack/react-query'
import { previewImport } from '#shared/contracts/imports.ts'
import { call } from '#src/lib/call.ts'

export interface Reading {
  /** Counts what was chosen or pasted, so that a text of megabytes is not itself a key. */
  nr: number
  text: string
}

/** The server's own reading of the file: it confirms what the browser read, and stores nothing. */
export const confirmQuery = (panel: string, reading: Reading | null) =>
  queryOptions({
    queryKey: [previewImport.id, panel, reading?.nr ?? 0],
    queryFn: ({ signal }) =>
      call(previewImport, { params: { panel }, body: { text: reading?.text ?? '' }, signal }),
    enabled: reading !== null,
    staleTime: Infinity,
    gcTime: 0,
  })
