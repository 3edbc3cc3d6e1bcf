import { useQuery, useQueryClient } from '@tanstack/react-query'
import { useMemo, useRef, useState } from 'react'
import { Link, useNavigate, useParams } from 'react-router-dom'
import { eveningDraft, type EveningDraft, type EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import type { Round } from '#shared/contracts/rounds.ts'
import { to } from '#src/app/paths.ts'
import { RoundSelvedge } from '#src/app/RoundSelvedge.tsx'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { EveningForm } from '../components/EveningForm.tsx'
import { StaleDraft } from '../components/StaleDraft.tsx'
import { keptEvening, takenUp } from '../evening/kept-evening.ts'
import { membersQuery, roundQuery, unitsQuery, useChangeEvening, type At } from '../queries.ts'

const draftOf = (round: Round): EveningDraftInput | null => {
  const read = eveningDraft.safeParse(round.draft)
  return read.success ? read.data : null
}

function EditEvening({ at, round, draft }: { at: At; round: Round; draft: EveningDraftInput }) {
  const navigate = useNavigate()
  const client = useQueryClient()
  const kept = useMemo(() => keptEvening(round.id), [round.id])
  const [start, setStart] = useState(() => ({ draft: takenUp(draft, kept.read()), nth: 0 }))
  const version = useRef(round.version)
  const lastSent = useRef<EveningDraft | null>(null)
  const units = useQuery(unitsQuery(at.panel))
  const members = useQuery(membersQuery(at.panel))
  const change = useChangeEvening(at)
  const send = async (body: EveningDraft) => {
    lastSent.current = body
    await change.mutateAsync({ body, version: version.current })
    kept.forget()
    await navigate(to('plan', at))
  }
  return (
    <EveningForm
      key={start.nth}
      draft={start.draft}
      kept={kept}
      known={{ units: units.data?.units ?? [], people: members.data?.members.map(({ name }) => name) ?? [] }}
      verb="Save the plan"
      busyVerb="Saving the plan"
      send={send}
      refusal={(problem) => (
        <StaleDraft
          problem={problem}
          onKeepMine={(current) => {
            version.current = current.version
            if (lastSent.current) void send(lastSent.current).catch(() => undefined)
          }}
          onTakeTheirs={(current) => {
            version.current = current.version
            kept.forget()
            client.setQueryData(roundQuery(at).queryKey, current)
            setStart(({ nth }) => ({ draft: draftOf(current) ?? draft, nth: nth + 1 }))
          }}
        />
      )}
    />
  )
}

export default function EditEveningPage() {
  const { panel = '', round: id = '' } = useParams()
  const at = { panel, round: id }
  const query = useQuery(roundQuery(at))
  return (
    <Asked query={query} waiting="Reading the draft">
      {(round) => {
        const draft = draftOf(round)
        return (
          <Folio>
            <FolioSection label={<RoundSelvedge panel={panel} round={round} />}>
              <PageTitle title={`Change ${round.title}`}>Change the evening</PageTitle>
              <p className="lead mt-3">
                {round.can.edit && draft
                  ? 'Nothing is drawn yet: everything may still change.'
                  : 'This round can no longer be changed. What was fixed at opening stays.'}
              </p>
              <p className="mt-2">
                <Link to={to('plan', at)}>Back to the plan</Link>
              </p>
            </FolioSection>
            {round.can.edit && draft && <EditEvening key={round.id} at={at} round={round} draft={draft} />}
          </Folio>
        )
      }}
    </Asked>
  )
}
