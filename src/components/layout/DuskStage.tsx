import type { ReactNode } from 'react'

interface DuskStageProps {
  head?: ReactNode
  children: ReactNode
  /** Verbs: "Draw the cloth aside", "Leave the stage". */
  foot?: ReactNode
}

/** The reveal's stage: dusk whatever the scheme, the whole window, one unit at a time. */
export function DuskStage({ head, children, foot }: DuskStageProps) {
  return (
    <div className="stage" data-scheme="dusk">
      <header className="stage-head">{head}</header>
      <main id="matter" tabIndex={-1} className="stage-main">
        {children}
      </main>
      <footer className="stage-foot">{foot}</footer>
    </div>
  )
}
