import type { ReactNode } from 'react'
import { Icon } from '../Icon.tsx'

interface DisclosureProps {
  /** What unfolds: "The numbers", "How this was measured". */
  summary: ReactNode
  children: ReactNode
  open?: boolean
}

/** A line that unfolds what not everybody needs. The browser's own details; findable by the page's search. */
export function Disclosure({ summary, children, open }: DisclosureProps) {
  return (
    <details className="disclosure" open={open}>
      <summary>
        <Icon name="unfold" size={16} />
        <span>{summary}</span>
      </summary>
      <div className="pb-2">{children}</div>
    </details>
  )
}
