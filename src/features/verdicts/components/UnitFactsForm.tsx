import { useEffect } from 'react'
import { useQueryClient } from '@tanstack/react-query'
import { provenances, saveUnitFacts, unitFacts, type VerdictDraft } from '#shared/contracts/verdicts.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ChoiceRows } from '#src/components/ui/ChoiceRows.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { TextArea } from '#src/components/ui/TextArea.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { call } from '#src/lib/call.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { atUnit, factsOf, unitField } from '../desk-fields.ts'
import { provenanceWords, suggestedDisclosure, type Provenance } from '../disclosure-wording.ts'
import { keepDraft, type AtRound } from '../queries.ts'
import { PhotoField } from './PhotoField.tsx'
import { PriceFields } from './PriceFields.tsx'

interface UnitFactsFormProps {
  at: AtRound
  unit: VerdictDraft['units'][number]
  nth: number
  /** The currency of a unit that was answered before. */
  currency: string
  today: string
  onUnsaved: (unsaved: boolean) => void
}

/** What readers must know of one unit: where it came from, who gave it, what it cost and when. */
export function UnitFactsForm({ at, unit, nth, currency, today, onUnsaved }: UnitFactsFormProps) {
  const client = useQueryClient()
  const { form, submit, attempt, faults, problem, busy, errorAt } = useContractForm({
    schema: unitFacts,
    defaultValues: factsOf(unit),
    send: async (body) => {
      const params = { ...at, unit: unit.id }
      keepDraft(client, at, await call(saveUnitFacts, { params, body, version: unit.version }))
      form.reset(body)
    },
  })
  const { isDirty, isSubmitSuccessful } = form.formState
  useEffect(() => onUnsaved(isDirty), [isDirty, onUnsaved])
  const [provenance, lender, returnOn, disclosure, price, priceUnknown] = form.watch([
    'provenance',
    'lender',
    'returnOn',
    'disclosure',
    'price',
    'priceUnknown',
  ])
  const suggestion = suggestedDisclosure({
    provenance: (provenance as Provenance | undefined) ?? null,
    lender: lender ?? '',
    returnOn: returnOn || null,
  })
  const field = (name: string) => unitField(nth, name)
  return (
    <FolioSection label={`Unit ${nth + 1}`} name={unit.name}>
      <form onSubmit={(event) => void submit(event)} noValidate>
        <h2 className="heading">
          {unit.name}
          {unit.maker !== '' && <span className="font-normal text-muted"> by {unit.maker}</span>}
        </h2>
        <ErrorSummary errors={atUnit(faults, nth)} attempt={attempt} />
        {problem && <Problem error={problem} kept="What you typed is still here." />}
        <div className="fields mt-4">
          <ChoiceRows
            id={field('provenance')}
            name={field('provenance')}
            legend="How did you get it?"
            value={provenance ?? null}
            onChange={(value) =>
              form.setValue('provenance', value as Provenance, {
                shouldDirty: true,
                shouldValidate: attempt > 0,
              })
            }
            choices={provenances.map((value) => ({
              value,
              label: provenanceWords[value].choice,
              hint: provenanceWords[value].hint,
            }))}
            error={errorAt('provenance')}
          />
          {provenance !== undefined && (
            <TextField
              {...form.register('lender')}
              id={field('lender')}
              label={provenance === 'bought' ? 'Who bought it' : 'From whom'}
              optional={provenance !== 'loan'}
              hint="A shop or maker by name; a private person may be “a reader”."
              error={errorAt('lender')}
            />
          )}
          {(provenance === 'loan' || provenance === 'prototype') && (
            <TextField
              {...form.register('returnOn', { setValueAs: (value: string | null) => value || null })}
              id={field('returnOn')}
              type="date"
              label="Goes back on"
              optional
              error={errorAt('returnOn')}
            />
          )}
          <TextArea
            {...form.register('disclosure')}
            id={field('disclosure')}
            label="The sentence readers will see"
            rows={2}
            hint={
              suggestion ? `Suggested: ${suggestion}` : 'It stands beside the verdict, before any picture.'
            }
            error={errorAt('disclosure')}
          />
          {suggestion && suggestion !== disclosure && (
            <Button
              kind="secondary"
              onClick={() =>
                form.setValue('disclosure', suggestion, { shouldDirty: true, shouldValidate: attempt > 0 })
              }
            >
              Use the suggested wording
            </Button>
          )}
          <PriceFields
            id={`units.${nth}`}
            price={price ?? null}
            none={priceUnknown ?? false}
            currency={currency}
            today={today}
            errorAt={errorAt}
            onChange={(next, none) => {
              form.setValue('priceUnknown', none, { shouldDirty: true })
              form.setValue('price', next, { shouldDirty: true, shouldValidate: attempt > 0 })
            }}
          />
        </div>
        <div className="actions mt-6">
          <Button
            type="submit"
            kind="secondary"
            icon="save"
            busy={busy}
            busyLabel={`Keeping what is known of ${unit.name}`}
          >
            Keep what is known of {unit.name}
          </Button>
          <span role="status" className="note">
            {isSubmitSuccessful && !isDirty ? 'Kept.' : isDirty ? 'Not kept yet.' : ''}
          </span>
        </div>
      </form>
      <div className="mt-8">
        <PhotoField at={at} unit={unit} id={field('photo')} />
      </div>
    </FolioSection>
  )
}
