import type { ComponentPropsWithRef } from 'react'
import { Field } from './Field.tsx'
import type { FieldWords } from './Field.tsx'

/** Several lines of text; grows with what is written where the browser can. */
export function TextArea({
  label,
  hint,
  error,
  optional,
  id,
  className = '',
  ...area
}: FieldWords & ComponentPropsWithRef<'textarea'>) {
  return (
    <Field label={label} hint={hint} error={error} optional={optional} id={id ?? area.name}>
      {(wiring) => <textarea rows={3} {...area} {...wiring} className={`entry ${className}`} />}
    </Field>
  )
}
