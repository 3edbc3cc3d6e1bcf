import { shareOf } from './answer.ts'
import type { Answer, LineScale } from './answer.ts'

/**
 * What the eye sees of a rating line. Two-sided scales show their middle and fill from it; one-sided ones fill from the
 * low end. Unanswered looks the same for every serving. Decorative: the native range speaks.
 */
export function LinePicture({ scale, value }: { scale: LineScale; value: Answer }) {
  const answered = typeof value === 'number'
  const at = answered ? shareOf(scale, value) * 100 : 50
  const from = scale.sided === 'two' ? 50 : 0
  return (
    <>
      <span className="rating-rail" />
      <span className="rating-ends-mark" style={{ left: 0 }} />
      <span className="rating-ends-mark" style={{ right: 0 }} />
      {answered && scale.sided === 'two' && <span className="rating-middle" />}
      {answered && (
        <>
          <span
            className="rating-fill"
            style={{ left: `${Math.min(at, from)}%`, width: `${Math.abs(at - from)}%` }}
          />
          <span className="rating-thumb" style={{ left: `${at}%` }} />
        </>
      )}
      {value === null && <span className="rating-prompt">touch the line to answer</span>}
      {value === 'cant-tell' && <span className="rating-prompt">answered: can’t tell</span>}
    </>
  )
}
