import { useId, useState } from 'react'

interface NumberInSentenceProps {
  /** What the number is, for a screen reader: "Listeners at the table". */
  label: string
  value: number
  onChange: (value: number) => void
  min: number
  max: number
  step?: number
  disabled?: boolean
}

const parse = (text: string) => (/^\s*-?\d+([.,]\d+)?\s*$/.test(text) ? Number(text.replace(',', '.')) : NaN)

/**
 * A number edited in place inside a sentence ("six units, [7] minutes each"). A number within its limits is taken at
 * once; one outside is kept on screen, marked, and the limits are said; leaving the field brings the last good one
 * back. Arrow keys step.
 */
export function NumberInSentence({
  label,
  value,
  onChange,
  min,
  max,
  step = 1,
  disabled,
}: NumberInSentenceProps) {
  const id = useId()
  const [draft, setDraft] = useState<string | null>(null)
  const text = draft ?? String(value)
  const number = parse(text)
  const good = Number.isFinite(number) && number >= min && number <= max && isOnStep(number, min, step)

  const take = (next: string) => {
    setDraft(next)
    const parsed = parse(next)
    if (Number.isFinite(parsed) && parsed >= min && parsed <= max && isOnStep(parsed, min, step))
      onChange(parsed)
  }

  return (
    <span>
      <span className="number-in-sentence">
        <input
          id={id}
          type="text"
          inputMode={step % 1 === 0 ? 'numeric' : 'decimal'}
          autoComplete="off"
          aria-label={label}
          aria-invalid={good ? undefined : true}
          aria-describedby={good ? undefined : `${id}-limits`}
          disabled={disabled}
          style={{ width: `calc(${Math.max(2, text.length)}ch + 0.3em)` }}
          value={text}
          onFocus={(event) => event.target.select()}
          onChange={(event) => take(event.target.value)}
          onBlur={() => setDraft(null)}
          onKeyDown={(event) => {
            const by = { ArrowUp: step, ArrowDown: -step }[event.key]
            if (by === undefined) return
            event.preventDefault()
            const next = Math.min(max, Math.max(min, Number((value + by).toFixed(6))))
            setDraft(null)
            onChange(next)
          }}
        />
        <span className="number-in-sentence-line" aria-hidden="true" />
      </span>
      {!good && (
        <span id={`${id}-limits`} role="status" className="number-in-sentence-error">
          {' '}
          {min} to {max}
        </span>
      )}
    </span>
  )
}

function isOnStep(value: number, min: number, step: number) {
  const steps = (value - min) / step
  return Math.abs(steps - Math.round(steps)) < 1e-6
}
