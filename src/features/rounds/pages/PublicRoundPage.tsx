import { useQuery } from '@tanstack/react-query'
import { Link, useParams } from 'react-router-dom'
import { getRoundFile, type PublicRound } from '#shared/contracts/rounds.ts'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Code } from '#src/components/Code.tsx'
import { Folio, FolioSection, SelvedgeLines } from '#src/components/layout/Folio.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { addressOf } from '#src/lib/call.ts'
import { counted, sentenceCase } from '#src/lib/counts.ts'
import { day, moment } from '#src/lib/dates.ts'
import { Facts } from '../components/Facts.tsx'
import { Fingerprints } from '../components/Fingerprints.tsx'
import { ScorecardList } from '../components/ScorecardList.tsx'
import { blindingSentence, levelWords } from '../evening/plan-words.ts'
import { publicRoundQuery } from '../queries.ts'

const stateWords = (round: PublicRound): string => {
  if (round.cancelledAt)
    return `Cancelled ${moment(round.cancelledAt)}: ${round.cancelReason ?? 'no reason given'}`
  if (round.closedAt) return `Closed ${moment(round.closedAt)}. The key is open.`
  return 'Open: listeners are rating. Which unit stands behind a code is under the cloth until the round closes.'
}

const levels = (matching: string): string =>
  matching in levelWords ? levelWords[matching as keyof typeof levelWords] : matching

/** A cancelled round's plan and key, for anybody who kept the fingerprints. */
const CancelledFiles = ({ round }: { round: string }) => (
  <p>
    Its codes are spent and no rating is shown. Plan and key are public:{' '}
    {(['plan.json', 'key.json'] as const).map((file) => (
      <a key={file} className="mr-3" href={addressOf(getRoundFile, { params: { round, file } })} download>
        {file}
      </a>
    ))}
  </p>
)

export default function PublicRoundPage() {
  const { round: id = '' } = useParams()
  const query = useQuery(publicRoundQuery(id))
  return (
    <Asked query={query} waiting="Reading the round">
      {(round) => (
        <Folio>
          <FolioSection
            label={
              <SelvedgeLines
                lines={[
                  round.panelName,
                  ...(round.openedAt ? [`opened ${day(round.openedAt)}`] : []),
                  round.status,
                ]}
              />
            }
            note={
              round.status === 'open' && (
                <>
                  <Code code={null} size="small" label="The cloth is on" />
                  <p>No unit, no code and no rating stands on this page while the round is open.</p>
                </>
              )
            }
          >
            <PageTitle>{round.title}</PageTitle>
            <p className="lead mt-3">{round.question}</p>
            <div className="mt-6">
              <Notice kind={round.cancelledAt ? 'signal' : 'plain'} title={stateWords(round)}>
                {round.verdictSlug && (
                  <Link to={to('verdict', { slug: round.verdictSlug })}>Read the verdict</Link>
                )}
                {round.keyIsPublic && <CancelledFiles round={round.id} />}
                {round.cancelledAt && !round.keyIsPublic && (
                  <p>Its key stays shut while an open round uses one of its units.</p>
                )}
              </Notice>
            </div>
          </FolioSection>
          <FolioSection
            label="Fingerprints"
            note={
              <p>
                The SHA-256 of two files, fixed {round.openedAt ? moment(round.openedAt) : 'at opening'}.
                After publishing, the files’ bytes must give these lines; anyone can check it without Scrim,
                for instance with sha256sum.
              </p>
            }
          >
            <Fingerprints plan={round.planFingerprint} keyFile={round.keyFingerprint} />
          </FolioSection>
          <FolioSection label="The plan">
            <Facts
              facts={[
                [
                  'Size',
                  sentenceCase(
                    `${counted(round.unitCount, 'unit')}, ${counted(round.listeners, 'listener')}, ${counted(round.turns, 'turn')}`,
                  ),
                ],
                ['Blinding', blindingSentence[round.blinding]],
                ['Levels', sentenceCase(levels(round.levelMatching))],
                ['Shape and cable', round.hiding],
                ['Music', round.tracks.length > 0 ? round.tracks.join(' · ') : 'Not named'],
                [
                  'Scorecard',
                  <ScorecardList scorecard={round.scorecard} primary={round.primaryDescriptor} />,
                ],
              ]}
            />
          </FolioSection>
        </Folio>
      )}
    </Asked>
  )
}
