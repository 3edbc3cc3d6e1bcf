import { zodResolver } from '@hookform/resolvers/zod'
import { useMutation } from '@tanstack/react-query'
import { Controller, useForm } from 'react-hook-form'
import type { z } from 'zod'
import { reportIncident, type StewardTable } from '#shared/contracts/table.ts'
import { limits } from '#shared/domain/limits.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ChoiceRows } from '#src/components/ui/ChoiceRows.tsx'
import { Dialog } from '#src/components/ui/Dialog.tsx'
import { SelectField } from '#src/components/ui/SelectField.tsx'
import { TextArea } from '#src/components/ui/TextArea.tsx'
import { call } from '#src/lib/call.ts'
import type { AtTable } from '../queries.ts'

type Typed = z.input<typeof reportIncident.body>

const kinds = [
  { value: 'mix-up', label: 'Two pouches were mixed up' },
  { value: 'lost-seal', label: 'A seal was lost' },
  { value: 'unit-fault', label: 'An earphone has a fault' },
  {
    value: 'key-learned',
    label: 'Somebody learned what a code hides',
    hint: 'If it was you, hand the table over.',
  },
  { value: 'other', label: 'Something else' },
]

interface IncidentDialogProps {
  at: AtTable
  seats: StewardTable['seats']
  /** Preset when it was opened from one seat's line. */
  seat: string | null
  onClose: () => void
  onDone: () => void
}

/** Puts on record what went wrong; changes nothing else. */
export function IncidentDialog({ at, seats, seat, onClose, onDone }: IncidentDialogProps) {
  const form = useForm<Typed, unknown, z.output<typeof reportIncident.body>>({
    resolver: zodResolver(reportIncident.body),
    defaultValues: { text: '', ...(seat === null ? {} : { seat }) },
  })
  const { errors } = form.formState
  const record = useMutation({
    mutationFn: (body: Typed) => call(reportIncident, { params: at, body }),
    onSuccess: onDone,
  })
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && !record.isPending && onClose()}
      title="Write down an incident"
      description="It goes on record with the time. The organiser reads it after closing; use codes and seats, no ratings."
    >
      <form
        className="fields"
        noValidate
        onSubmit={(event) => void form.handleSubmit((body) => record.mutate(body))(event)}
      >
        <Controller
          control={form.control}
          name="kind"
          render={({ field }) => (
            <ChoiceRows
              id="kind"
              name="kind"
              legend="What was it?"
              value={field.value ?? null}
              onChange={field.onChange}
              choices={kinds}
              error={errors.kind && 'Choose what it was.'}
            />
          )}
        />
        <SelectField
          {...form.register('seat', { setValueAs: (typed: string) => typed || undefined })}
          label="At which seat"
          optional
          placeholder="No one seat"
          options={seats.map((one) => ({ value: one.id, label: one.label }))}
        />
        <TextArea
          {...form.register('text')}
          label="What happened"
          maxLength={limits.reason}
          error={errors.text?.message}
        />
        {record.error && <Problem error={record.error} kept="What you typed is still here." />}
        <div className="actions">
          <Button type="submit" busy={record.isPending} busyLabel="Writing it down">
            Write it down
          </Button>
          <Button kind="secondary" onClick={onClose}>
            Not now
          </Button>
        </div>
      </form>
    </Dialog>
  )
}
