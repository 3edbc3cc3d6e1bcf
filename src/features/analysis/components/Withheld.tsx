import type { Agreement } from '#shared/contracts/analysis.ts'
import { DataTable } from '#src/components/ui/DataTable.tsx'
import { exclusionWords, howSure } from '../servings-words.ts'

interface ListProps {
  agreement: Agreement
  called: (listener: string) => string
}

/** Who was left out or flagged, by which frozen rule. */
export function Exclusions({ agreement, called }: ListProps) {
  if (agreement.exclusions.length === 0)
    return <p>No rule that was frozen at opening touched anybody. All ratings count.</p>
  return (
    <DataTable
      caption="Listeners touched by a frozen rule"
      captionHidden
      rows={agreement.exclusions}
      rowKey={(one) => `${one.listener} ${one.rule}`}
      columns={[
        { key: 'listener', header: 'Listener', cell: (one) => called(one.listener) },
        { key: 'rule', header: 'Rule', cell: (one) => one.rule },
        { key: 'reason', header: 'Reason', cell: (one) => one.reason },
        { key: 'what', header: 'What it did', cell: exclusionWords },
      ]}
    />
  )
}

/** Who thought that they knew a unit under its code, and what it was. */
export function Recognised({ agreement, called }: ListProps) {
  if (agreement.recognised.length === 0) return <p>Nobody said that they recognised a unit.</p>
  return (
    <DataTable
      caption="Units that somebody thought they recognised"
      captionHidden
      rows={agreement.recognised}
      rowKey={(one) => `${one.listener} ${one.code}`}
      columns={[
        { key: 'listener', header: 'Listener', cell: (one) => called(one.listener) },
        { key: 'code', header: 'Code', cell: (one) => one.code },
        { key: 'text', header: 'They wrote', cell: (one) => `“${one.text}”` },
        { key: 'sure', header: 'How sure', cell: (one) => howSure(one.sure) },
        { key: 'unit', header: 'It was', cell: (one) => one.unit },
      ]}
    />
  )
}
