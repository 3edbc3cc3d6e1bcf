import { useQuery } from '@tanstack/react-query'
import { Outlet, ScrollRestoration } from 'react-router-dom'
import { meQuery } from '#src/lib/me.ts'
import { Arriving } from './Arriving.tsx'
import { DemoWords } from './DemoBar.tsx'
import { PublicLayout } from './layouts/PublicLayout.tsx'
import { to } from './paths.ts'
import { Who } from './Who.tsx'

/** The frame of what anyone may read; somebody who is signed in also finds the way to their panels. */
export function PublicFrame() {
  const { data: me } = useQuery(meQuery)
  const panels = me?.panels ?? []
  return (
    <PublicLayout
      demoBar={me?.mode === 'demo' ? <DemoWords /> : undefined}
      links={[
        { to: to('home'), word: 'Verdicts', end: true },
        ...panels.map(({ slug, name }) => ({ to: to('panel', { panel: slug }), word: name })),
        { to: to('how'), word: 'How a round works' },
      ]}
      who={me && <Who me={me} />}
    >
      <Arriving />
      <Outlet />
      <ScrollRestoration />
    </PublicLayout>
  )
}
