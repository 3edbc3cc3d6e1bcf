import { zodResolver } from '@hookform/resolvers/zod'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useId, useState, type ReactNode } from 'react'
import { useForm } from 'react-hook-form'
import type { BodyOf } from '#shared/contracts/endpoint.ts'
import { confirmCode, type PanelistSeat } from '#shared/contracts/seats.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { Field } from '#src/components/ui/Field.tsx'
import { call } from '#src/lib/call.ts'
import { seatQuery } from '../queries.ts'
import { unplaced } from '../unplaced.ts'
import { CallFailure } from './CallFailure.tsx'
import { HandOverLinks } from './HandOver.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

type Typed = BodyOf<typeof confirmCode>

/** The digits are read off the pouch, never shown here first; a wrong code stops and changes nothing. */
export function EnterCode({
  seat,
  serving,
  notices,
}: {
  seat: PanelistSeat
  serving: NonNullable<PanelistSeat['serving']>
  notices: ReactNode
}) {
  const client = useQueryClient()
  const formId = useId()
  const [problem, setProblem] = useState<unknown>(null)
  const form = useForm<Typed>({ resolver: zodResolver(confirmCode.body), defaultValues: { code: '' } })
  const confirm = useMutation({
    mutationFn: (body: Typed) => call(confirmCode, { params: { seat: seat.id, serving: serving.id }, body }),
    onSuccess: (now) => client.setQueryData(seatQuery(seat.id).queryKey, now),
    onError: (error) => {
      setProblem(unplaced(error, form.setError, (field) => field === 'code'))
      form.setFocus('code', { shouldSelect: true })
    },
  })
  return (
    <SeatFrame
      seat={seat}
      verb={
        <Button type="submit" form={formId} busy={confirm.isPending} busyLabel="Checking">
          This is my pouch
        </Button>
      }
    >
      {notices}
      <ScreenTitle>Type the three digits on your pouch</ScreenTitle>
      <form
        id={formId}
        noValidate
        className="mt-6"
        onSubmit={(event) =>
          void form.handleSubmit((body) => {
            setProblem(null)
            confirm.mutate(body)
          })(event)
        }
      >
        <Field
          id="code"
          label="Digits"
          hint="Read them off the tag; this phone does not know them before you do."
          error={form.formState.errors.code?.message}
        >
          {(wiring) => (
            <input
              {...form.register('code', { setValueAs: (typed: string) => typed.replace(/\D/g, '') })}
              {...wiring}
              type="text"
              inputMode="numeric"
              autoComplete="off"
              enterKeyHint="go"
              maxLength={7}
              className="entry max-w-48 text-40 font-bold tracking-[0.2em]"
            />
          )}
        </Field>
      </form>
      {problem !== null && (
        <CallFailure error={problem} what="The code was not taken." kept="Nothing has changed." />
      )}
      <p className="note mt-4">
        If the digits are refused, put the earphones back in the pouch and show it to the steward. New tips
        on, nozzles wiped: ask if you are not sure.
      </p>
      <HandOverLinks seat={seat} />
    </SeatFrame>
  )
}
