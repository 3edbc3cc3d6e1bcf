import { zodResolver } from '@hookform/resolvers/zod'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useId, useState, type ReactNode } from 'react'
import { Controller, useForm } from 'react-hook-form'
import type { BodyOf } from '#shared/contracts/endpoint.ts'
import { answerEnd, type PanelistSeat } from '#shared/contracts/seats.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { ChoiceRows } from '#src/components/ui/ChoiceRows.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { call } from '#src/lib/call.ts'
import { faultsOf } from '#src/lib/form-faults.ts'
import { endFault } from '../end-faults.ts'
import { unplaced } from '../unplaced.ts'
import { seatQuery } from '../queries.ts'
import { CallFailure } from './CallFailure.tsx'
import { Recognitions } from './Recognitions.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

export type EndTyped = BodyOf<typeof answerEnd>

const choices = [
  { value: 'none', label: 'No, none' },
  { value: 'perhaps', label: 'Perhaps' },
  { value: 'yes', label: 'Yes' },
]

/** After the last serving: whether something was recognised, by one's own codes and free text, and how surely. */
export function EndQuestions({
  seat,
  notices,
  kept,
}: {
  seat: PanelistSeat
  notices: ReactNode
  kept: ReactNode
}) {
  const client = useQueryClient()
  const formId = useId()
  const [problem, setProblem] = useState<unknown>(null)
  const form = useForm<EndTyped>({
    resolver: zodResolver(answerEnd.body),
    defaultValues: { recognitions: [] },
  })
  const answer = useMutation({
    mutationFn: (body: EndTyped) => call(answerEnd, { params: { seat: seat.id }, body }),
    onSuccess: (now) => client.setQueryData(seatQuery(seat.id).queryKey, now),
    onError: (error) => {
      const known = new Set(['recognised', 'recognitions'])
      setProblem(unplaced(error, form.setError, (field) => known.has(field.split('.')[0] ?? '')))
    },
  })
  const recognised = form.watch('recognised')
  const asksWhich = (recognised === 'perhaps' || recognised === 'yes') && seat.heard.length > 0
  const { errors, submitCount } = form.formState
  const send = (body: EndTyped) => {
    setProblem(null)
    answer.mutate(body.recognised === 'none' ? { ...body, recognitions: [] } : body)
  }
  return (
    <SeatFrame
      seat={seat}
      kept={kept}
      verb={
        <Button type="submit" form={formId} busy={answer.isPending} busyLabel="Sending">
          Send the answers
        </Button>
      }
    >
      {notices}
      <ScreenTitle>Two last questions</ScreenTitle>
      <form
        id={formId}
        noValidate
        className="fields mt-6"
        onSubmit={(event) => void form.handleSubmit(send)(event)}
      >
        <ErrorSummary
          attempt={submitCount}
          errors={faultsOf(errors).map(({ field, message }) => ({
            field,
            message: endFault(field, message),
          }))}
        />
        <Controller
          control={form.control}
          name="recognised"
          render={({ field }) => (
            <ChoiceRows
              id="recognised"
              name="recognised"
              legend="Did you recognise any of the earphones?"
              hint="By their shape, their sound or anything else. It is no fault; it only has to be known."
              value={field.value ?? null}
              onChange={field.onChange}
              choices={choices}
              error={errors.recognised && endFault('recognised', '')}
            />
          )}
        />
        {asksWhich && <Recognitions form={form} heard={seat.heard} />}
      </form>
      {problem !== null && (
        <CallFailure
          error={problem}
          what="The answers were not taken."
          kept="What you typed is still here."
        />
      )}
    </SeatFrame>
  )
}
