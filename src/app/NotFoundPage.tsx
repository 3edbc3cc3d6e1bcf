import { Link } from 'react-router-dom'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { to } from './paths.ts'

/** Nothing here, or nothing that this reader may know of. */
export function NotFoundPage() {
  return (
    <Folio>
      <FolioSection label="Not found">
        <PageTitle size="plain">There is nothing at this address</PageTitle>
        <p className="lead mt-3">
          The address may be mistyped, the page may have moved, or it is open to others only. If you came by a
          link from somebody, ask them for a new one.
        </p>
        <p className="mt-6">
          <Link to={to('home')}>Read the verdicts</Link>
        </p>
      </FolioSection>
    </Folio>
  )
}
