import { useId } from 'react'
import type { ComponentPropsWithRef, ReactNode } from 'react'
import { FieldError } from './Field.tsx'

interface CheckRowProps extends Omit<ComponentPropsWithRef<'input'>, 'type'> {
  label: ReactNode
  hint?: ReactNode
  error?: string | null
}

/** One thing to tick, as a row: a consent, "new tips", a rule that is on. Takes what an input takes. */
export function CheckRow({ label, hint, error, id, className = '', ...input }: CheckRowProps) {
  const made = useId()
  const own = id ?? input.name ?? made
  const described = [hint ? `${own}-hint` : '', error ? `${own}-error` : ''].filter(Boolean).join(' ')
  return (
    <div className="choices">
      <label className={`choice ${className}`} htmlFor={own}>
        <input
          {...input}
          id={own}
          type="checkbox"
          className="tick"
          aria-labelledby={`${own}-name`}
          aria-invalid={error ? true : undefined}
          aria-describedby={described || undefined}
        />
        <span id={`${own}-name`}>{label}</span>
        {hint && (
          <span id={`${own}-hint`} className="field-hint col-start-2">
            {hint}
          </span>
        )}
      </label>
      {error && <FieldError id={`${own}-error`}>{error}</FieldError>}
    </div>
  )
}
