import { useId, useRef, useState } from 'react'
import type { ReactNode } from 'react'
import type { Family } from './families.ts'
import { Icon } from './Icon.tsx'
import { answerByKey, answerByStep, middleOf, sayAnswer } from './rating/answer.ts'
import type { Answer, LineScale } from './rating/answer.ts'
import { LinePicture } from './rating/LinePicture.tsx'
import { useLinePointer } from './rating/useLinePointer.ts'
import { FieldError } from './ui/Field.tsx'
import { VisuallyHidden } from './ui/VisuallyHidden.tsx'

interface RatingLineProps {
  /** The descriptor: "Warmth". */
  name: string
  /** What it means: "Fullness of low voices and cello". Always shown, never the bare word. */
  sentence: ReactNode
  family: Family
  scale: LineScale
  value: Answer
  onChange: (value: Answer) => void
  /** Id of the control, for ErrorSummary. */
  id?: string
  /** Said when the listener wants to go on and this line is unanswered. */
  error?: string | null
  /** Locked after submitting: shows the answer, takes none. */
  readOnly?: boolean
  heading?: 'h2' | 'h3'
}

/**
 * One line of a scorecard. Untouched is unanswered: dashed, no thumb. A tap or a sideways drag sets it, scrolling over it
 * never does; the first key or step sets the middle; "clear" (or Delete) makes it unanswered; "I can't tell" is an
 * answer. No number is shown; a screen reader hears words and value from the native range inside.
 */
export function RatingLine({
  name,
  sentence,
  family,
  scale,
  value,
  onChange,
  id,
  error,
  readOnly = false,
  heading: Heading = 'h3',
}: RatingLineProps) {
  const made = useId()
  const own = id ?? made
  const range = useRef<HTMLInputElement>(null)
  const [said, setSaid] = useState('')
  const { handlers, dragging } = useLinePointer(scale, value, (next) => {
    if (next !== value) onChange(next)
  })

  const step = (direction: -1 | 1) => {
    const next = answerByStep(scale, value, direction)
    setSaid(sayAnswer(scale, next))
    if (next !== value) onChange(next)
  }
  const clear = () => {
    onChange(null)
    setSaid(`${name}: not answered`)
    range.current?.focus({ preventScroll: true })
  }

  return (
    <div className="rating-line" data-family={family} role="group" aria-labelledby={`${own}-name`}>
      <Heading id={`${own}-name`} className="subheading">
        {name}
      </Heading>
      <div id={`${own}-sentence`} className="leading-snug text-muted">
        {sentence}
      </div>
      <div className="rating-control">
        <button
          type="button"
          className="rating-step"
          aria-label={`${name}: a step towards ${scale.lowWord}`}
          disabled={readOnly}
          onClick={() => step(-1)}
        >
          <Icon name="minus" />
        </button>
        {/* Pointers only: the same is reached by keyboard and by assistive technology through the range inside. */}
        <div
          className="rating-track"
          data-testid="rating-track"
          data-state={value === null ? 'unanswered' : value === 'cant-tell' ? 'cant-tell' : 'answered'}
          data-dragging={dragging}
          data-read-only={readOnly}
          {...(readOnly ? {} : handlers)}
        >
          <LinePicture scale={scale} value={value} />
          <input
            ref={range}
            id={own}
            className="rating-range"
            type="range"
            min={scale.low}
            max={scale.high}
            step={scale.step}
            value={typeof value === 'number' ? value : middleOf(scale)}
            disabled={readOnly}
            aria-labelledby={`${own}-name`}
            aria-describedby={`${own}-sentence ${own}-ends${error ? ` ${own}-error` : ''}`}
            aria-valuetext={sayAnswer(scale, value)}
            aria-invalid={error ? true : undefined}
            onKeyDown={(event) => {
              if (event.altKey || event.ctrlKey || event.metaKey) return
              const next = answerByKey(scale, value, event.key)
              if (next === undefined) return
              event.preventDefault()
              if (next !== value) onChange(next)
            }}
            // Assistive technology may move the range without a key: the first such step sets the middle too.
            onChange={(event) =>
              onChange(typeof value === 'number' ? Number(event.target.value) : middleOf(scale))
            }
          />
        </div>
        <button
          type="button"
          className="rating-step"
          aria-label={`${name}: a step towards ${scale.highWord}`}
          disabled={readOnly}
          onClick={() => step(1)}
        >
          <Icon name="plus" />
        </button>
      </div>
      <div className="rating-words" aria-hidden="true">
        <span>{scale.lowWord}</span>
        <span className="rating-words-middle">
          {scale.sided === 'two' ? (scale.midWord ?? 'neutral') : ''}
        </span>
        <span>{scale.highWord}</span>
      </div>
      <div className="rating-answers">
        <label className="rating-cant-tell">
          <input
            type="checkbox"
            className="tick"
            checked={value === 'cant-tell'}
            disabled={readOnly}
            aria-describedby={`${own}-name`}
            onChange={(event) => onChange(event.target.checked ? 'cant-tell' : null)}
          />
          I can’t tell
        </label>
        {typeof value === 'number' && !readOnly && (
          <button type="button" className="rating-clear" aria-label={`clear ${name}`} onClick={clear}>
            clear
          </button>
        )}
      </div>
      <span id={`${own}-ends`} className="visually-hidden">
        From {scale.lowWord} to {scale.highWord}
      </span>
      <VisuallyHidden live>{said}</VisuallyHidden>
      {error && <FieldError id={`${own}-error`}>{error}</FieldError>}
    </div>
  )
}
