import type { Descriptor } from '#shared/contracts/scorecard.ts'
import { sayAnswer, shareOf, type Answer } from '#src/components/rating/answer.ts'
import { lineScale } from '../line-scale.ts'

/** One answer at a glance: the line in small with its mark, no number; "can't tell" and an open line in words. */
export function AnswerGlimpse({ line, answer }: { line: Descriptor; answer: Answer }) {
  const scale = lineScale(line)
  return (
    <li className="grid grid-cols-[minmax(0,1fr)_7rem] items-center gap-x-4 py-2">
      <span>{line.name}</span>
      {typeof answer === 'number' ? (
        <span className="relative block h-4">
          <span className="visually-hidden">{sayAnswer(scale, answer)}</span>
          <span aria-hidden="true" className="absolute inset-x-0 top-1/2 h-px bg-edge" />
          {scale.sided === 'two' && (
            <span aria-hidden="true" className="absolute top-1 left-1/2 h-2 w-px bg-edge" />
          )}
          <span
            aria-hidden="true"
            className="absolute top-1/2 size-3 -translate-x-1/2 -translate-y-1/2 rounded-full"
            style={{ left: `${shareOf(scale, answer) * 100}%`, background: 'var(--family)' }}
          />
        </span>
      ) : answer === 'cant-tell' ? (
        <span className="text-14">can’t tell</span>
      ) : (
        <span className="text-14 font-semibold text-signal">open</span>
      )}
    </li>
  )
}
