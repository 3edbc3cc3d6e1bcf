import { Navigate, isRouteErrorResponse, useLocation, useRouteError } from 'react-router-dom'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { CallError } from '#src/lib/call.ts'
import { NotFoundPage } from './NotFoundPage.tsx'
import { to } from './paths.ts'

const isMissing = (error: unknown): boolean =>
  (error instanceof CallError && error.code === 'not_found') ||
  (isRouteErrorResponse(error) && error.status === 404)

/** What stands where a page could not: the sign-in, "not found", or what went wrong with the request's number. */
export function ErrorPage() {
  const error = useRouteError()
  const { pathname, search } = useLocation()
  if (error instanceof CallError && error.code === 'not_signed_in')
    return <Navigate to={`${to('signIn')}?next=${encodeURIComponent(pathname + search)}`} replace />
  if (isMissing(error)) return <NotFoundPage />
  const problem = error instanceof CallError ? error.problem : null
  return (
    <Folio>
      <FolioSection label="Not shown" note={problem?.requestId && <p>Request {problem.requestId}</p>}>
        <PageTitle size="plain">{problem?.title ?? 'This page failed'}</PageTitle>
        <p className="lead mt-3">
          {problem?.detail ?? 'A part of the program did not load or did not work. What was sent is kept.'}
        </p>
        <p className="mt-6">
          <Button onClick={() => window.location.reload()}>Load the page again</Button>
        </p>
      </FolioSection>
    </Folio>
  )
}
