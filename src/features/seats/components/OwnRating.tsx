import type { Descriptor } from '#shared/contracts/scorecard.ts'
import type { SeatReport } from '#shared/contracts/seats.ts'
import { shareOf } from '#src/components/rating/answer.ts'
import { FamilySign } from '#src/components/FamilySign.tsx'
import { lineScale } from '../line-scale.ts'

type Rating = SeatReport['units'][number]['ratings'][number]

const figure = (value: number): string => String(Math.round(value * 10) / 10)

/** What one's own rating and the panel's were, in words. */
export function ratingWords({ yours, cantTell, panelMedian, n }: Rating): string {
  const own = cantTell ? 'you: can’t tell' : yours === null ? 'you: not rated' : `you ${figure(yours)}`
  const panel =
    panelMedian === null
      ? 'the panel: too few ratings to show'
      : n === 1 && yours !== null
        ? 'nobody else rated it'
        : `the panel ${figure(panelMedian)}, ${n} ${n === 1 ? 'rating' : 'ratings'}`
  return `${own} · ${panel}`
}

/** One line of the report: own point and the panel's median on the descriptor's own scale. */
export function OwnRating({ line, rating }: { line: Descriptor; rating: Rating }) {
  const scale = lineScale(line)
  const at = (value: number) => `${shareOf(scale, value) * 100}%`
  return (
    <li className="py-3" data-family={line.family}>
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <span className="inline-flex items-baseline gap-2 font-semibold">
          <FamilySign family={line.family} size={12} />
          {line.name}
        </span>
        <span className="note">{ratingWords(rating)}</span>
      </div>
      <div className="relative mx-2 h-7" aria-hidden="true">
        <span className="absolute inset-x-0 top-1/2 h-px bg-edge" />
        {scale.sided === 'two' && (
          <span className="absolute top-1/2 left-1/2 h-3 -translate-y-1/2 border-l border-dotted border-edge" />
        )}
        {rating.panelMedian !== null && (
          <span
            className="absolute top-0.5 h-6 w-0.5 -translate-x-1/2 bg-edge"
            style={{ left: at(rating.panelMedian) }}
          />
        )}
        {rating.yours !== null && (
          <span
            className="absolute top-1/2 size-3.5 -translate-x-1/2 -translate-y-1/2 rounded-full"
            style={{ left: at(rating.yours), background: 'var(--family)' }}
          />
        )}
      </div>
      <div className="flex justify-between text-14 text-muted">
        <span>{line.words.low}</span>
        <span>{line.words.high}</span>
      </div>
    </li>
  )
}
