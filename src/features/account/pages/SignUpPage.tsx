import { Link, useNavigate, useSearchParams } from 'react-router-dom'
import { signUp } from '#shared/contracts/account.ts'
import { limits } from '#shared/domain/limits.ts'
import { to } from '#src/app/paths.ts'
import { Threshold } from '#src/components/layout/Threshold.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { ownZone } from '#src/lib/dates.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { afterSignIn } from '../after-sign-in.ts'
import { FormProblem } from '../components/FormProblem.tsx'
import { useSignUp } from '../queries.ts'

const inputs = new Set(['name', 'email', 'password', 'panelName'])

export default function SignUpPage() {
  const navigate = useNavigate()
  const [search] = useSearchParams()
  const create = useSignUp()
  const { form, submit, faults, attempt, problem, busy, errorAt } = useContractForm({
    schema: signUp,
    defaultValues: {
      name: '',
      email: '',
      password: '',
      panelName: '',
      timeZone: ownZone(),
      first: search.get('first') ?? '',
    },
    has: (field) => inputs.has(field),
    send: async (body) => {
      const me = await create.mutateAsync(body)
      await navigate(afterSignIn(me, null), { replace: true })
    },
  })
  return (
    <Threshold>
      <PageTitle size="plain">Create an account and a panel</PageTitle>
      <p className="note mt-3">
        For whoever organises. Those who only listen need no account.{' '}
        <Link to={to('signIn')}>Sign in instead</Link>
      </p>
      <form onSubmit={submit} noValidate className="fields mt-6">
        <ErrorSummary errors={faults} attempt={attempt} />
        <FormProblem problem={problem} />
        <TextField label="Your name" autoComplete="name" error={errorAt('name')} {...form.register('name')} />
        <TextField
          label="Email address"
          type="email"
          autoComplete="username"
          error={errorAt('email')}
          {...form.register('email')}
        />
        <TextField
          label="Password"
          hint={`At least ${limits.passwordLeast} characters; a few words in a row do well.`}
          type="password"
          autoComplete="new-password"
          error={errorAt('password')}
          {...form.register('password')}
        />
        <TextField
          label="Panel"
          hint="The group that listens together: a club, a shop, some friends. Its name stands over every verdict."
          autoComplete="organization"
          error={errorAt('panelName')}
          {...form.register('panelName')}
        />
        <Button type="submit" busy={busy} busyLabel="Creating the account">
          Create the account
        </Button>
      </form>
    </Threshold>
  )
}
