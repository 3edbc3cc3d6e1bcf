import { useCallback, useState } from 'react'
import type { Round } from '#shared/contracts/rounds.ts'
import type { VerdictDraft } from '#shared/contracts/verdicts.ts'
import { to } from '#src/app/paths.ts'
import { RoundSelvedge } from '#src/app/RoundSelvedge.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { labelWords } from '#src/components/results/agreement-words.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { day } from '#src/lib/dates.ts'
import type { AtRound } from '../queries.ts'
import { CorrectionVerb, PublishVerb } from './PublishVerb.tsx'
import { Preview } from './Preview.tsx'
import { StillMissing } from './StillMissing.tsx'
import { UnitFactsForm } from './UnitFactsForm.tsx'
import { WordsForm } from './WordsForm.tsx'

interface DeskProps {
  at: AtRound
  draft: VerdictDraft
  round: Round
  panelName: string
  /** The reader's own day, `2026-11-12`. */
  today: string
}

/** Which parts of the desk hold words that were not kept yet. */
function useUnsaved() {
  const [parts, setParts] = useState<readonly string[]>([])
  const mark = useCallback(
    (part: string, unsaved: boolean) =>
      setParts((before) => {
        const others = before.filter((one) => one !== part)
        return unsaved ? [...others, part] : others.length === before.length ? before : others
      }),
    [],
  )
  return { parts, mark }
}

function Head({ at, draft, round }: Pick<DeskProps, 'at' | 'draft' | 'round'>) {
  const { published } = draft
  return (
    <FolioSection
      label={<RoundSelvedge panel={at.panel} round={round} shown="published" />}
      note={
        <>
          <p>
            <strong>{labelWords(draft.label)}</strong>
          </p>
          {draft.labels.map((label) => (
            <p key={label}>{label}</p>
          ))}
        </>
      }
    >
      <PageTitle size="plain" title={`Verdict: ${draft.round.title}`}>
        {published ? 'The published verdict' : 'Write the verdict'}
      </PageTitle>
      {published ? (
        <>
          <p className="lead mt-3">
            Version {published.version} was published on {day(published.at)}. What you change here is read
            only after you publish a correction.
          </p>
          <div className="actions mt-4">
            <LinkButton to={to('verdict', { slug: published.slug })}>Read the public page</LinkButton>
          </div>
        </>
      ) : (
        <p className="lead mt-3">
          {draft.round.title}. Readers get your words, Scrim’s sentences, the figures, and who paid for what.
        </p>
      )}
      <div className="mt-6">
        <StillMissing missing={draft.missing} />
      </div>
    </FolioSection>
  )
}

/** The organiser's desk: the words, what must be known of each unit, a preview, and the verb. */
export function Desk({ at, draft, round, panelName, today }: DeskProps) {
  const { parts, mark } = useUnsaved()
  const [previewed, setPreviewed] = useState(false)
  const markWords = useCallback((unsaved: boolean) => mark('the words', unsaved), [mark])
  const currency = draft.units.find((unit) => unit.price !== null)?.price?.currency ?? ''
  return (
    <>
      <Folio>
        <Head at={at} draft={draft} round={round} />
        <WordsForm at={at} draft={draft} onUnsaved={markWords} />
        {draft.units.map((unit, nth) => (
          <UnitPart
            key={unit.id}
            at={at}
            unit={unit}
            nth={nth}
            currency={currency}
            today={today}
            mark={mark}
          />
        ))}
        <FolioSection
          label="Preview"
          note="Made from what you kept, not from what stands unsaved in a field."
        >
          <h2 className="heading">As readers will see it</h2>
          <Button kind="secondary" aria-expanded={previewed} onClick={() => setPreviewed(!previewed)}>
            {previewed ? 'Hide the preview' : 'Show the preview'}
          </Button>
        </FolioSection>
      </Folio>
      {previewed && <Preview at={at} draft={draft} panelName={panelName} />}
      <Folio>
        <FolioSection label={draft.published ? 'Correct' : 'Publish'}>
          <h2 className="heading mb-4">{draft.published ? 'Publish a correction' : 'Publish'}</h2>
          {draft.published ? (
            <CorrectionVerb at={at} draft={draft} unsaved={parts} />
          ) : (
            <PublishVerb at={at} draft={draft} unsaved={parts} />
          )}
        </FolioSection>
      </Folio>
    </>
  )
}

function UnitPart({
  mark,
  ...rest
}: {
  at: AtRound
  unit: VerdictDraft['units'][number]
  nth: number
  currency: string
  today: string
  mark: (part: string, unsaved: boolean) => void
}) {
  const { name } = rest.unit
  const onUnsaved = useCallback((unsaved: boolean) => mark(name, unsaved), [mark, name])
  return <UnitFactsForm {...rest} onUnsaved={onUnsaved} />
}
