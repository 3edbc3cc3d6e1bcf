import type { ReactNode } from 'react'
import { Outlet } from 'react-router-dom'
import { TopLine } from '#src/components/layout/TopLine.tsx'
import type { TopLink } from '#src/components/layout/TopLine.tsx'
import { SchemeSwitch } from '#src/components/ui/SchemeSwitch.tsx'
import { SkipLink } from '#src/components/ui/SkipLink.tsx'

export interface PageLayoutProps {
  /** The bar of demo mode: "Everything here is invented." */
  demoBar?: ReactNode
  home?: string
  links: TopLink[]
  who?: ReactNode
  /** Words at the foot, before the switch of colours. */
  foot?: ReactNode
  /** The page; the router's outlet unless given. */
  children?: ReactNode
}

/** Top line, matter, foot: the frame of every page but a seat's, the stage's and the threshold's. */
export function PageLayout({ demoBar, home, links, who, foot, children }: PageLayoutProps) {
  return (
    <>
      <SkipLink />
      {demoBar && (
        <div className="demo-bar" role="region" aria-label="Demo">
          {demoBar}
        </div>
      )}
      <TopLine home={home} links={links} who={who} />
      <main id="matter" tabIndex={-1}>
        {children ?? <Outlet />}
      </main>
      <footer className="page-foot">
        <div>{foot}</div>
        <SchemeSwitch />
      </footer>
    </>
  )
}
