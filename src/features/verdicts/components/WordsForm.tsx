import { useEffect } from 'react'
import { useQueryClient } from '@tanstack/react-query'
import { saveVerdict, type VerdictDraft } from '#shared/contracts/verdicts.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { TextArea } from '#src/components/ui/TextArea.tsx'
import { call } from '#src/lib/call.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { keepDraft, type AtRound } from '../queries.ts'

interface WordsFormProps {
  at: AtRound
  draft: VerdictDraft
  onUnsaved: (unsaved: boolean) => void
}

/** Headline and summary by the organiser, beside the sentences that Scrim wrote from the numbers. */
export function WordsForm({ at, draft, onUnsaved }: WordsFormProps) {
  const client = useQueryClient()
  const { form, submit, attempt, faults, problem, busy, errorAt } = useContractForm({
    schema: saveVerdict.body,
    defaultValues: { headline: draft.headline, summary: draft.summary },
    send: async (body) => {
      keepDraft(client, at, await call(saveVerdict, { params: at, body, version: draft.version }))
      form.reset(body)
    },
  })
  const { isDirty, isSubmitSuccessful } = form.formState
  useEffect(() => onUnsaved(isDirty), [isDirty, onUnsaved])
  const informal = draft.label.key === 'none' || draft.label.key === 'informal'
  return (
    <FolioSection
      label="The words"
      note={
        <>
          <p>
            <strong>Scrim’s sentences</strong>
          </p>
          {draft.sentences.length === 0 && <p>Scrim has nothing to state from these numbers.</p>}
          {draft.sentences.map((sentence, nth) => (
            <div key={nth}>
              <p>{sentence}</p>
              <Button
                kind="secondary"
                className="text-14"
                aria-label={`Take as headline: ${sentence}`}
                onClick={() => form.setValue('headline', sentence, { shouldDirty: true, shouldTouch: true })}
              >
                Take as headline
              </Button>
            </div>
          ))}
          <p>
            These stand on the page beside yours. A sentence that says more than they do is not supported.
          </p>
        </>
      }
    >
      <form onSubmit={(event) => void submit(event)} noValidate>
        <h2 className="heading mb-3">The sentence and what it rests on</h2>
        <ErrorSummary errors={faults} attempt={attempt} />
        {problem && <Problem error={problem} kept="What you typed is still here." />}
        <div className="fields">
          <TextArea
            {...form.register('headline')}
            id="headline"
            label="Headline"
            rows={2}
            className="font-serif text-22"
            hint={
              informal
                ? 'Under six listeners there is no verdict sentence; say what was done.'
                : 'The verdict in one sentence. It stands at the top, large.'
            }
            error={errorAt('headline')}
          />
          <TextArea
            {...form.register('summary')}
            id="summary"
            label="Summary"
            rows={5}
            hint="What the sentence rests on and what it does not cover. An empty line begins a new paragraph."
            error={errorAt('summary')}
          />
        </div>
        <div className="actions mt-6">
          <Button type="submit" kind="secondary" icon="save" busy={busy} busyLabel="Keeping the words">
            Keep the words
          </Button>
          <span role="status" className="note">
            {isSubmitSuccessful && !isDirty ? 'Kept.' : isDirty ? 'Not kept yet.' : ''}
          </span>
        </div>
      </form>
    </FolioSection>
  )
}
