import { useMemo } from 'react'
import { importBody, storeImport, type ImportPreview } from '#shared/contracts/imports.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { CheckRow } from '#src/components/ui/CheckRow.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { SelectField } from '#src/components/ui/SelectField.tsx'
import { TextArea } from '#src/components/ui/TextArea.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { call } from '#src/lib/call.ts'
import { createSameKey } from '#src/lib/same-key.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { heldBack } from '../preview.ts'
import { BadRows, WhatWasRead } from './Reading.tsx'

interface ImportFormProps {
  panel: string
  text: string
  preview: ImportPreview
  onStored: (round: string) => void
}

const inputs = new Set(['title', 'question', 'leaveOutFaults', 'primaryDescriptor', 'text'])

/** What was read, what to do with bad rows, what to call the round; then it is stored, once. */
export function ImportForm({ panel, text, preview, onStored }: ImportFormProps) {
  const keyFor = useMemo(() => createSameKey(), [])
  const { form, submit, attempt, faults, problem, busy, errorAt } = useContractForm({
    schema: importBody,
    defaultValues: {
      title: '',
      question: '',
      text,
      leaveOutFaults: false,
      primaryDescriptor: preview.descriptors[0]?.name ?? '',
    },
    send: async (body) => {
      const { round } = await call(storeImport, { params: { panel }, body, idempotencyKey: keyFor(body) })
      onStored(round)
    },
    has: (field) => inputs.has(field),
  })
  const leaveOut = form.watch('leaveOutFaults') ?? false
  return (
    <form
      onSubmit={(event) => void submit(event)}
      noValidate
      className="mt-12 border-t border-line pt-8 page:pt-12"
    >
      <FolioSection label="What was read">
        <h2 className="heading mb-3">What was read</h2>
        <WhatWasRead preview={preview} />
        <div className="mt-6">
          <BadRows preview={preview} />
        </div>
        {preview.faultCount > 0 && preview.rows > 0 && (
          <div className="mt-4">
            <CheckRow
              {...form.register('leaveOutFaults')}
              id="leaveOutFaults"
              label={preview.faultCount === 1 ? 'Leave this row out' : 'Leave these rows out'}
              hint={`The other ${preview.rows === 1 ? 'row is' : `${preview.rows} rows are`} stored; the file itself stays as it is.`}
              error={errorAt('leaveOutFaults')}
            />
          </div>
        )}
      </FolioSection>
      <FolioSection
        label="The round"
        note="The round is labelled imported wherever it appears: Scrim drew no codes for it and cannot say how blind the listening was."
      >
        <h2 className="heading mb-3">What to call it</h2>
        <ErrorSummary errors={faults} attempt={attempt} />
        {problem && <Problem error={problem} kept="The file and what you typed are still here." />}
        <div className="fields mt-4">
          <TextField {...form.register('title')} id="title" label="Title" error={errorAt('title')} />
          <TextArea
            {...form.register('question')}
            id="question"
            label="Question"
            hint="What the listening was to find out."
            rows={2}
            error={errorAt('question')}
          />
          {preview.descriptors.length > 1 && (
            <SelectField
              {...form.register('primaryDescriptor')}
              id="primaryDescriptor"
              label="Primary descriptor"
              hint="Its result is stated. The others count as a hint unless they hold over the whole scorecard. Name the one you would have named before listening."
              options={preview.descriptors.map(({ name }) => ({ value: name, label: name }))}
              error={errorAt('primaryDescriptor')}
            />
          )}
        </div>
        <div className="actions mt-8">
          <Button
            type="submit"
            busy={busy}
            busyLabel="Storing the ratings"
            disabledReason={heldBack(preview, leaveOut)}
          >
            Store the ratings
          </Button>
        </div>
      </FolioSection>
    </form>
  )
}
