import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import { FamilyName } from '#src/components/FamilySign.tsx'
import { AgreementScale } from '#src/components/charts/AgreementScale.tsx'
import { byFamily } from '#src/components/results/by-family.ts'
import { figureWords, isSaid, steadyShort, wWords } from '#src/components/results/agreement-words.ts'
import { DataTable } from '#src/components/ui/DataTable.tsx'

function Scale({ result, ends }: { result: DescriptorResult; ends: boolean }) {
  const { single } = result.agreement
  if (!isSaid(single) || !single.interval) return <span className="note">–</span>
  return (
    <span className="block w-44">
      <AgreementScale
        estimate={single.estimate}
        low={single.interval.low}
        high={single.interval.high}
        family={result.descriptor.family}
        ends={ends}
        label={result.descriptor.name}
      />
    </span>
  )
}

/** Every descriptor on one line: do listeners agree, how sure is that, is the panel's mean steady, alpha, W. */
export function AtAGlance({ results }: { results: DescriptorResult[] }) {
  const rows = byFamily(results).flatMap((group) => group.results)
  const last = rows[rows.length - 1]
  return (
    <DataTable
      caption="Agreement on each descriptor"
      captionHidden
      rows={rows}
      rowKey={(result) => result.descriptor.key}
      columns={[
        {
          key: 'descriptor',
          header: 'Descriptor',
          cell: ({ descriptor }) => (
            <a href={`#descriptor-${descriptor.key}`} className="no-underline hover:underline">
              <FamilyName family={descriptor.family}>{descriptor.name}</FamilyName>
            </a>
          ),
        },
        {
          key: 'words',
          header: 'Do listeners agree?',
          cell: ({ agreement }) => (
            <>
              <span className="block text-left">{agreement.sentence}</span>
              <span className="note block text-left">{figureWords(agreement.single)}</span>
            </>
          ),
        },
        {
          key: 'scale',
          header: 'From chance to as one',
          cell: (result) => <Scale result={result} ends={result === last} />,
        },
        {
          key: 'steady',
          header: 'Panel’s mean',
          cell: ({ agreement }) => (
            <>
              <span className="block">{steadyShort(agreement.steadiness) || '–'}</span>
              <span className="note block">{figureWords(agreement.average)}</span>
            </>
          ),
        },
      ]}
    />
  )
}

/** The two coefficients that other papers print, for whoever compares. */
export function Coefficients({ results }: { results: DescriptorResult[] }) {
  return (
    <DataTable
      caption="Coefficients: Krippendorff’s alpha (interval scale) with its jackknife 95 % interval; Kendall’s W with p"
      density="close"
      rows={byFamily(results).flatMap((group) => group.results)}
      rowKey={(result) => result.descriptor.key}
      columns={[
        { key: 'descriptor', header: 'Descriptor', cell: ({ descriptor }) => descriptor.name },
        { key: 'alpha', header: 'Alpha', cell: ({ agreement }) => figureWords(agreement.alpha) },
        { key: 'w', header: 'W', cell: ({ agreement }) => wWords(agreement.w) },
        { key: 'listeners', header: 'Listeners', numeric: true, cell: ({ counts }) => counts.listeners },
        { key: 'ratings', header: 'Ratings', numeric: true, cell: ({ counts }) => counts.ratings },
        {
          key: 'missing',
          header: 'Pairs without a score',
          numeric: true,
          cell: ({ counts }) => counts.missingCells,
        },
        { key: 'cantTell', header: 'Can’t tell', numeric: true, cell: ({ counts }) => counts.cantTell },
      ]}
    />
  )
}
