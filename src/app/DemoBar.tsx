import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import { meQuery } from '#src/lib/me.ts'
import { to } from './paths.ts'

/** What the demo's bar says on each page. */
export const DemoWords = () => (
  <>
    Demo: every panel, person, earphone and rating here is invented. <Link to={to('mailbox')}>Mailbox</Link>
  </>
)

/** Whether this Scrim runs as the demo; the server says so. */
export const useIsDemo = (): boolean => useQuery(meQuery).data?.mode === 'demo'
