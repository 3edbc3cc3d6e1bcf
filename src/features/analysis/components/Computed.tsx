import type { Agreement } from '#shared/contracts/analysis.ts'
import { CopyLine } from '#src/components/ui/CopyLine.tsx'
import { DataTable } from '#src/components/ui/DataTable.tsx'
import { Disclosure } from '#src/components/ui/Disclosure.tsx'
import { moment } from '#src/lib/dates.ts'

/** When and by which version this was computed, from which file; and, for the organiser, who is which number. */
export function Computed({ agreement }: { agreement: Agreement }) {
  const { computed, listeners } = agreement
  const named = listeners.filter((one) => one.name !== null)
  return (
    <>
      <p className="measure">
        Computed {moment(computed.at)} by Scrim’s library {computed.library}, with seed{' '}
        <span className="break-all">{computed.seed}</span>. The same ratings and the same seed give the same
        figures.
      </p>
      <div className="mt-4">
        <CopyLine label="Digest of the ratings" value={computed.digest} />
      </div>
      {named.length > 0 && (
        <Disclosure summary="Who has which number">
          <p className="note measure">
            Only you see this. Names never leave the panel: public files and pages carry the numbers.
          </p>
          <DataTable
            caption="Listeners and their numbers"
            captionHidden
            density="close"
            stays
            rows={named}
            rowKey={(one) => one.listener}
            columns={[
              { key: 'name', header: 'Name', cell: (one) => one.name },
              { key: 'number', header: 'Listener number', numeric: true, cell: (one) => one.listener },
            ]}
          />
        </Disclosure>
      )}
    </>
  )
}
