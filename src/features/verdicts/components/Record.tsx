import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import { to } from '#src/app/paths.ts'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { CopyLine } from '#src/components/ui/CopyLine.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { day } from '#src/lib/dates.ts'
import { citation } from '../citation.ts'

const fileWords: Record<PublicVerdict['files'][number]['name'], string> = {
  'ratings.csv': 'Every rating by listener number and code',
  'data-dictionary.txt': 'What each column means',
  'plan.json': 'The plan, frozen at opening',
  'key.json': 'The key: which code was which unit, and the seed of the draw',
}
const inOrder = Object.keys(fileWords)

/** The files that anybody may take away. */
export function Files({ verdict }: { verdict: PublicVerdict }) {
  if (verdict.files.length === 0)
    return (
      <FolioSection label="Data">
        <h2 className="heading mb-3">The data</h2>
        <p className="measure">This round publishes no rows: its organiser chose so before it opened.</p>
      </FolioSection>
    )
  const files = [...verdict.files].sort(
    (one, other) => inOrder.indexOf(one.name) - inOrder.indexOf(other.name),
  )
  return (
    <FolioSection
      label="Data"
      note="Rows carry a listener’s number and a code, never a name, a seat or a time. People who were in the room could recognise a row."
    >
      <h2 className="heading mb-3">The data</h2>
      <ul className="rows">
        {files.map((file) => (
          <li key={file.name} className="flex flex-wrap items-center justify-between gap-x-6 py-1">
            <span>{fileWords[file.name]}</span>
            <LinkButton to={file.url} download={file.name} icon="save">
              {file.name}
            </LinkButton>
          </li>
        ))}
      </ul>
    </FolioSection>
  )
}

/** Corrections, newest first, each with the day and what was wrong. */
export function Corrections({ verdict }: { verdict: PublicVerdict }) {
  if (verdict.corrections.length === 0) return null
  const address = to('verdict', { slug: verdict.slug })
  return (
    <FolioSection label="Corrections">
      <h2 className="heading mb-3">Corrections</h2>
      <ol className="rows">
        {[...verdict.corrections]
          .sort((one, other) => other.version - one.version)
          .map((one) => (
            <li key={one.version} className="py-3">
              <p className="note">
                Version {one.version}, {day(one.at)}
              </p>
              <p className="measure whitespace-pre-line">{one.note}</p>
              {one.version > 1 && (
                <p className="note">
                  <a href={`${address}?version=${one.version - 1}`}>Read version {one.version - 1}</a>
                </p>
              )}
            </li>
          ))}
      </ol>
    </FolioSection>
  )
}

/** How to cite this verdict, with the address that leads to it for good. */
export function Cite({ verdict }: { verdict: PublicVerdict }) {
  return (
    <FolioSection label="Cite">
      <h2 className="heading mb-3">Cite as</h2>
      <CopyLine label="Citation" value={citation(verdict, window.location.origin)} />
    </FolioSection>
  )
}
