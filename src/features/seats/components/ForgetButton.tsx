import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useNavigate } from 'react-router-dom'
import { forgetSeat, type PanelistSeat } from '#shared/contracts/seats.ts'
import { to } from '#src/app/paths.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { call } from '#src/lib/call.ts'
import { seatQuery } from '../queries.ts'
import { CallFailure } from './CallFailure.tsx'

/** For a borrowed phone: the seat is closed here, and its link opens it again anywhere. */
export function ForgetButton({ seat }: { seat: PanelistSeat }) {
  const client = useQueryClient()
  const navigate = useNavigate()
  const forget = useMutation({
    mutationFn: () => call(forgetSeat, { params: { seat: seat.id } }),
    onSuccess: async () => {
      await navigate(to('home'), { replace: true })
      client.removeQueries({ queryKey: seatQuery(seat.id).queryKey })
    },
  })
  return (
    <div>
      <Button kind="secondary" onClick={() => forget.mutate()} busy={forget.isPending} busyLabel="Closing">
        Close this seat on this phone
      </Button>
      <p className="note">Its link opens it again, here or on another phone.</p>
      {forget.error && <CallFailure error={forget.error} what="The seat is still open here." />}
    </div>
  )
}
