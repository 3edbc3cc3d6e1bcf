interface StepsProps {
  /** "Serving" gives "Serving 3 of 7". */
  noun: string
  /** The present one, counted from 1; total + 1 when all are done. */
  current: number
  total: number
  /** How much of the present one is done, 0 to 1. */
  within?: number
  /** Hides the words where they stand beside it already. */
  silent?: boolean
}

/** How far a listener is through the servings: one short thread each, filled as they go. */
export function Steps({ noun, current, total, within = 0, silent = false }: StepsProps) {
  const words = current > total ? `All ${total} done` : `${noun} ${current} of ${total}`
  return (
    <div>
      {!silent && <div className="font-semibold">{words}</div>}
      <div className="steps" role="img" aria-label={words}>
        {Array.from({ length: total }, (_, nth) => {
          const share = nth + 1 < current ? 1 : nth + 1 === current ? within : 0
          return (
            <span key={nth} className="step">
              <span className="step-filled" style={{ width: `${share * 100}%` }} />
            </span>
          )
        })}
      </div>
    </div>
  )
}
