import { useState } from 'react'
import { Link, useParams } from 'react-router-dom'
import { resetPassword, useReset as resetByLink } from '#shared/contracts/account.ts'
import { limits } from '#shared/domain/limits.ts'
import { to } from '#src/app/paths.ts'
import { Threshold } from '#src/components/layout/Threshold.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { LinkButton } from '#src/components/ui/LinkButton.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { call } from '#src/lib/call.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { FormProblem } from '../components/FormProblem.tsx'

export default function ResetPage() {
  const { token = '' } = useParams()
  const [changed, setChanged] = useState(false)
  const { form, submit, faults, attempt, problem, busy, errorAt } = useContractForm({
    schema: resetPassword,
    defaultValues: { password: '' },
    has: (field) => field === 'password',
    send: async (body) => {
      await call(resetByLink, { params: { token }, body })
      setChanged(true)
    },
  })
  if (changed)
    return (
      <Threshold>
        <PageTitle size="plain">Your password is changed</PageTitle>
        <p className="mt-3">Every other place where you were signed in is signed out.</p>
        <p className="mt-6">
          <LinkButton kind="primary" to={to('signIn')}>
            Sign in
          </LinkButton>
        </p>
      </Threshold>
    )
  const spent = problem?.code === 'not_found' || problem?.code === 'conflict'
  return (
    <Threshold>
      <PageTitle size="plain">Choose a new password</PageTitle>
      <form onSubmit={submit} noValidate className="fields mt-6">
        <ErrorSummary errors={faults} attempt={attempt} />
        {spent ? (
          <Notice kind="signal" live title="This link no longer works">
            It was used already, or it is too old. <Link to={to('forgot')}>Send another link</Link>
          </Notice>
        ) : (
          <FormProblem problem={problem} />
        )}
        <TextField
          label="New password"
          hint={`At least ${limits.passwordLeast} characters; a few words in a row do well.`}
          type="password"
          autoComplete="new-password"
          error={errorAt('password')}
          {...form.register('password')}
        />
        <Button type="submit" busy={busy} busyLabel="Changing the password">
          Change the password
        </Button>
      </form>
    </Threshold>
  )
}
