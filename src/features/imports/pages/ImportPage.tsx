import { useMemo, useState } from 'react'
import { useQuery } from '@tanstack/react-query'
import { useNavigate, useParams } from 'react-router-dom'
import type { ImportPreview } from '#shared/contracts/imports.ts'
import { to } from '#src/app/paths.ts'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Failure } from '#src/components/ui/Failure.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { ChooseFile } from '../components/ChooseFile.tsx'
import { ImportForm } from '../components/ImportForm.tsx'
import { previewOf, sameReading } from '../preview.ts'
import { confirmQuery, type Reading } from '../queries.ts'

interface Chosen extends Reading {
  source: string
  encoding: string | null
}

function confirmedWords(
  read: ImportPreview | null,
  confirmed: ImportPreview | undefined,
  fetching: boolean,
): string {
  if (!read || !confirmed) return fetching ? 'Scrim is reading it too.' : ''
  return sameReading(read, confirmed)
    ? 'Scrim reads it the same way.'
    : 'Scrim reads it differently; its own reading is shown below.'
}

/** Ratings that were gathered elsewhere: read, shown with every bad row, stored once, then on to agreement. */
export default function ImportPage() {
  const { panel = '' } = useParams()
  const navigate = useNavigate()
  const [chosen, setChosen] = useState<Chosen | null>(null)
  const confirmed = useQuery(confirmQuery(panel, chosen))
  const read = useMemo(() => (chosen === null ? null : previewOf(chosen.text)), [chosen])
  const preview = confirmed.data ?? read
  return (
    <Folio>
      <FolioSection
        label="Import"
        note="The file is read in your browser first. Scrim reads it again before anything is stored."
      >
        <PageTitle size="plain" title="Import ratings">
          Bring ratings you already have
        </PageTitle>
        <p className="lead mt-3 mb-6">
          One file in, and the same agreement screen and verdict come out. Nothing is stored until you say so.
        </p>
        <ChooseFile
          onText={(text, source, encoding) =>
            setChosen((before) => ({ nr: (before?.nr ?? 0) + 1, text, source, encoding }))
          }
        />
        <div role="status" className="note mt-4">
          {chosen && (
            <p>
              Read: {chosen.source}
              {chosen.encoding && `, its letters as ${chosen.encoding}`}.{' '}
              {confirmedWords(read, confirmed.data, confirmed.isFetching)}
            </p>
          )}
        </div>
        {chosen && confirmed.error && (
          <Failure
            what="Scrim could not read the file itself."
            kept="What your browser read is shown below."
            todo={confirmed.error.message}
            onRetry={() => void confirmed.refetch()}
            retrying={confirmed.isFetching}
          />
        )}
      </FolioSection>
      {chosen && preview && (
        <ImportForm
          key={chosen.nr}
          panel={panel}
          text={chosen.text}
          preview={preview}
          onStored={(round) => void navigate(to('agreement', { panel, round }))}
        />
      )}
    </Folio>
  )
}
