import { useFieldArray } from 'react-hook-form'
import { limits } from '#shared/domain/limits.ts'
import { Button, IconButton } from '#src/components/ui/Button.tsx'
import { FieldError } from '#src/components/ui/Field.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { unnamedUnit } from '../evening/blank-evening.ts'
import type { EveningPart } from '../evening/evening-form.ts'

interface UnitsFieldsProps extends EveningPart {
  /** What the panel has had in its hands already, for completing a name. */
  known: readonly { maker: string; name: string }[]
}

const { least, most } = limits.eveningUnits

export function UnitsFields({ form, errorAt, known }: UnitsFieldsProps) {
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'units', keyName: 'key' })
  const error = errorAt('units')
  const makers = [...new Set(known.map((unit) => unit.maker))]
  return (
    <fieldset
      id="units"
      className="min-w-0"
      tabIndex={-1}
      aria-describedby={error ? 'units-error' : undefined}
    >
      <legend className="field-label">Which earphones</legend>
      <p className="field-hint">Three to six, by maker and name.</p>
      <ol className="rows mt-2">
        {fields.map((field, nth) => (
          <li key={field.key} className="flex items-start gap-2 py-3">
            <div className="grid flex-1 grid-cols-[repeat(auto-fit,minmax(min(8rem,100%),1fr))] gap-3">
              <TextField
                label={<span className="note">Maker of unit {nth + 1}</span>}
                list="known-makers"
                autoComplete="off"
                enterKeyHint="next"
                error={errorAt(`units.${nth}.maker`)}
                {...form.register(`units.${nth}.maker`)}
                id={`units.${nth}.maker`}
              />
              <TextField
                label={<span className="note">Name of unit {nth + 1}</span>}
                list="known-units"
                autoComplete="off"
                enterKeyHint="next"
                error={errorAt(`units.${nth}.name`)}
                {...form.register(`units.${nth}.name`)}
                id={`units.${nth}.name`}
              />
            </div>
            {fields.length > least && (
              <IconButton
                icon="minus"
                label={`Leave out unit ${nth + 1}`}
                className="mt-7"
                onClick={() => remove(nth)}
              />
            )}
          </li>
        ))}
      </ol>
      {error && <FieldError id="units-error">{error}</FieldError>}
      {fields.length < most && (
        <Button kind="secondary" icon="plus" onClick={() => append(unnamedUnit())}>
          Add a unit
        </Button>
      )}
      <datalist id="known-makers">
        {makers.map((maker) => (
          <option key={maker} value={maker} />
        ))}
      </datalist>
      <datalist id="known-units">
        {known.map((unit) => (
          <option key={`${unit.maker} ${unit.name}`} value={unit.name} label={`${unit.maker} ${unit.name}`} />
        ))}
      </datalist>
    </fieldset>
  )
}
