import { useId } from 'react'
import type { ReactNode } from 'react'
import { FieldError } from './Field.tsx'

export interface Choice {
  value: string
  label: ReactNode
  hint?: ReactNode
  /** Why this one cannot be chosen now; shown in its row. */
  disabledReason?: string | null
}

interface Words {
  /** The question. */
  legend: ReactNode
  hint?: ReactNode
  error?: string | null
  /** Id of the group; ErrorSummary links to it. */
  id?: string
  name?: string
  choices: Choice[]
}

interface OneProps extends Words {
  type?: 'radio'
  value: string | null
  onChange: (value: string) => void
}

interface SeveralProps extends Words {
  type: 'checkbox'
  value: string[]
  onChange: (value: string[]) => void
}

/** Choices are rows to tap: one of them (radio) or several (checkbox). */
export function ChoiceRows(props: OneProps | SeveralProps) {
  const made = useId()
  const id = props.id ?? props.name ?? made
  const described = [props.hint ? `${id}-hint` : '', props.error ? `${id}-error` : '']
    .filter(Boolean)
    .join(' ')
  const isChosen = (value: string) =>
    props.type === 'checkbox' ? props.value.includes(value) : props.value === value
  const choose = (value: string, on: boolean) => {
    if (props.type !== 'checkbox') props.onChange(value)
    else {
      const wanted = new Set(props.value)
      if (on) wanted.add(value)
      else wanted.delete(value)
      const order = props.choices.map((choice) => choice.value)
      props.onChange(order.filter((entry) => wanted.has(entry)))
    }
  }
  return (
    <fieldset id={id} tabIndex={-1} aria-describedby={described || undefined} className="field">
      <legend className="field-label">{props.legend}</legend>
      {props.hint && (
        <div id={`${id}-hint`} className="field-hint">
          {props.hint}
        </div>
      )}
      <div className="choices mt-2">
        {props.choices.map((choice, nth) => (
          <label key={choice.value} className="choice">
            <input
              className="tick"
              type={props.type ?? 'radio'}
              name={props.name ?? made}
              value={choice.value}
              checked={isChosen(choice.value)}
              disabled={Boolean(choice.disabledReason)}
              aria-labelledby={`${id}-name-${nth}`}
              aria-invalid={props.error ? true : undefined}
              aria-describedby={choice.hint || choice.disabledReason ? `${id}-choice-${nth}` : undefined}
              onChange={(event) => choose(choice.value, event.target.checked)}
            />
            <span id={`${id}-name-${nth}`}>{choice.label}</span>
            {(choice.hint || choice.disabledReason) && (
              <span id={`${id}-choice-${nth}`} className="field-hint col-start-2">
                {choice.disabledReason ?? choice.hint}
              </span>
            )}
          </label>
        ))}
      </div>
      {props.error && <FieldError id={`${id}-error`}>{props.error}</FieldError>}
    </fieldset>
  )
}
