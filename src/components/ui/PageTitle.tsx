import { useEffect, useRef } from 'react'
import type { ReactNode } from 'react'
import { useLocation } from 'react-router-dom'
import { useTitle } from '#src/hooks/useTitle.ts'

interface PageTitleProps {
  children: ReactNode
  /** Name of the document; needed when the heading is not plain text. */
  title?: string
  /** display: 40 px serif on a wide screen; plain: 28 px; hidden: for screens whose head says it already. */
  size?: 'display' | 'plain' | 'hidden'
}

/**
 * The page's one h1. It names the document and takes focus when the page was reached by navigation inside Scrim (not on
 * the first load, where the browser's own order holds).
 */
export function PageTitle({ children, title, size = 'display' }: PageTitleProps) {
  const heading = useRef<HTMLHeadingElement>(null)
  const { key, pathname } = useLocation()
  useTitle(title ?? (typeof children === 'string' ? children : 'Scrim'))
  useEffect(() => {
    if (key !== 'default') heading.current?.focus()
    // The heading is focused once per address; a change of the query alone does not move focus.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [pathname])
  const look = { display: 'display', plain: 'display display-plain', hidden: 'visually-hidden' }[size]
  return (
    <h1 ref={heading} tabIndex={-1} className={look}>
      {children}
    </h1>
  )
}
