import { useEffect, useRef } from 'react'

interface ErrorSummaryProps {
  /** One line for each field: the id of its entry (its name, unless another id was given) and what is wrong. */
  errors: { field: string; message: string }[]
  title?: string
  /** Changes at each attempt, so that the summary takes focus again although the errors are the same. */
  attempt?: number
}

/** What is wrong on this form, on top of it. Takes focus when it appears; each line leads to its field. */
export function ErrorSummary({ errors, title = 'Look at these again', attempt = 0 }: ErrorSummaryProps) {
  const frame = useRef<HTMLDivElement>(null)
  const shown = errors.length > 0
  useEffect(() => {
    if (shown) frame.current?.focus()
  }, [shown, attempt])
  if (!shown) return null
  return (
    <div ref={frame} className="error-summary" role="alert" tabIndex={-1}>
      <h2 className="subheading">{title}</h2>
      <ul>
        {errors.map((error) => (
          <li key={`${error.field} ${error.message}`}>
            <a
              href={`#${error.field}`}
              onClick={(event) => {
                const field = document.getElementById(error.field)
                if (!field) return
                event.preventDefault()
                const entry = field.matches('fieldset')
                  ? (field.querySelector<HTMLElement>('input:checked, input:not(:disabled)') ?? field)
                  : field
                entry.focus()
                field.scrollIntoView?.({ block: 'center' })
              }}
            >
              {error.message}
            </a>
          </li>
        ))}
      </ul>
    </div>
  )
}
