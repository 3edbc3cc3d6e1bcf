import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import type { Agreement } from '#shared/contracts/analysis.ts'
import type { Round } from '#shared/contracts/rounds.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { byFamily } from '#src/components/results/by-family.ts'
import { DescriptorSpread } from '#src/components/results/DescriptorSpread.tsx'
import { IntervalScope } from '#src/components/results/IntervalScope.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { AtAGlance, Coefficients } from '../components/AtAGlance.tsx'
import { Computed } from '../components/Computed.tsx'
import { RoundHead } from '../components/RoundHead.tsx'
import { Exclusions, Recognised } from '../components/Withheld.tsx'
import { agreementQuery, roundQuery } from '../queries.ts'
import { listenerNames } from '../servings-words.ts'

interface SpreadsProps {
  panel: string
  agreement: Agreement
  round: Round
}

const glanceNote = (
  <>
    <p>
      “Agree” is about one listener against another: one rating each, absolute agreement (ICC). The words come
      from its 95 % interval.
    </p>
    <p>
      “Panel’s mean” is about the average of all who listened. It grows steadier with more listeners, even
      where people disagree.
    </p>
  </>
)

function Spreads({ panel, agreement, round }: SpreadsProps) {
  const called = listenerNames(agreement.listeners)
  const results = byFamily(agreement.results).flatMap((group) => group.results)
  return (
    <Folio>
      <RoundHead panel={panel} agreement={agreement} round={round} />
      <FolioSection label="At a glance" note={glanceNote}>
        <h2 className="visually-hidden">At a glance</h2>
        {results.length === 0 ? (
          <Empty what="No rating came in." sentence="There is nothing to compare." />
        ) : (
          <>
            <AtAGlance results={agreement.results} />
            <div className="mt-8">
              <Coefficients results={agreement.results} />
            </div>
          </>
        )}
      </FolioSection>
      {results.map((result) => (
        <DescriptorSpread key={result.descriptor.key} result={result} listenerName={called} />
      ))}
      {(agreement.round.origin === 'live' || agreement.exclusions.length > 0) && (
        <FolioSection
          label="Left out"
          note="Excluding listeners raises published agreement. Rules were frozen at opening; none rests on disagreeing with the panel."
        >
          <h2 className="heading mb-3">Left out by a rule</h2>
          <Exclusions agreement={agreement} called={called} />
        </FolioSection>
      )}
      {agreement.round.origin === 'live' && (
        <FolioSection label="Recognised">
          <h2 className="heading mb-3">Recognised under its code</h2>
          <Recognised agreement={agreement} called={called} />
        </FolioSection>
      )}
      <FolioSection label="Limits">
        <h2 className="heading mb-3">What the intervals do not cover</h2>
        <div className="measure">
          <IntervalScope />
        </div>
      </FolioSection>
      <FolioSection label="Computed">
        <h2 className="heading mb-3">How this was computed</h2>
        <Computed agreement={agreement} />
      </FolioSection>
    </Folio>
  )
}

/** How far the listeners agreed and what they heard: at a glance, then one descriptor a spread. After closing only. */
export default function AgreementPage() {
  const { panel = '', round = '' } = useParams()
  const figures = useQuery(agreementQuery({ panel, round }))
  const record = useQuery(roundQuery({ panel, round }))
  return (
    <Asked query={record} waiting="Reading the round">
      {(found) => (
        <Asked query={figures} waiting="Computing agreement">
          {(agreement) => <Spreads panel={panel} agreement={agreement} round={found} />}
        </Asked>
      )}
    </Asked>
  )
}
