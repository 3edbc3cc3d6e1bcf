import { zodResolver } from '@hookform/resolvers/zod'
import { useRef } from 'react'
import { Controller, useForm } from 'react-hook-form'
import type { z } from 'zod'
import { addListener, type StewardTable } from '#shared/contracts/table.ts'
import { limits } from '#shared/domain/limits.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ChoiceRows } from '#src/components/ui/ChoiceRows.tsx'
import { Dialog } from '#src/components/ui/Dialog.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { call } from '#src/lib/call.ts'
import { counted } from '#src/lib/counts.ts'
import { randomKey } from '#src/lib/random-key.ts'
import type { AtTable } from '../queries.ts'
import { useTableAct } from '../use-table-act.ts'

type Typed = z.input<typeof addListener.body>

interface LateDialogProps {
  at: AtTable
  table: StewardTable
  onClose: () => void
  onDone: (name: string) => void
}

/** Someone came late: a spare row, or the row of someone who has left. */
export function LateDialog({ at, table, onClose, onDone }: LateDialogProps) {
  const key = useRef(randomKey())
  const gone = table.seats.filter((seat) => seat.left)
  const spare = table.spareRows > 0
  const first = spare ? undefined : gone[0]?.id
  const form = useForm<Typed, unknown, z.output<typeof addListener.body>>({
    resolver: zodResolver(addListener.body),
    defaultValues: { name: '', ...(first === undefined ? {} : { insteadOf: first }) },
  })
  const seat = useTableAct(
    at,
    (body: Typed) => call(addListener, { params: at, body, idempotencyKey: key.current }),
    () => onDone(form.getValues('name')),
  )
  const choices = [
    {
      value: '',
      label: 'A row of their own',
      hint: `${counted(table.spareRows, 'spare row')} left`,
      disabledReason: spare ? null : 'No spare row is left.',
    },
    ...gone.map((left) => ({
      value: left.id,
      label: `Instead of ${left.label}`,
      hint: 'Goes on from where that row stands, under codes of its own.',
    })),
  ]
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && !seat.isPending && onClose()}
      title="Someone came late"
      description="They join in the present turn. Earlier turns of the row stay missed."
    >
      <form
        className="fields"
        noValidate
        onSubmit={(event) => void form.handleSubmit((body) => seat.mutate(body))(event)}
      >
        <TextField
          {...form.register('name')}
          label="Their name"
          hint="Stays within the panel; published are numbers only."
          autoComplete="off"
          maxLength={limits.name}
          error={form.formState.errors.name?.message}
        />
        <Controller
          control={form.control}
          name="insteadOf"
          render={({ field }) => (
            <ChoiceRows
              id="insteadOf"
              name="insteadOf"
              legend="Which row"
              value={field.value ?? ''}
              onChange={(value) => field.onChange(value || undefined)}
              choices={choices}
            />
          )}
        />
        {seat.error && <Problem error={seat.error} kept="What you typed is still here." />}
        <div className="actions">
          <Button type="submit" busy={seat.isPending} busyLabel="Making room">
            Give them a seat
          </Button>
          <Button kind="secondary" onClick={onClose}>
            Not now
          </Button>
        </div>
      </form>
    </Dialog>
  )
}
