import { useEffect, useRef, type ReactNode } from 'react'
import { useTitle } from '#src/hooks/useTitle.ts'

/**
 * The heading of one of a seat's screens. The screens change under one address, so each heading takes focus when its
 * screen comes: a screen reader says where one is, and the page begins at the top.
 */
export function ScreenTitle({
  children,
  title,
  size = 'plain',
}: {
  children: ReactNode
  title?: string
  size?: 'plain' | 'small'
}) {
  const heading = useRef<HTMLHeadingElement>(null)
  useTitle(title ?? (typeof children === 'string' ? children : 'Your seat'))
  useEffect(() => {
    window.scrollTo?.({ top: 0 })
    heading.current?.focus({ preventScroll: true })
  }, [])
  return (
    <h1 ref={heading} tabIndex={-1} className={size === 'plain' ? 'display display-plain' : 'subheading'}>
      {children}
    </h1>
  )
}
