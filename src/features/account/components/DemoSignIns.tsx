import type { Me } from '#shared/contracts/account.ts'
import { demoSignIns } from '#shared/domain/demo-sign-ins.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { useSignIn } from '../queries.ts'

/** The invented people of the demo, one press each. */
export function DemoSignIns({ onSignedIn }: { onSignedIn: (me: Me) => void }) {
  const enter = useSignIn()
  return (
    <section className="mt-8 border-t border-line pt-4" aria-labelledby="demo-sign-ins">
      <h2 id="demo-sign-ins" className="subheading">
        In this demo
      </h2>
      <p className="note">Invented people whose rounds are in every state. No password to type.</p>
      <ul className="rows mt-2">
        {demoSignIns.map(({ name, email, password, does }) => (
          <li key={email} className="py-1">
            <Button
              kind="secondary"
              busy={enter.isPending && enter.variables.email === email}
              busyLabel="Signing in"
              onClick={() => enter.mutate({ email, password }, { onSuccess: onSignedIn })}
            >
              Sign in as {name}
            </Button>
            <span className="note"> {does}</span>
          </li>
        ))}
      </ul>
      {enter.error && <Problem error={enter.error} />}
    </section>
  )
}
