import type { ComponentPropsWithRef } from 'react'
import { Field } from './Field.tsx'
import type { FieldWords } from './Field.tsx'

/** One line of text. Takes what an input takes (ref, name, onChange…), so `{...register('name')}` fits. */
export function TextField({
  label,
  hint,
  error,
  optional,
  id,
  className = '',
  ...input
}: FieldWords & ComponentPropsWithRef<'input'>) {
  return (
    <Field label={label} hint={hint} error={error} optional={optional} id={id ?? input.name}>
      {(wiring) => <input type="text" {...input} {...wiring} className={`entry ${className}`} />}
    </Field>
  )
}
