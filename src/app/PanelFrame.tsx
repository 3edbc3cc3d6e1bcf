import { useQuery } from '@tanstack/react-query'
import { Outlet, ScrollRestoration, useParams } from 'react-router-dom'
import { meQuery } from '#src/lib/me.ts'
import { Arriving } from './Arriving.tsx'
import { DemoWords } from './DemoBar.tsx'
import { PanelLayout } from './layouts/PanelLayout.tsx'
import { to } from './paths.ts'
import { Who } from './Who.tsx'

/** The frame of a panel's pages. Whoever came by a link for one duty sees no places that they could not open. */
export function PanelFrame() {
  const { panel = '' } = useParams()
  const { data: me } = useQuery(meQuery)
  const own = me?.panels.find(({ slug }) => slug === panel)
  const places = [
    { to: to('panel', { panel }), word: 'Desk', end: true },
    { to: to('rounds', { panel }), word: 'Rounds' },
    { to: to('units', { panel }), word: 'Units' },
    { to: to('people', { panel }), word: 'People' },
  ]
  return (
    <PanelLayout
      demoBar={me?.mode === 'demo' ? <DemoWords /> : undefined}
      home={own ? to('panel', { panel }) : to('home')}
      links={own ? places : []}
      who={me && <Who me={me} panel={own?.name} />}
    >
      <Arriving />
      <Outlet />
      <ScrollRestoration />
    </PanelLayout>
  )
}
