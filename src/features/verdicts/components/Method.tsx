import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { Disclosure } from '#src/components/ui/Disclosure.tsx'
import { sentenceCase } from '#src/lib/counts.ts'
import { methodWords } from '../method-words.ts'

/** How the round was held: blinding, plan, levels, tracks, what was left out. */
export function Method({ verdict }: { verdict: PublicVerdict }) {
  const { method } = verdict
  const primary = method.scorecard.find((one) => one.key === method.primaryDescriptor)
  return (
    <FolioSection
      label="Method"
      note={
        method.origin === 'live' ? (
          <p>
            Question, scorecard, primary descriptor and rules froze when the round opened; their fingerprint
            was public from that moment.
          </p>
        ) : undefined
      }
    >
      <h2 className="heading mb-3">How it was done</h2>
      {verdict.question !== '' && <p className="lead mb-4">{verdict.question}</p>}
      <dl className="space-y-4">
        {methodWords(method).map((row) => (
          <div key={row.term} className="grid gap-x-6 page:grid-cols-[10rem_minmax(0,1fr)]">
            <dt className="text-muted">{row.term}</dt>
            <dd className="measure">{row.words}</dd>
          </div>
        ))}
        <div className="grid gap-x-6 page:grid-cols-[10rem_minmax(0,1fr)]">
          <dt className="text-muted">Left out</dt>
          <dd className="measure">
            {method.exclusions.length === 0
              ? 'Nobody.'
              : method.exclusions.map((one) => <p key={one}>{one}</p>)}
          </dd>
        </div>
      </dl>
      <Disclosure summary={`The scorecard: ${method.scorecard.length} lines`}>
        <ul className="space-y-2">
          {method.scorecard.map((one) => (
            <li key={one.key}>
              <strong className="font-semibold">{one.name}</strong>
              {one.key === method.primaryDescriptor && ' (primary)'}: {one.sentence}. From “{one.words.low}”
              {one.words.middle && ` over “${one.words.middle}”`} to “{one.words.high}”.
            </li>
          ))}
        </ul>
      </Disclosure>
      {primary && (
        <p className="note mt-2">
          {sentenceCase(primary.name)} was named the primary descriptor before any rating was seen; other
          descriptors count as a hint unless they hold over the whole scorecard.
        </p>
      )}
    </FolioSection>
  )
}

/** What this verdict does not say. */
export function Limits({ limits }: { limits: string[] }) {
  return (
    <FolioSection label="Limits">
      <h2 className="heading mb-3">What this does not say</h2>
      <div className="reading">
        {limits.map((line) => (
          <p key={line}>{line}</p>
        ))}
      </div>
    </FolioSection>
  )
}
