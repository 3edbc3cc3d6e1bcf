import type { Descriptor } from '#shared/contracts/scorecard.ts'
import { families } from '#shared/domain/lexicon.ts'
import { FamilyName } from '#src/components/FamilySign.tsx'

interface ScorecardListProps {
  scorecard: readonly Descriptor[]
  primary: string
}

/** The lines of a scorecard by family, each with its end words. */
export function ScorecardList({ scorecard, primary }: ScorecardListProps) {
  return (
    <ul className="space-y-3">
      {families
        .filter((family) => scorecard.some((line) => line.family === family))
        .map((family) => (
          <li key={family}>
            <FamilyName family={family} />
            <ul>
              {scorecard
                .filter((line) => line.family === family)
                .map((line) => (
                  <li key={line.key}>
                    {family !== 'liking' && `${line.name}: `}
                    <span className="text-muted">
                      from {line.words.low} to {line.words.high}
                    </span>
                    {line.key === primary && (
                      <strong className="font-semibold"> · may be stated first</strong>
                    )}
                  </li>
                ))}
            </ul>
          </li>
        ))}
    </ul>
  )
}
