import { useQuery } from '@tanstack/react-query'
import { useMemo, useState } from 'react'
import { useNavigate, useParams } from 'react-router-dom'
import type { Panel } from '#shared/contracts/panels.ts'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { EveningForm } from '../components/EveningForm.tsx'
import { blankEvening } from '../evening/blank-evening.ts'
import { keptEvening, takenUp } from '../evening/kept-evening.ts'
import { createSameKey } from '#src/lib/same-key.ts'
import { membersQuery, panelQuery, unitsQuery, useCreateEvening } from '../queries.ts'

function NewEvening({ panel }: { panel: Panel }) {
  const navigate = useNavigate()
  const kept = useMemo(() => keptEvening(panel.slug), [panel.slug])
  const keyFor = useMemo(() => createSameKey(), [])
  const blank = useMemo(() => blankEvening(panel.you.name, new Date(), panel.timeZone), [panel])
  const [start, setStart] = useState(() => {
    const found = kept.read()
    return { draft: takenUp(blank, found), again: found !== undefined, nth: 0 }
  })
  const units = useQuery(unitsQuery(panel.slug))
  const members = useQuery(membersQuery(panel.slug))
  const create = useCreateEvening(panel.slug)
  return (
    <>
      {start.again && (
        <FolioSection label="Kept">
          <Notice title="Taken up where you left it">
            This tab kept what you had typed.{' '}
            <Button
              kind="secondary"
              onClick={() => {
                kept.forget()
                setStart(({ nth }) => ({ draft: blank, again: false, nth: nth + 1 }))
              }}
            >
              Start afresh
            </Button>
          </Notice>
        </FolioSection>
      )}
      <EveningForm
        key={start.nth}
        draft={start.draft}
        kept={kept}
        known={{
          units: units.data?.units ?? [],
          people: members.data?.members.map(({ name }) => name) ?? [],
        }}
        verb="Look over the plan"
        busyVerb="Writing the plan"
        send={async (body) => {
          const round = await create.mutateAsync({ body, key: keyFor(body) })
          kept.forget()
          await navigate(to('plan', { panel: panel.slug, round: round.id }))
        }}
      />
    </>
  )
}

export default function NewEveningPage() {
  const { panel: slug = '' } = useParams()
  const query = useQuery(panelQuery(slug))
  return (
    <Asked query={query} waiting="Reading the panel">
      {(panel) => (
        <Folio>
          <FolioSection
            label={panel.name}
            note={
              <p>
                Have ready: opaque pouches, tips for each listener, wipes, a source. Five minutes to the first
                pouch.
              </p>
            }
          >
            <PageTitle>Start an evening</PageTitle>
            {panel.can.startRound ? (
              <p className="lead mt-3">
                Type the names of the earphones and of those present. Everything else has a default that you
                can change.
              </p>
            ) : (
              <p className="lead mt-3">Only an organiser of {panel.name} starts a round.</p>
            )}
          </FolioSection>
          {panel.can.startRound && <NewEvening key={panel.slug} panel={panel} />}
        </Folio>
      )}
    </Asked>
  )
}
