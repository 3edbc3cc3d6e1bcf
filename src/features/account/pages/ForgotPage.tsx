import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { Link } from 'react-router-dom'
import { askReset, forgotPassword } from '#shared/contracts/account.ts'
import { to } from '#src/app/paths.ts'
import { Threshold } from '#src/components/layout/Threshold.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { call } from '#src/lib/call.ts'
import { meQuery } from '#src/lib/me.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { FormProblem } from '../components/FormProblem.tsx'

export default function ForgotPage() {
  const { data: known } = useQuery(meQuery)
  const [sentTo, setSentTo] = useState<string | null>(null)
  const { form, submit, faults, attempt, problem, busy, errorAt } = useContractForm({
    schema: forgotPassword,
    defaultValues: { email: '' },
    send: async (body) => {
      await call(askReset, { body })
      setSentTo(body.email)
    },
  })
  return (
    <Threshold>
      <PageTitle size="plain">Choose a new password</PageTitle>
      {known?.mailSends === false && (
        <div className="mt-3">
          <Notice kind="signal" title="This Scrim sends no mail">
            Whoever runs it can give you a link to choose a new password.
          </Notice>
        </div>
      )}
      <form onSubmit={submit} noValidate className="fields mt-6">
        <ErrorSummary errors={faults} attempt={attempt} />
        <FormProblem problem={problem} />
        <TextField
          label="Email address"
          hint="The one you sign in with. A link goes there; it works once."
          type="email"
          autoComplete="username"
          error={errorAt('email')}
          {...form.register('email')}
        />
        <Button type="submit" busy={busy} busyLabel="Sending the link">
          Send the link
        </Button>
      </form>
      {sentTo && (
        <div className="mt-6">
          <Notice kind="done" live title="Look at your mail">
            If {sentTo} has an account here, a link is on its way.
            {known?.mode === 'demo' && (
              <>
                {' '}
                In this demo it lies in the <Link to={to('mailbox')}>mailbox</Link>.
              </>
            )}
          </Notice>
        </div>
      )}
      <p className="mt-6">
        <Link to={to('signIn')}>Back to signing in</Link>
      </p>
    </Threshold>
  )
}
