import { zodResolver } from '@hookform/resolvers/zod'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useId, useState } from 'react'
import { useForm } from 'react-hook-form'
import { consentVersion, giveConsent, type PanelistSeat } from '#shared/contracts/seats.ts'
import type { BodyOf } from '#shared/contracts/endpoint.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { CheckRow } from '#src/components/ui/CheckRow.tsx'
import { call } from '#src/lib/call.ts'
import { seatQuery } from '../queries.ts'
import { unplaced } from '../unplaced.ts'
import { CallFailure } from './CallFailure.tsx'
import { Cautions } from './Cautions.tsx'
import { LeaveButton } from './LeaveButton.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

type Consent = BodyOf<typeof giveConsent>

/** Asked once. What is agreed to stands above the verb; only adults take part. */
export function ConsentForm({ seat }: { seat: PanelistSeat }) {
  const client = useQueryClient()
  const formId = useId()
  const [problem, setProblem] = useState<unknown>(null)
  const form = useForm<Consent>({
    resolver: zodResolver(giveConsent.body),
    defaultValues: { version: consentVersion },
  })
  const agree = useMutation({
    mutationFn: (body: Consent) => call(giveConsent, { params: { seat: seat.id }, body }),
    onSuccess: (now) => client.setQueryData(seatQuery(seat.id).queryKey, now),
    onError: (error) => setProblem(unplaced(error, form.setError, (field) => field === 'adult')),
  })
  const published = seat.publishesRows
    ? 'Your ratings are published by listener number, never by name. People who were in the room tonight could still recognise a row.'
    : 'Ratings are published in sum only: this round publishes no rows, by number or otherwise.'
  return (
    <SeatFrame
      seat={seat}
      verb={
        <Button type="submit" form={formId} busy={agree.isPending} busyLabel="Taking your seat">
          Take part
        </Button>
      }
    >
      <ScreenTitle>Before you take part</ScreenTitle>
      <ul className="mt-4 rows">
        <li className="py-2">
          Taking part is voluntary. You may stop at any time, and you need not say why.
        </li>
        <li className="py-2">{published}</li>
        <li className="py-2">Until the round closes nobody sees your ratings but you.</li>
      </ul>
      <h2 className="subheading mt-6 mb-1">For your ears</h2>
      <Cautions />
      <form
        id={formId}
        noValidate
        className="mt-6"
        onSubmit={(event) => void form.handleSubmit((body) => agree.mutate(body))(event)}
      >
        <CheckRow
          {...form.register('adult')}
          label="I am an adult, I have read this, and I want to take part"
          error={form.formState.errors.adult?.message}
        />
      </form>
      {problem !== null && <CallFailure error={problem} what="Your seat was not taken." />}
      <div className="mt-4">
        <LeaveButton seat={seat} label="I would rather not" />
      </div>
    </SeatFrame>
  )
}
