import type { ReactNode } from 'react'

interface EmptyProps {
  /** What the thing is: "A unit is one physical earphone." */
  what: ReactNode
  /** One sentence more: "Two specimens of a model are two units." */
  sentence?: ReactNode
  /** One button: "Add the first". */
  action?: ReactNode
}

/** A list that has nothing in it yet says what it is for. */
export function Empty({ what, sentence, action }: EmptyProps) {
  return (
    <div className="empty">
      <p className="lead">{what}</p>
      {sentence && <p className="mt-1 text-muted">{sentence}</p>}
      {action && <div className="mt-4">{action}</div>}
    </div>
  )
}
