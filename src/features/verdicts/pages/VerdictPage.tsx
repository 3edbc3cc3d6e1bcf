import { useQuery } from '@tanstack/react-query'
import { Link, Navigate, useParams, useSearchParams } from 'react-router-dom'
import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { byFamily } from '#src/components/results/by-family.ts'
import { DescriptorSpread } from '#src/components/results/DescriptorSpread.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { day } from '#src/lib/dates.ts'
import { CheckIt } from '../components/CheckIt.tsx'
import { Compared } from '../components/Compared.tsx'
import { Limits, Method } from '../components/Method.tsx'
import { Opening } from '../components/Opening.tsx'
import { Cite, Corrections, Files } from '../components/Record.tsx'
import { verdictQuery, verdictsQuery } from '../queries.ts'

/** Under five listeners nothing but words: no unit's figure rests on so few. */
function Figures({ verdict }: { verdict: PublicVerdict }) {
  if (verdict.results.length === 0)
    return (
      <FolioSection label="Figures">
        <h2 className="heading mb-3">No figures</h2>
        <p className="measure">
          Fewer than five listeners rated some unit, so this page carries no figures at all: a few people’s
          ratings would say more about them than about the units.
        </p>
      </FolioSection>
    )
  return byFamily(verdict.results).flatMap((group) =>
    group.results.map((result) => <DescriptorSpread key={result.descriptor.key} result={result} />),
  )
}

function Verdict({ verdict, earlier }: { verdict: PublicVerdict; earlier: boolean }) {
  return (
    <Folio>
      <Opening
        selvedge={[
          verdict.panelName,
          day(verdict.publishedAt),
          `Verdict ${verdict.number}, version ${verdict.version}`,
          ...(earlier
            ? [
                <Link key="present" to={to('verdict', { slug: verdict.slug })}>
                  Read the present version
                </Link>,
              ]
            : []),
        ]}
        {...verdict}
      />
      <Compared units={verdict.units} disclosures={verdict.disclosures} results={verdict.results} />
      <Figures verdict={verdict} />
      {verdict.sentences.length > 0 && (
        <FolioSection
          label="In Scrim’s words"
          note="Scrim wrote these from the numbers; the sentence on top is the organiser’s."
        >
          <h2 className="heading mb-3">What the numbers say</h2>
          <div className="reading">
            {verdict.sentences.map((sentence, nth) => (
              <p key={nth}>{sentence}</p>
            ))}
          </div>
        </FolioSection>
      )}
      <Limits limits={verdict.limits} />
      <Method verdict={verdict} />
      <CheckIt verdict={verdict} />
      <Files verdict={verdict} />
      <Corrections verdict={verdict} />
      <Cite verdict={verdict} />
    </Folio>
  )
}

/** `/v/7`: the short address of a citation leads to the verdict's own. */
function ByNumber({ number }: { number: string }) {
  const query = useQuery(verdictsQuery)
  return (
    <Asked query={query} waiting="Looking the verdict up">
      {({ verdicts }) => {
        const found = verdicts.find((verdict) => String(verdict.number) === number)
        if (found) return <Navigate to={to('verdict', { slug: found.slug })} replace />
        return (
          <Folio>
            <FolioSection label="Not found">
              <PageTitle size="plain">No verdict has the number {number}</PageTitle>
              <div className="mt-4">
                <Empty
                  what="Numbers are given when a verdict is published."
                  sentence="A misprinted digit is the likeliest reason."
                  action={<LinkButton to={to('home')}>Read the verdicts</LinkButton>}
                />
              </div>
            </FolioSection>
          </Folio>
        )
      }}
    </Asked>
  )
}

function BySlug({ slug }: { slug: string }) {
  const [search] = useSearchParams()
  const version = Number(search.get('version') ?? '')
  const query = useQuery(verdictQuery(slug, Number.isInteger(version) && version > 0 ? version : undefined))
  return (
    <Asked query={query} waiting="Reading the verdict">
      {(verdict) => <Verdict verdict={verdict} earlier={search.has('version')} />}
    </Asked>
  )
}

/** What anyone may read: the sentence, how sure, compared with what, who paid, what was not tested, the data. */
export default function VerdictPage() {
  const { slug, number } = useParams()
  return slug === undefined ? <ByNumber number={number ?? ''} /> : <BySlug slug={slug} />
}
