import { useState } from 'react'
import { changePassword, replacePassword } from '#shared/contracts/account.ts'
import { limits } from '#shared/domain/limits.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { call } from '#src/lib/call.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { FormProblem } from './FormProblem.tsx'

export function PasswordForm({ email }: { email: string }) {
  const [saved, setSaved] = useState(false)
  const { form, submit, faults, attempt, problem, busy, errorAt } = useContractForm({
    schema: changePassword,
    defaultValues: { current: '', next: '' },
    send: async (body) => {
      setSaved(false)
      await call(replacePassword, { body })
      form.reset()
      setSaved(true)
    },
  })
  return (
    <form onSubmit={submit} noValidate className="fields">
      <ErrorSummary errors={faults} attempt={attempt} />
      <FormProblem problem={problem} />
      <TextField
        label="Present password"
        type="password"
        autoComplete="current-password"
        error={errorAt('current')}
        {...form.register('current')}
      />
      <TextField
        label="New password"
        hint={`At least ${limits.passwordLeast} characters.`}
        type="password"
        autoComplete="new-password"
        error={errorAt('next')}
        {...form.register('next')}
      />
      <Button type="submit" kind="secondary" busy={busy} busyLabel="Changing the password">
        Change the password
      </Button>
      {saved && <Notice kind="done" live title="Password changed. Other places are signed out." />}
      <input type="email" autoComplete="username" value={email} readOnly hidden />
    </form>
  )
}
