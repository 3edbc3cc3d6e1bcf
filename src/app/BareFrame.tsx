import { Outlet, ScrollRestoration } from 'react-router-dom'
import { Arriving } from './Arriving.tsx'
import { DemoWords, useIsDemo } from './DemoBar.tsx'

/** The frame of pages that bring their own: the threshold, a seat, the stage. */
export function BareFrame() {
  const demo = useIsDemo()
  return (
    <>
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
