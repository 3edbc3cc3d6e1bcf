import type { ReactNode } from 'react'

/** The page as a folio: a column of sections, each with its selvedge, its matter and its notes. */
export function Folio({ children }: { children: ReactNode }) {
  return <div className="folio">{children}</div>
}

interface FolioSectionProps {
  /** The selvedge: a label, dates, a family, the round's thread. On a phone it lies on top as one line. */
  label?: ReactNode
  /** The right margin: numbers, doubts, sources. Follows its matter below 1180 px. */
  note?: ReactNode
  children: ReactNode
  /** Names the section for a screen reader when it has no heading of its own. */
  name?: string
}

/** A section: 48 px and one hairline from the one before. */
export function FolioSection({ label, note, children, name }: FolioSectionProps) {
  return (
    <section className="folio-section" aria-label={name}>
      {label && <div className="folio-label">{label}</div>}
      <div className="folio-matter">{children}</div>
      {note && <div className="folio-notes">{note}</div>}
    </section>
  )
}

/** Short lines in the selvedge (panel, date, version); on a phone they run on as one line with points between. */
export function SelvedgeLines({ lines }: { lines: ReactNode[] }) {
  return (
    <>
      {lines.map((line, nth) => (
        <div key={nth}>{line}</div>
      ))}
    </>
  )
}
