import type { ReactNode } from 'react'
import { FolioSection, SelvedgeLines } from '#src/components/layout/Folio.tsx'
import { labelWords } from '#src/components/results/agreement-words.ts'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import type { Provenance } from '../disclosure-wording.ts'
import { whoPaid } from '../who-paid.ts'

interface OpeningProps {
  /** Panel, day, version. */
  selvedge: ReactNode[]
  headline: string
  /** Stands where there is no verdict sentence. */
  title: string
  summary: string
  certainty: string[]
  label: { key: string; words: string; fewest: number }
  labels: string[]
  units: { name: string; provenance: Provenance | null; lender: string | null; returnOn: string | null }[]
  /** The preview on the organiser's desk is not a page of its own. */
  asPage?: boolean
  /** Where "All disclosures" leads. */
  anchor?: string
}

/** The sentence, how sure it is, and beside it who paid: before any picture. */
export function Opening(props: OpeningProps) {
  const {
    headline,
    title,
    summary,
    certainty,
    label,
    labels,
    units,
    asPage = true,
    anchor = 'compared',
  } = props
  const sentence = headline.trim() === '' ? title : headline
  const few = label.key === 'none' || label.key === 'informal'
  return (
    <FolioSection
      label={<SelvedgeLines lines={props.selvedge} />}
      name="The verdict"
      note={
        <>
          <p>
            <strong>Who paid</strong>
          </p>
          {whoPaid(units).map((line) => (
            <p key={line}>{line}</p>
          ))}
          <p>
            <a href={`#${anchor}`}>All disclosures</a>
          </p>
          <p>
            <strong>{few ? label.words : labelWords(label)}</strong>
          </p>
          {labels.map((line) => (
            <p key={line}>{line}</p>
          ))}
        </>
      }
    >
      {asPage ? <PageTitle title={sentence}>{sentence}</PageTitle> : <p className="display">{sentence}</p>}
      {certainty.length > 0 && (
        <div className="lead mt-4 space-y-1">
          {certainty.map((line) => (
            <p key={line}>{line}</p>
          ))}
        </div>
      )}
      {summary.trim() !== '' && (
        <div className="reading mt-4">
          {summary.split(/\n{2,}/).map((paragraph, nth) => (
            <p key={nth} className="whitespace-pre-line">
              {paragraph}
            </p>
          ))}
        </div>
      )}
    </FolioSection>
  )
}
