import { useState } from 'react'
import { cancelRound, type Round } from '#shared/contracts/rounds.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { Dialog } from '#src/components/ui/Dialog.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { useCancelRound } from '../queries.ts'

interface CancelRoundProps {
  panel: string
  round: Round
}

/** Cancels a draft or an open round, with a reason. */
export function CancelRound({ panel, round }: CancelRoundProps) {
  const [asking, setAsking] = useState(false)
  const cancel = useCancelRound({ panel, round: round.id }, round.version)
  const { form, submit, problem, busy, errorAt } = useContractForm({
    schema: cancelRound.body,
    defaultValues: { reason: '' },
    send: async (body) => {
      await cancel.mutateAsync(body)
      setAsking(false)
    },
  })
  const open = round.status === 'open'
  return (
    <>
      <Button kind="destructive" onClick={() => setAsking(true)}>
        Cancel the round
      </Button>
      <Dialog
        open={asking}
        onOpenChange={(next) => !busy && setAsking(next)}
        title="Cancel the round"
        description={
          open
            ? 'The key stays shut, the codes are spent, and no rating is ever shown in sum. The reason stands on the public page. The plan can be drafted again.'
            : 'The draft is laid aside with its reason. It can be drafted again.'
        }
      >
        <form onSubmit={submit} noValidate className="fields">
          {problem && <Problem error={problem} kept="Nothing was cancelled." />}
          <TextField
            id="cancel-reason"
            label="Reason"
            hint={open ? 'Public. No names of people or units.' : undefined}
            error={errorAt('reason')}
            {...form.register('reason')}
          />
          <div className="actions">
            <Button type="submit" kind="destructive-confirm" busy={busy} busyLabel="Cancelling">
              Cancel the round
            </Button>
            <Button kind="secondary" onClick={() => setAsking(false)}>
              Keep it
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  )
}
