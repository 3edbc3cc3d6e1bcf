import { useEffect, useState } from 'react'
import type { ReactNode } from 'react'
import { VisuallyHidden } from './VisuallyHidden.tsx'

interface WaitingProps {
  /** What is awaited, for a screen reader: "Reading the rounds". */
  label: string
  /** What stands in the region meanwhile, if anything is known already. */
  children?: ReactNode
  /** Milliseconds before anything is shown. */
  after?: number
}

/** Under 300 ms nothing; then a thread along the region's top edge. No grey blocks, no spinner, no loop. */
export function Waiting({ label, children, after = 300 }: WaitingProps) {
  const [late, setLate] = useState(after <= 0)
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), after)
    return () => clearTimeout(timer)
  }, [after])
  return (
    <div className="waiting" aria-busy="true">
      {late && <span className="waiting-thread" aria-hidden="true" />}
      <VisuallyHidden live>{late ? label : ''}</VisuallyHidden>
      {children}
    </div>
  )
}
