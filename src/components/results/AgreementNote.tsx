import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import { AgreementScale } from '../charts/AgreementScale.tsx'
import { figureWords, isSaid, leftOutWords, wWords } from './agreement-words.ts'

/** The margin of a descriptor: how far listeners agree, in words, on the line and in numbers, and what to doubt. */
export function AgreementNote({ result }: { result: DescriptorResult }) {
  const { agreement, descriptor } = result
  const { single } = agreement
  const leftOut = leftOutWords(agreement.w)
  return (
    <>
      <h3>{agreement.sentence}</h3>
      {isSaid(single) && single.interval && (
        <div className="mt-2">
          <AgreementScale
            estimate={single.estimate}
            low={single.interval.low}
            high={single.interval.high}
            family={descriptor.family}
            label={descriptor.name}
          />
        </div>
      )}
      <p>One listener against another: {figureWords(single)}.</p>
      {agreement.steadiness !== '' && (
        <p>
          {agreement.steadiness} ({figureWords(agreement.average)}).
        </p>
      )}
      <p>
        Krippendorff’s alpha {figureWords(agreement.alpha)}. Kendall’s W {wWords(agreement.w)}.
      </p>
      {leftOut && <p>{leftOut}</p>}
      {result.notes.map((note) => (
        <p key={note}>{note}</p>
      ))}
    </>
  )
}
