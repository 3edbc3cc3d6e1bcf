import { useEffect } from 'react'
import { Controller, useFieldArray, type UseFormReturn } from 'react-hook-form'
import type { PanelistSeat } from '#shared/contracts/seats.ts'
import { limits } from '#shared/domain/limits.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { ChoiceRows } from '#src/components/ui/ChoiceRows.tsx'
import { SelectField } from '#src/components/ui/SelectField.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { endFault } from '../end-faults.ts'
import type { EndTyped } from './EndQuestions.tsx'

const sureness = [
  { value: 'guess', label: 'A guess' },
  { value: 'fairly', label: 'Fairly sure' },
  { value: 'certain', label: 'Certain' },
]

interface RecognitionsProps {
  form: UseFormReturn<EndTyped>
  heard: PanelistSeat['heard']
}

/** What was recognised: one's own code, free text (never a list of units), how sure. */
export function Recognitions({ form, heard }: RecognitionsProps) {
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'recognitions' })
  const errors = form.formState.errors.recognitions
  const empty = { code: '', text: '', sure: undefined as unknown as 'guess' }
  useEffect(() => {
    if (form.getValues('recognitions').length === 0) append(empty, { shouldFocus: false })
    // Once, when the question opens: one entry to begin with.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [])
  const wrong = (nth: number, key: 'code' | 'text' | 'sure') => {
    const message = errors?.[nth]?.[key]?.message
    return message === undefined ? null : endFault(`recognitions.${nth}.${key}`, message)
  }
  return (
    <div className="rows">
      {fields.map((entry, nth) => (
        <div key={entry.id} className="fields py-4" role="group" aria-label={`Recognised, number ${nth + 1}`}>
          <SelectField
            {...form.register(`recognitions.${nth}.code`)}
            label="Which code"
            placeholder="Choose one of yours"
            options={heard.map((one) => ({ value: one.code, label: `${one.code}, serving ${one.ordinal}` }))}
            error={wrong(nth, 'code')}
          />
          <TextField
            {...form.register(`recognitions.${nth}.text`)}
            label="What do you think it was?"
            hint="In your own words."
            autoComplete="off"
            maxLength={limits.line}
            error={wrong(nth, 'text')}
          />
          <Controller
            control={form.control}
            name={`recognitions.${nth}.sure`}
            render={({ field }) => (
              <ChoiceRows
                id={`recognitions.${nth}.sure`}
                name={`recognitions.${nth}.sure`}
                legend="How sure are you?"
                value={field.value ?? null}
                onChange={field.onChange}
                choices={sureness}
                error={wrong(nth, 'sure')}
              />
            )}
          />
          {fields.length > 1 && (
            <Button kind="secondary" onClick={() => remove(nth)}>
              Take this one away
            </Button>
          )}
        </div>
      ))}
      {fields.length < heard.length && (
        <div className="pt-2">
          <Button kind="secondary" icon="plus" onClick={() => append(empty)}>
            Another one
          </Button>
        </div>
      )}
    </div>
  )
}
