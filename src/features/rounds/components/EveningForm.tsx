import { useEffect, type ReactNode } from 'react'
import { useLocation } from 'react-router-dom'
import type { EveningDraft, EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import type { CallError } from '#src/lib/call.ts'
import type { Kept } from '#src/lib/kept.ts'
import { useEveningForm } from '../evening/evening-form.ts'
import { withDuties } from '../evening/share-out-duties.ts'
import { tidyDraft } from '../evening/tidy-draft.ts'
import { EveningSections } from './EveningSections.tsx'
import { PeopleFields } from './PeopleFields.tsx'
import { SizeWords } from './SizeWords.tsx'
import { UnitsFields } from './UnitsFields.tsx'

interface EveningFormProps {
  draft: EveningDraftInput
  kept: Kept<EveningDraftInput>
  known: { units: readonly { id: string; maker: string; name: string }[]; people: readonly string[] }
  send: (draft: EveningDraft) => Promise<unknown>
  verb: string
  busyVerb: string
  /** What to show for a refusal that names no input; the refusal itself unless given. */
  refusal?: (problem: CallError) => ReactNode
}

/** An evening on one page. Everything but the names has a default. */
export function EveningForm({ draft, kept, known, send, verb, busyVerb, refusal }: EveningFormProps) {
  const { form, submit, faults, attempt, problem, busy, errorAt } = useEveningForm({ draft, kept, send })
  const part = { form, errorAt }
  const { hash } = useLocation()
  useEffect(() => {
    const wanted = hash === '' ? null : document.getElementById(hash.slice(1))
    wanted?.focus()
    wanted?.scrollIntoView({ block: 'start' })
  }, [hash])
  const tidyAndSend = () => {
    const tidy = tidyDraft(form.getValues(), known.units)
    form.setValue('units', tidy.units)
    form.setValue('people', withDuties(tidy.people, tidy.tagging))
    form.setValue('tracks', tidy.tracks)
    return submit()
  }
  return (
    <form
      noValidate
      className="mt-12 border-t border-line pt-8 page:pt-12"
      onSubmit={(event) => {
        event.preventDefault()
        if (!busy) void tidyAndSend()
      }}
    >
      {faults.length > 0 && (
        <FolioSection label="To mend">
          <ErrorSummary errors={faults} attempt={attempt} />
        </FolioSection>
      )}
      <FolioSection
        label="Units"
        note={<p>Photographs, prices and how you came by each unit are asked before publishing.</p>}
      >
        <UnitsFields {...part} known={known.units} />
      </FolioSection>
      <FolioSection
        label="People"
        note={<p>Listeners need no account: each opens a link or a QR code. Names never leave the panel.</p>}
      >
        <PeopleFields {...part} known={known.people} />
      </FolioSection>
      <EveningSections {...part} />
      <FolioSection label="Then" name="Look over the plan">
        <SizeWords form={form} />
        {problem && (
          <div className="mt-4">
            {refusal?.(problem) ?? <Problem error={problem} kept="What you typed is still here." />}
          </div>
        )}
        <div className="actions mt-4">
          <Button type="submit" busy={busy} busyLabel={busyVerb}>
            {verb}
          </Button>
          <span className="note">Kept in this tab at each touch. Nothing is drawn yet.</span>
        </div>
      </FolioSection>
    </form>
  )
}
