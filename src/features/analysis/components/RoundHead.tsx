import type { Agreement } from '#shared/contracts/analysis.ts'
import type { Round } from '#shared/contracts/rounds.ts'
import { to } from '#src/app/paths.ts'
import { RoundSelvedge } from '#src/app/RoundSelvedge.tsx'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { labelWords } from '#src/components/results/agreement-words.ts'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { counted, sentenceCase } from '#src/lib/counts.ts'
import { moment } from '#src/lib/dates.ts'
import { servingsWords } from '../servings-words.ts'

interface RoundHeadProps {
  panel: string
  agreement: Agreement
  round: Round
}

function Labels({ agreement }: { agreement: Agreement }) {
  return (
    <>
      <p>
        <strong>{labelWords(agreement.label)}</strong>
      </p>
      {agreement.labels.map((label) => (
        <p key={label}>{label}</p>
      ))}
      {agreement.round.origin === 'live' && <p>The cloth is off: codes have names now.</p>}
    </>
  )
}

/** Under six listeners a result is told among those who took part. */
function FewListeners({ agreement }: { agreement: Agreement }) {
  const { key, fewest } = agreement.label
  if (key !== 'none' && key !== 'informal') return null
  return (
    <div className="mt-6">
      <Notice title={`Informal: ${counted(fewest, 'listener')} on some unit`}>
        {key === 'none'
          ? 'Under five listeners no figures are published at all. What stands here is for those who took part.'
          : 'Under six listeners there is no verdict sentence. What stands here is for those who took part.'}
      </Notice>
    </div>
  )
}

/** The head of the agreement screen: which round, what came in, under which labels, and where to go from here. */
export function RoundHead({ panel, agreement, round }: RoundHeadProps) {
  const at = { panel, round: agreement.round.id }
  const live = agreement.round.origin === 'live'
  return (
    <FolioSection
      label={<RoundSelvedge panel={panel} round={round} shown="closed" />}
      note={<Labels agreement={agreement} />}
    >
      <PageTitle size="plain" title={`Agreement: ${agreement.round.title}`}>
        {agreement.round.title}
      </PageTitle>
      <p className="lead mt-3">
        {sentenceCase(counted(agreement.listeners.length, 'listener'))}.{' '}
        {servingsWords(agreement.servings, agreement.round.origin)}
        {live && round.closedAt && ` The key opened when the round closed, ${moment(round.closedAt)}.`}
      </p>
      <FewListeners agreement={agreement} />
      <div className="actions mt-6">
        {agreement.can.publish && (
          <LinkButton kind="primary" to={to('publish', at)}>
            {round.status === 'published' ? 'Correct the verdict' : 'Write the verdict'}
          </LinkButton>
        )}
        {live && <LinkButton to={to('reveal', at)}>Show the room</LinkButton>}
      </div>
    </FolioSection>
  )
}
