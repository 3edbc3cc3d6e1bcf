import { useMutation } from '@tanstack/react-query'
import { useEffect, useRef } from 'react'
import { useNavigate, useParams } from 'react-router-dom'
import { join } from '#shared/contracts/seats.ts'
import { SeatLayout } from '#src/components/layout/SeatLayout.tsx'
import { Failure } from '#src/components/ui/Failure.tsx'
import { Waiting } from '#src/components/ui/Waiting.tsx'
import { call, CallError } from '#src/lib/call.ts'
import { ScreenTitle } from '../components/ScreenTitle.tsx'

/** A seat's or a duty's link: the page posts it, so that a mere look at the address changes nothing, and goes on. */
export default function JoinPage() {
  const { token = '' } = useParams()
  const navigate = useNavigate()
  const asked = useRef<string | null>(null)
  const opening = useMutation({
    mutationFn: () => call(join, { params: { token } }),
    onSuccess: ({ path }) => void navigate(path, { replace: true, state: null }),
    networkMode: 'always',
  })
  const { mutate } = opening
  useEffect(() => {
    if (asked.current === token) return
    asked.current = token
    mutate()
  }, [token, mutate])

  if (!opening.error)
    return (
      <SeatLayout>
        <Waiting label="Opening your seat" />
      </SeatLayout>
    )
  const told = opening.error instanceof CallError ? opening.error : null
  const refused = told !== null && told.problem.status < 500 && told.code !== 'too_many'
  const old = told?.code === 'not_found' || told?.code === 'malformed' || told?.code === 'invalid'
  return (
    <SeatLayout>
      <ScreenTitle>
        {old
          ? 'This link does not work any more'
          : refused
            ? 'This link cannot be opened here'
            : 'The link could not be opened'}
      </ScreenTitle>
      <div className="mt-4">
        <Failure
          what={
            old ? 'A newer link was made, or the round is not open to listeners.' : 'Nothing has changed.'
          }
          kept={old ? 'Whatever was sent from this seat is kept.' : undefined}
          todo={
            old
              ? 'Ask the organiser or the steward for the present link. It opens on any phone.'
              : (told?.message ?? 'Try again in a moment.')
          }
          requestId={told?.problem.requestId || null}
          onRetry={refused ? undefined : () => mutate()}
          retrying={opening.isPending}
        />
      </div>
    </SeatLayout>
  )
}
