import { useId } from 'react'
import type { ReactNode } from 'react'
import { Icon } from '../Icon.tsx'

export interface FieldWords {
  label: ReactNode
  /** Stays where it is when an error comes. */
  hint?: ReactNode
  /** What is wrong and what to do. */
  error?: string | null
  /** Most fields are needed; one that is not says so. */
  optional?: boolean
}

export interface FieldWiring {
  id: string
  'aria-describedby': string | undefined
  'aria-invalid': true | undefined
}

interface FieldProps extends FieldWords {
  /** Id of the entry; ErrorSummary links to it. Made up when not given. */
  id?: string
  children: (wiring: FieldWiring) => ReactNode
}

/** The sentence under a field that says what is wrong, with its sign. */
export function FieldError({ id, children }: { id: string; children: ReactNode }) {
  return (
    <p id={id} className="field-error">
      <Icon name="alert" size={18} />
      <span>{children}</span>
    </p>
  )
}

/** Frame of a field: label, hint, entry, error. The entry takes the ids that the function is given. */
export function Field({ id, label, hint, error, optional, children }: FieldProps) {
  const made = useId()
  const own = id ?? made
  const described = [hint ? `${own}-hint` : '', error ? `${own}-error` : ''].filter(Boolean).join(' ')
  return (
    <div className="field">
      <label className="field-label" htmlFor={own}>
        {label}
        {optional && <span className="field-optional"> (if you like)</span>}
      </label>
      {hint && (
        <div id={`${own}-hint`} className="field-hint">
          {hint}
        </div>
      )}
      {children({
        id: own,
        'aria-describedby': described || undefined,
        'aria-invalid': error ? true : undefined,
      })}
      {error && <FieldError id={`${own}-error`}>{error}</FieldError>}
    </div>
  )
}
