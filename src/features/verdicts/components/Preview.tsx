import { useQuery } from '@tanstack/react-query'
import type { VerdictDraft } from '#shared/contracts/verdicts.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio } from '#src/components/layout/Folio.tsx'
import { byFamily } from '#src/components/results/by-family.ts'
import { DescriptorSpread } from '#src/components/results/DescriptorSpread.tsx'
import { figuresQuery, type AtRound } from '../queries.ts'
import { Compared } from './Compared.tsx'
import { Opening } from './Opening.tsx'

interface PreviewProps {
  at: AtRound
  draft: VerdictDraft
  panelName: string
}

/** The page as readers will get it, from what has been kept so far: words, who paid, units, figures. */
export function Preview({ at, draft, panelName }: PreviewProps) {
  const figures = useQuery(figuresQuery(at))
  const results = draft.label.key === 'none' ? [] : (figures.data?.results ?? [])
  return (
    <div role="region" aria-label="Preview of the public page" className="border-y border-line">
      <Folio>
        <Opening
          selvedge={[panelName, 'not published', `Version ${(draft.published?.version ?? 0) + 1}`]}
          headline={draft.headline}
          title={draft.round.title}
          summary={draft.summary}
          certainty={[]}
          label={draft.label}
          labels={draft.labels}
          units={draft.units}
          asPage={false}
          anchor="preview-compared"
        />
        <Compared
          units={draft.units}
          disclosures={draft.units.flatMap((unit) => unit.disclosure ?? [])}
          results={results}
          anchor="preview-compared"
        />
        <Asked query={figures} waiting="Reading the figures">
          {() =>
            byFamily(results).flatMap((group) =>
              group.results.map((result) => <DescriptorSpread key={result.descriptor.key} result={result} />),
            )
          }
        </Asked>
      </Folio>
    </div>
  )
}
