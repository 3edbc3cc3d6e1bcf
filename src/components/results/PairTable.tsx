import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import { DataTable } from '../ui/DataTable.tsx'
import { asComponent, asDf, asP, asPoints, asRange } from './figures.ts'

/** Every pair of units: difference, its simultaneous interval, standard error, degrees of freedom, p. */
export function PairTable({ result }: { result: DescriptorResult }) {
  const { scale, name } = result.descriptor
  if (result.pairs.length === 0) return <p className="note">No pair of units can be compared.</p>
  return (
    <DataTable
      caption={`${name}: every pair of units; intervals hold together at 95 % (Tukey–Kramer)`}
      density="close"
      rows={result.pairs}
      rowKey={(pair) => `${pair.a} − ${pair.b}`}
      columns={[
        { key: 'pair', header: 'Pair', cell: (pair) => `${pair.a} − ${pair.b}` },
        {
          key: 'difference',
          header: 'Difference',
          numeric: true,
          cell: (pair) => asPoints(pair.difference, scale),
        },
        {
          key: 'interval',
          header: 'Interval',
          numeric: true,
          cell: (pair) => asRange(pair.low, pair.high, scale),
        },
        {
          key: 'se',
          header: 'Standard error',
          numeric: true,
          cell: (pair) => asComponent(pair.standardError),
        },
        { key: 'df', header: 'df', numeric: true, cell: (pair) => asDf(pair.df) },
        { key: 'p', header: 'p', numeric: true, cell: (pair) => asP(pair.p) },
      ]}
    />
  )
}
