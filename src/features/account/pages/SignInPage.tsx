import { useQuery } from '@tanstack/react-query'
import { Link, useNavigate, useSearchParams } from 'react-router-dom'
import { signIn, type Me } from '#shared/contracts/account.ts'
import { to } from '#src/app/paths.ts'
import { Threshold } from '#src/components/layout/Threshold.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { meQuery } from '#src/lib/me.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { afterSignIn } from '../after-sign-in.ts'
import { DemoSignIns } from '../components/DemoSignIns.tsx'
import { FormProblem } from '../components/FormProblem.tsx'
import { useSignIn } from '../queries.ts'

export default function SignInPage() {
  const { data: known } = useQuery(meQuery)
  const [search] = useSearchParams()
  const navigate = useNavigate()
  const enter = useSignIn()
  const enterAs = (me: Me) => navigate(afterSignIn(me, search.get('next')), { replace: true })
  const { form, submit, faults, attempt, problem, busy, errorAt } = useContractForm({
    schema: signIn,
    defaultValues: { email: '', password: '' },
    send: async (body) => enterAs(await enter.mutateAsync(body)),
  })
  return (
    <Threshold>
      <PageTitle size="plain">Sign in</PageTitle>
      <p className="note mt-3">Listeners need no account: they open the link or the QR code of their seat.</p>
      <form onSubmit={submit} noValidate className="fields mt-6">
        <ErrorSummary errors={faults} attempt={attempt} />
        <FormProblem problem={problem} />
        <TextField
          label="Email address"
          type="email"
          autoComplete="username"
          error={errorAt('email')}
          {...form.register('email')}
        />
        <TextField
          label="Password"
          type="password"
          autoComplete="current-password"
          error={errorAt('password')}
          {...form.register('password')}
        />
        <div className="actions">
          <Button type="submit" busy={busy} busyLabel="Signing in">
            Sign in
          </Button>
          <Link to={to('forgot')}>Forgot your password</Link>
        </div>
      </form>
      <p className="mt-6">
        New here? <Link to={to('signUp')}>Create an account and a panel</Link>
      </p>
      {known?.mode === 'demo' && <DemoSignIns onSignedIn={(me) => void enterAs(me)} />}
    </Threshold>
  )
}
