import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import type { Round } from '#shared/contracts/rounds.ts'
import { to } from '#src/app/paths.ts'
import { RoundSelvedge } from '#src/app/RoundSelvedge.tsx'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { moment } from '#src/lib/dates.ts'
import { CancelRound } from '../components/CancelRound.tsx'
import { DraftAgain } from '../components/DraftAgain.tsx'
import { Fingerprints } from '../components/Fingerprints.tsx'
import { Lacks } from '../components/Lacks.tsx'
import { OpenRound } from '../components/OpenRound.tsx'
import { PlanPicture } from '../components/PlanPicture.tsx'
import { PlanSentence } from '../components/PlanSentence.tsx'
import { RoundFacts } from '../components/RoundFacts.tsx'
import { blindingSentence, extraTurnWords, panelSizeWords } from '../evening/plan-words.ts'
import { roundQuery } from '../queries.ts'

function PlanNotes({ round }: { round: Round }) {
  const listeners = round.people.filter((person) => person.roles.includes('panelist')).length
  const small = panelSizeWords(listeners)
  const extra = round.origin === 'live' ? extraTurnWords(round.unitCount, listeners) : null
  return (
    <>
      {small && <p>{small}</p>}
      {extra && <p>{extra}</p>}
      <p>{blindingSentence[round.blinding]}</p>
      {round.levelMatching === 'not-matched' && (
        <p>Levels are not matched. The louder unit is often liked better; the verdict says so.</p>
      )}
      <p>
        About seven minutes a serving, a break of ten after four turns: common practice, no source. Twelve
        seconds a line: an assumption.
      </p>
    </>
  )
}

function Head({ panel, round }: { panel: string; round: Round }) {
  if (round.status === 'cancelled')
    return (
      <div className="mt-6">
        <Notice kind="signal" title="Cancelled">
          {round.cancelReason} No rating of this round is ever shown in sum.
        </Notice>
        <div className="actions mt-4">
          <DraftAgain at={{ panel, round: round.id }} />
        </div>
      </div>
    )
  if (round.status !== 'draft') return null
  return (
    <div className="mt-6 space-y-4">
      <Lacks panel={panel} round={round} />
      <div className="actions">
        {round.can.open && <OpenRound panel={panel} round={round} />}
        {round.can.edit && (
          <LinkButton to={to('editRound', { panel, round: round.id })}>Change the evening</LinkButton>
        )}
        {round.can.cancel && <CancelRound panel={panel} round={round} />}
      </div>
    </div>
  )
}

export default function PlanPage() {
  const { panel = '', round: id = '' } = useParams()
  const query = useQuery(roundQuery({ panel, round: id }))
  return (
    <Asked query={query} waiting="Reading the plan">
      {(round) => (
        <Folio>
          <FolioSection
            label={
              <RoundSelvedge
                panel={panel}
                round={round}
                shown={round.status === 'cancelled' ? undefined : 'draft'}
              />
            }
            note={<PlanNotes round={round} />}
          >
            <PageTitle title={`Plan of ${round.title}`}>{round.title}</PageTitle>
            <PlanSentence panel={panel} round={round} />
            <Head panel={panel} round={round} />
          </FolioSection>
          <FolioSection label="Rows">
            <PlanPicture round={round} />
          </FolioSection>
          <FolioSection label={round.status === 'draft' ? 'What will freeze' : 'What froze'}>
            <RoundFacts round={round} />
          </FolioSection>
          {round.openedAt && (
            <FolioSection
              label="Fingerprints"
              note={
                <p>
                  Written {moment(round.openedAt)}. Whoever keeps these lines can check later that neither
                  plan nor key was changed.
                </p>
              }
            >
              <Fingerprints plan={round.planFingerprint} keyFile={round.keyFingerprint} />
            </FolioSection>
          )}
        </Folio>
      )}
    </Asked>
  )
}
