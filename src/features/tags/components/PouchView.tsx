import type { ReactNode } from 'react'
import { Code } from '#src/components/Code.tsx'

interface PouchViewProps {
  /** What goes in: the unit, or for codes over letters the letter. */
  above: ReactNode
  /** The line under it: the maker, or whose pouch it is. */
  beside?: ReactNode
  /** What goes on the pouch: digits, or a letter. */
  sign: string
  signName: string
  /** Where it goes: "for seat 3, turn 2". */
  below?: ReactNode
}

/** One pouch: what goes in above, what goes on it below at 72 px. Announced when it changes. */
export function PouchView({ above, beside, sign, signName, below }: PouchViewProps) {
  return (
    <div className="pouch" role="status">
      <div>
        <div className="pouch-unit">{above}</div>
        {beside && <div className="text-muted">{beside}</div>}
      </div>
      <Code code={sign} size="keeper" label={signName} />
      {below && <div className="font-semibold">{below}</div>}
    </div>
  )
}
