import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'
import { endpoint } from './endpoint.ts'
import { atPanel } from './panels.ts'
import { id, line } from './text.ts'

export const importFault = z.strictObject({
  line: z.number().int(),
  column: z.string().nullable(),
  reason: z.string(),
  text: z.string(),
})
export const importPreview = z.strictObject({
  rows: z.number().int(),
  panelists: z.number().int(),
  units: z.array(z.string()),
  descriptors: z.array(z.strictObject({ name: z.string(), low: z.number(), high: z.number() })),
  missing: z.number().int(),
  faults: z.array(importFault),
  faultCount: z.number().int(),
})
export type ImportPreview = z.infer<typeof importPreview>

const text = z.string().min(1, 'The file is empty.').max(limits.importBytes, 'The file is larger than 8 MB.')
export const importBody = z.strictObject({
  title: line(limits.title, 'Give the round a title.'),
  question: line(limits.question, 'Say what the round was about.'),
  text,
  leaveOutFaults: z.boolean().default(false),
  primaryDescriptor: z.string().max(limits.name).optional(),
})

export const previewImport = endpoint('POST /api/panels/:panel/imports/preview', {
  id: 'previewImport',
  audience: 'panel',
  summary: 'Read a ratings file and name every bad row; stores nothing',
  params: atPanel,
  body: z.strictObject({ text }),
  response: importPreview,
  bodyLimit: 2 * limits.importBytes + 4096,
})
export const storeImport = endpoint('POST /api/panels/:panel/imports', {
  id: 'storeImport',
  audience: 'panel',
  summary: 'Store a ratings file as an imported round',
  params: atPanel,
  body: importBody,
  response: z.strictObject({ round: id }),
  idempotent: true,
  bodyLimit: 2 * limits.importBytes + 8192,
})
