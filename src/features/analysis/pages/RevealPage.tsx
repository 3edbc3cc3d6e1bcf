import { useCallback } from 'react'
import { useQuery } from '@tanstack/react-query'
import { useParams, useSearchParams } from 'react-router-dom'
import type { Reveal } from '#shared/contracts/analysis.ts'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { DuskStage } from '#src/components/layout/DuskStage.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { RevealPicture } from '../components/RevealPicture.tsx'
import { revealQuery } from '../queries.ts'
import { lastStep, progressAt, saidAt, stepFrom } from '../reveal-steps.ts'
import { useAdvance } from '../useAdvance.ts'

interface StageProps {
  reveal: Reveal
  leave: string
}

/** The stage itself: the step stands in the address, so that a reload does not cover again what the room has seen. */
function Stage({ reveal, leave }: StageProps) {
  const [search, setSearch] = useSearchParams()
  const step = stepFrom(search.get('step'), reveal)
  const last = lastStep(reveal)
  const go = useCallback(
    (wanted: number) =>
      setSearch(
        { step: String(Math.min(Math.max(wanted, 0), last)) },
        { replace: true, preventScrollReset: true },
      ),
    [last, setSearch],
  )
  const next = useCallback(() => go(step + 1), [go, step])
  const back = useCallback(() => go(step - 1), [go, step])
  useAdvance(next, back)
  const said = saidAt(reveal, step)
  return (
    <DuskStage
      head={
        <>
          <PageTitle size="hidden" title={`Reveal: ${reveal.title}`}>
            Reveal: {reveal.title}
          </PageTitle>
          <p className="note">{reveal.label}</p>
          <LinkButton to={leave}>Leave the stage</LinkButton>
        </>
      }
      foot={
        <>
          <p className="note">{progressAt(reveal, step)}</p>
          {step < last ? (
            <Button onClick={next}>Next</Button>
          ) : (
            <LinkButton to={leave}>Read the numbers</LinkButton>
          )}
        </>
      }
    >
      <div aria-live="polite" className="mb-6 min-h-24">
        <p className="display">{said.heading}</p>
        {said.codes.length > 0 && (
          <p className="mt-2 flex flex-wrap gap-x-4 text-18">
            <span className="text-muted">It went by</span>
            {said.codes.map((code) => (
              <span key={code} className="font-bold">
                {code}
              </span>
            ))}
          </p>
        )}
        {said.detail !== '' && <p className="mt-2 text-18 text-muted">{said.detail}</p>}
      </div>
      <RevealPicture reveal={reveal} drawn={Math.min(step, reveal.units.length)} />
    </DuskStage>
  )
}

/** For the room, when the key has opened: dusk, full screen, the cloth drawn aside unit by unit. One verb: Next. */
export default function RevealPage() {
  const { panel = '', round = '' } = useParams()
  const query = useQuery(revealQuery({ panel, round }))
  const leave = to('agreement', { panel, round })
  if (query.data) return <Stage reveal={query.data} leave={leave} />
  return (
    <DuskStage
      head={
        <PageTitle size="hidden" title="Reveal">
          Reveal
        </PageTitle>
      }
      foot={<LinkButton to={leave}>Back to the round</LinkButton>}
    >
      <Asked query={query} waiting="Fetching what the room will see">
        {() => null}
      </Asked>
    </DuskStage>
  )
}
