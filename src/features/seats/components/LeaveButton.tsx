import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { leaveSeat, type PanelistSeat } from '#shared/contracts/seats.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { ConfirmDialog } from '#src/components/ui/Dialog.tsx'
import { call } from '#src/lib/call.ts'
import { seatQuery } from '../queries.ts'
import { CallFailure } from './CallFailure.tsx'

/** Stopping is always at hand, and no reason is asked. */
export function LeaveButton({ seat, label = 'Stop taking part' }: { seat: PanelistSeat; label?: string }) {
  const client = useQueryClient()
  const [asking, setAsking] = useState(false)
  const leave = useMutation({
    mutationFn: () => call(leaveSeat, { params: { seat: seat.id } }),
    onSuccess: (now) => {
      setAsking(false)
      client.setQueryData(seatQuery(seat.id).queryKey, now)
    },
  })
  return (
    <>
      <Button kind="secondary" onClick={() => setAsking(true)}>
        {label}
      </Button>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title="Stop taking part?"
        consequence="What you have sent stays in the round. Nothing more is asked of you, and nobody asks why. The steward can let you back in."
        confirmLabel="Stop taking part"
        busyLabel="Leaving"
        cancelLabel="Stay"
        busy={leave.isPending}
        onConfirm={() => leave.mutate()}
      >
        {leave.error && <CallFailure error={leave.error} what="You have not left yet." />}
      </ConfirmDialog>
    </>
  )
}
