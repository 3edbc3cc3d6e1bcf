import type { ImportPreview } from '#shared/contracts/imports.ts'
import { DataTable } from '#src/components/ui/DataTable.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { previewWords } from '../preview.ts'

const SHOWN = 100

/** What was read: counts, and each descriptor's scale as the file has it. */
export function WhatWasRead({ preview }: { preview: ImportPreview }) {
  if (preview.rows === 0) return null
  return (
    <>
      <p className="lead">{previewWords(preview)}</p>
      <div className="mt-4">
        <DataTable
          caption="Scales, as the file has them"
          density="close"
          stays
          rows={preview.descriptors}
          rowKey={(one) => one.name}
          columns={[
            { key: 'name', header: 'Descriptor', cell: (one) => one.name },
            { key: 'low', header: 'Lowest score', numeric: true, cell: (one) => one.low },
            { key: 'high', header: 'Highest score', numeric: true, cell: (one) => one.high },
          ]}
        />
      </div>
    </>
  )
}

/** Every bad row by line and reason. */
export function BadRows({ preview }: { preview: ImportPreview }) {
  if (preview.faultCount === 0) return <Notice kind="done" title="Every row can be read." />
  const shown = preview.faults.slice(0, SHOWN)
  const more = preview.faultCount - shown.length
  return (
    <>
      <Notice
        kind="signal"
        title={
          preview.faultCount === 1 ? 'One fault in the file' : `${preview.faultCount} faults in the file`
        }
      >
        {preview.faultCount === 1
          ? 'Nothing is stored while it stands, unless you leave this row out.'
          : 'Nothing is stored while they stand, unless you leave these rows out.'}
      </Notice>
      <div className="mt-4">
        <DataTable
          caption="Faults by line"
          captionHidden
          density="close"
          rows={shown.map((fault, nth) => ({ ...fault, nth }))}
          rowKey={(fault) => String(fault.nth)}
          columns={[
            { key: 'line', header: 'Line', cell: (fault) => `Line ${fault.line}` },
            { key: 'column', header: 'Column', cell: (fault) => fault.column ?? 'whole line' },
            { key: 'why', header: 'What is wrong', cell: (fault) => fault.text },
          ]}
        />
        {more > 0 && <p className="note mt-2">And {more} more.</p>}
      </div>
    </>
  )
}
