import { useFieldArray, useWatch } from 'react-hook-form'
import { limits } from '#shared/domain/limits.ts'
import { Button, IconButton } from '#src/components/ui/Button.tsx'
import { FieldError } from '#src/components/ui/Field.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { nobodyYet } from '../evening/blank-evening.ts'
import type { EveningPart } from '../evening/evening-form.ts'
import { withDuties } from '../evening/share-out-duties.ts'

interface PeopleFieldsProps extends EveningPart {
  /** Names of the panel's members, for completing a name. */
  known: readonly string[]
}

const most = limits.eveningListeners.most + 3

export function PeopleFields({ form, errorAt, known }: PeopleFieldsProps) {
  const { fields, append } = useFieldArray({ control: form.control, name: 'people', keyName: 'key' })
  const people = useWatch({ control: form.control, name: 'people' })
  const error = errorAt('people')
  const leaveOut = (nth: number) =>
    form.setValue(
      'people',
      withDuties(
        form.getValues('people').filter((_, index) => index !== nth),
        form.getValues('tagging'),
      ),
      { shouldDirty: true },
    )
  return (
    <fieldset
      id="people"
      className="min-w-0"
      tabIndex={-1}
      aria-describedby={error ? 'people-error' : undefined}
    >
      <legend className="field-label">Who is present</legend>
      <p className="field-hint">
        Two listeners or more. Whoever only helps does not listen: take the tick away.
      </p>
      <ol className="rows mt-2">
        {fields.map((field, nth) => {
          const keeps = people[nth]?.duty === 'keeper'
          const called = people[nth]?.name.trim() || `Person ${nth + 1}`
          return (
            <li key={field.key} className="flex flex-wrap items-start gap-x-3 py-3">
              <div className="min-w-[min(10rem,100%)] flex-1">
                <TextField
                  label={
                    <span className="note">
                      Person {nth + 1}
                      {field.you && ', you'}
                    </span>
                  }
                  list="known-people"
                  autoComplete="off"
                  enterKeyHint="next"
                  error={errorAt(`people.${nth}.name`)}
                  {...form.register(`people.${nth}.name`)}
                  id={`people.${nth}.name`}
                />
              </div>
              <label className="choice mt-7 border-t-0! py-0">
                <input
                  type="checkbox"
                  className="tick"
                  aria-label={keeps ? `${called} tags and cannot listen` : `${called} listens`}
                  disabled={keeps}
                  {...form.register(`people.${nth}.listens`)}
                />
                <span>{keeps ? 'tags' : 'listens'}</span>
              </label>
              {fields.length > 2 && !field.you ? (
                <IconButton
                  icon="minus"
                  label={`Leave out ${called}`}
                  className="mt-7"
                  onClick={() => leaveOut(nth)}
                />
              ) : (
                <span className="w-11" />
              )}
            </li>
          )
        })}
      </ol>
      {error && <FieldError id="people-error">{error}</FieldError>}
      {fields.length < most && (
        <Button kind="secondary" icon="plus" onClick={() => append(nobodyYet())}>
          Add a person
        </Button>
      )}
      <datalist id="known-people">
        {known.map((name) => (
          <option key={name} value={name} />
        ))}
      </datalist>
    </fieldset>
  )
}
