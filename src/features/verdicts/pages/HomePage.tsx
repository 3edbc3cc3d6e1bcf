import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import type { VerdictLine } from '#shared/contracts/verdicts.ts'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { HeardLineMini } from '#src/components/charts/HeardLineMini.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { counted } from '#src/lib/counts.ts'
import { day } from '#src/lib/dates.ts'
import { verdictsQuery } from '../queries.ts'

/** One verdict in the contents: its sentence, the primary descriptor's heard line, then panel, n, date. */
function Entry({ verdict }: { verdict: VerdictLine }) {
  const { descriptor, units } = verdict
  return (
    <article className="py-8 first:pt-0">
      <h2 className="display display-plain">
        <Link to={to('verdict', { slug: verdict.slug })} className="no-underline hover:underline">
          {verdict.headline}
        </Link>
      </h2>
      {descriptor && units.length > 0 && (
        <div className="mt-3">
          <HeardLineMini
            family={descriptor.family}
            scale={{
              low: descriptor.scale.low,
              high: descriptor.scale.high,
              lowWord: descriptor.words.low,
              highWord: descriptor.words.high,
            }}
            points={units.map((unit) => ({ name: unit.name, value: unit.median }))}
          />
        </div>
      )}
      <p className="note mt-2">
        {verdict.panelName} · {counted(verdict.listeners, 'listener')} · {verdict.label.toLowerCase()} ·{' '}
        {day(verdict.publishedAt)}
      </p>
      {verdict.labels.length > 0 && <p className="note">{verdict.labels.join(' · ')}</p>}
    </article>
  )
}

function Contents({ verdicts }: { verdicts: VerdictLine[] }) {
  if (verdicts.length === 0)
    return (
      <Empty
        what="A verdict is what a blind listening round published: one sentence, how sure it is, who paid, and the data."
        sentence="None is published here yet."
        action={<LinkButton to={to('how')}>How a round works</LinkButton>}
      />
    )
  return (
    <div className="rows">
      {verdicts.map((verdict) => (
        <Entry key={verdict.slug} verdict={verdict} />
      ))}
    </div>
  )
}

/** The first page: what Scrim is in one line, then the verdicts like a journal's contents. */
export default function HomePage() {
  const query = useQuery(verdictsQuery)
  return (
    <Folio>
      <FolioSection label="Blind listening, openly reported">
        <PageTitle size="hidden" title="Verdicts">
          Verdicts
        </PageTitle>
        <p className="lead">
          Panels listen to in-ear earphones under three-digit codes. When a round closes, Scrim says how far
          they agreed, what they heard and who paid, with the data.
        </p>
      </FolioSection>
      <FolioSection label="Verdicts, newest first" name="Verdicts, newest first">
        <Asked query={query} waiting="Reading the verdicts">
          {({ verdicts }) => <Contents verdicts={verdicts} />}
        </Asked>
      </FolioSection>
    </Folio>
  )
}
