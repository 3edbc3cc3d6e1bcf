import type { ComponentPropsWithRef } from 'react'
import { Icon } from '../Icon.tsx'
import { Field } from './Field.tsx'
import type { FieldWords } from './Field.tsx'

interface SelectFieldProps extends FieldWords, Omit<ComponentPropsWithRef<'select'>, 'children'> {
  options: { value: string; label: string; disabled?: boolean }[]
  /** First line that is no answer: "Choose a currency". */
  placeholder?: string
}

/** One of many (for a handful, ChoiceRows is kinder). The platform's own list. */
export function SelectField({
  label,
  hint,
  error,
  optional,
  id,
  options,
  placeholder,
  className = '',
  ...select
}: SelectFieldProps) {
  return (
    <Field label={label} hint={hint} error={error} optional={optional} id={id ?? select.name}>
      {(wiring) => (
        <div className="entry-select-frame">
          <select {...select} {...wiring} className={`entry ${className}`}>
            {placeholder && <option value="">{placeholder}</option>}
            {options.map((option) => (
              <option key={option.value} value={option.value} disabled={option.disabled}>
                {option.label}
              </option>
            ))}
          </select>
          <Icon name="choose" />
        </div>
      )}
    </Field>
  )
}
