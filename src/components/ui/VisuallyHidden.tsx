import type { ReactNode } from 'react'

/** Words for a screen reader that the eye takes from the page. `live` announces changes politely. */
export function VisuallyHidden({ children, live }: { children: ReactNode; live?: boolean }) {
  return (
    <span className="visually-hidden" role={live ? 'status' : undefined}>
      {children}
    </span>
  )
}
