import { Outlet, ScrollRestoration } from 'react-router-dom'
import { SkipLink } from '#src/components/ui/SkipLink.tsx'
import { Arriving } from './Arriving.tsx'
import { DemoWords, useIsDemo } from './DemoBar.tsx'

/** The frame of pages that bring their own: the threshold, a seat, the stage. */
export function BareFrame() {
  const demo = useIsDemo()
  return (
    <>
      <SkipLink />
      {demo && (
        <div className="demo-bar" role="region" aria-label="Demo">
          <DemoWords />
        </div>
      )}
      <Arriving />
      <Outlet />
      <ScrollRestoration />
    </>
  )
}
