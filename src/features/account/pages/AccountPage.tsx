import { useQuery } from '@tanstack/react-query'
import { Link, Navigate } from 'react-router-dom'
import { to } from '#src/app/paths.ts'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { meQuery } from '#src/lib/me.ts'
import { NameForm } from '../components/NameForm.tsx'
import { PasswordForm } from '../components/PasswordForm.tsx'
import { useSignOut } from '../queries.ts'

export default function AccountPage() {
  const query = useQuery(meQuery)
  const leave = useSignOut()
  return (
    <Asked query={query} waiting="Reading your account">
      {({ user, panels }) =>
        !user ? (
          <Navigate to={`${to('signIn')}?next=${encodeURIComponent(to('account'))}`} replace />
        ) : (
          <Folio>
            <FolioSection label="Account">
              <PageTitle>{user.name}</PageTitle>
              <p className="mt-2 text-muted">Signs in as {user.email}</p>
              {panels.length > 0 && (
                <ul className="rows mt-4">
                  {panels.map(({ slug, name, roles }) => (
                    <li key={slug} className="flex flex-wrap items-baseline justify-between gap-x-4 py-2">
                      <Link to={to('panel', { panel: slug })}>{name}</Link>
                      <span className="note">{roles.join(', ')}</span>
                    </li>
                  ))}
                </ul>
              )}
            </FolioSection>
            <FolioSection
              label="Name"
              note={<p>Your name stays inside the panel. Published files know listeners by number only.</p>}
            >
              <NameForm name={user.name} version={user.version} />
            </FolioSection>
            <FolioSection label="Password">
              <PasswordForm email={user.email} />
            </FolioSection>
            <FolioSection label="This device">
              <Button
                kind="secondary"
                busy={leave.isPending}
                busyLabel="Signing out"
                onClick={() => leave.mutate()}
              >
                Sign out
              </Button>
            </FolioSection>
          </Folio>
        )
      }
    </Asked>
  )
}
