import { Link, useLocation } from 'react-router-dom'
import type { Me } from '#shared/contracts/account.ts'
import { useSignOut } from '#src/features/account/queries.ts'
import { to } from './paths.ts'

/** At the right of the top line: the panel and the person, and the way out; or the way in. */
export function Who({ me, panel }: { me: Me; panel?: string | undefined }) {
  const { pathname } = useLocation()
  const signOut = useSignOut()
  if (!me.user) return <Link to={`${to('signIn')}?next=${encodeURIComponent(pathname)}`}>Sign in</Link>
  return (
    <>
      {panel && <span className="hidden page:inline">{panel}</span>}
      <Link to={to('account')}>{me.user.name}</Link>
      <button type="button" className="underline" onClick={() => signOut.mutate()}>
        {signOut.isPending ? 'Signing out' : 'Sign out'}
      </button>
    </>
  )
}
