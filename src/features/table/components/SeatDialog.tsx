import { zodResolver } from '@hookform/resolvers/zod'
import { useState } from 'react'
import { useForm } from 'react-hook-form'
import { z } from 'zod'
import { seatLeaves, seatReturns, voidServing } from '#shared/contracts/table.ts'
import { limits } from '#shared/domain/limits.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { Dialog } from '#src/components/ui/Dialog.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { call } from '#src/lib/call.ts'
import type { AtTable } from '../queries.ts'
import { mayVoid, type TableSeat } from '../state-words.ts'
import { useTableAct } from '../use-table-act.ts'

interface SeatDialogProps {
  at: AtTable
  seat: TableSeat
  onClose: () => void
  onIncident: () => void
}

/** What may happen at one seat beside the turn: set aside, leaves, is back, an incident. */
export function SeatDialog({ at, seat, onClose, onIncident }: SeatDialogProps) {
  const [setting, setSetting] = useState(false)
  const move = useTableAct(
    at,
    () => call(seat.left ? seatReturns : seatLeaves, { params: at, body: { seat: seat.id } }),
    onClose,
  )
  if (setting && seat.serving)
    return <VoidDialog at={at} seat={seat} serving={seat.serving} onClose={onClose} />
  const code = seat.serving?.code
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title={seat.label}>
      <ul className="rows">
        {mayVoid(seat) && (
          <li className="py-3">
            <Button kind="secondary" onClick={() => setSetting(true)}>
              Set {code} aside
            </Button>
            <p className="note">
              A mix-up, no seal, a fault. The serving comes back at the end under another code.
            </p>
          </li>
        )}
        <li className="py-3">
          <Button kind="secondary" onClick={() => move.mutate(undefined)} busy={move.isPending}>
            {seat.left ? 'Is back' : 'Has left'}
          </Button>
          <p className="note">
            {seat.left
              ? 'Goes on with the present turn; turns in between stay missed.'
              : 'What was sent stays. No reason is asked; they may come back.'}
          </p>
        </li>
        <li className="py-3">
          <Button kind="secondary" onClick={onIncident}>
            Write down an incident
          </Button>
          <p className="note">What went wrong goes on record with the round; nothing else changes.</p>
        </li>
      </ul>
      {move.error && <Problem error={move.error} kept="Nothing has changed." />}
    </Dialog>
  )
}

const reasonOnly = z.strictObject({ reason: voidServing.body.shape.reason })
type Typed = z.input<typeof reasonOnly>

function VoidDialog({
  at,
  seat,
  serving,
  onClose,
}: {
  at: AtTable
  seat: TableSeat
  serving: NonNullable<TableSeat['serving']>
  onClose: () => void
}) {
  const form = useForm<Typed, unknown, z.output<typeof reasonOnly>>({
    resolver: zodResolver(reasonOnly),
    defaultValues: { reason: '' },
  })
  const setAside = useTableAct(
    at,
    ({ reason }: Typed) =>
      call(voidServing, {
        params: at,
        body: { serving: serving.id, version: serving.version, reason },
      }),
    onClose,
  )
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && !setAside.isPending && onClose()}
      title={`Set ${serving.code} aside?`}
      description={`${seat.label} stops rating it. What is on the phone is not counted; the serving comes back at the end of the row under a reserve code. This cannot be undone.`}
    >
      <form onSubmit={(event) => void form.handleSubmit((typed) => setAside.mutate(typed))(event)} noValidate>
        <TextField
          {...form.register('reason')}
          label="What went wrong"
          hint="Goes on record. Codes only: no unit, no rating."
          autoComplete="off"
          maxLength={limits.reason}
          error={form.formState.errors.reason?.message}
        />
        {setAside.error && <Problem error={setAside.error} kept="Nothing has changed." />}
        <div className="actions mt-6">
          <Button
            kind="destructive-confirm"
            type="submit"
            busy={setAside.isPending}
            busyLabel="Setting aside"
          >
            Set {serving.code} aside
          </Button>
          <Button kind="secondary" onClick={onClose}>
            Not now
          </Button>
        </div>
      </form>
    </Dialog>
  )
}
