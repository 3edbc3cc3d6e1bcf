import { useQuery } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import type { PanelistSeat, SeatReport } from '#shared/contracts/seats.ts'
import { to } from '#src/app/paths.ts'
import { Code } from '#src/components/Code.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { Waiting } from '#src/components/ui/Waiting.tsx'
import { reportQuery } from '../queries.ts'
import { CallFailure } from './CallFailure.tsx'
import { HandOverLinks } from './HandOver.tsx'
import { OwnRating } from './OwnRating.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

/** After closing: own ratings beside the panel's, unit by unit. No rank, nobody else's ratings. */
export function OwnReport({ seat, notices }: { seat: PanelistSeat; notices: ReactNode }) {
  const query = useQuery(reportQuery(seat.id))
  return (
    <SeatFrame seat={{ ...seat, serving: null }}>
      {notices}
      <ScreenTitle>What you heard, beside the panel</ScreenTitle>
      <p className="lead mt-3">
        The cloth is aside. Where you and the panel part, neither is wrong: ears, tips and taste differ, and
        that is what a panel is for.
      </p>
      {query.data ? (
        <Report report={query.data} />
      ) : query.error ? (
        <CallFailure
          error={query.error}
          what="Your report could not be read."
          kept="Your ratings are with the round."
          onRetry={() => void query.refetch()}
        />
      ) : (
        <Waiting label="Reading your report" />
      )}
      <HandOverLinks seat={seat} />
    </SeatFrame>
  )
}

function Report({ report }: { report: SeatReport }) {
  const lines = new Map(report.scorecard.map((line) => [line.key, line]))
  return (
    <>
      <p className="note mt-4">
        <span aria-hidden="true" className="mr-1 inline-block size-3 rounded-full bg-ink align-[-1px]" /> your
        rating
        <span aria-hidden="true" className="mr-1 ml-4 inline-block h-4 w-0.5 bg-edge align-[-3px]" /> the
        panel’s median
      </p>
      {report.units.map((unit) => (
        <section key={unit.code} className="mt-8 border-t border-line pt-6">
          <div className="flex flex-wrap items-center justify-between gap-3">
            <h2 className="heading">
              {unit.name} <span className="block text-16 font-normal text-muted">{unit.maker}</span>
            </h2>
            <Code code={unit.code} size="small" drawn label="Code" />
          </div>
          <ul className="rows mt-2">
            {unit.ratings.map((rating) => {
              const line = lines.get(rating.descriptor)
              return line && <OwnRating key={rating.descriptor} line={line} rating={rating} />
            })}
          </ul>
        </section>
      ))}
      {report.units.length === 0 && (
        <p className="mt-6">You sent no ratings in this round, so there is nothing of yours to show.</p>
      )}
      {report.verdictSlug && (
        <div className="mt-8">
          <LinkButton kind="primary" to={to('verdict', { slug: report.verdictSlug })}>
            Read the verdict
          </LinkButton>
        </div>
      )}
    </>
  )
}
