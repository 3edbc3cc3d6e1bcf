import { Link } from 'react-router-dom'
import { to } from '#src/app/paths.ts'
import { Notice } from '#src/components/ui/Notice.tsx'

interface LacksProps {
  panel: string
  round: { id: string; lacks: string[]; can: { edit: boolean } }
}

/** What must be there before the round can open. */
export function Lacks({ panel, round }: LacksProps) {
  if (round.lacks.length === 0) return null
  return (
    <Notice kind="signal" title="Before it can open">
      <ul className="list-disc pl-5">
        {round.lacks.map((lack) => (
          <li key={lack}>{lack}</li>
        ))}
      </ul>
      {round.can.edit && (
        <p className="mt-2">
          <Link to={to('editRound', { panel, round: round.id })}>Change the evening</Link>
        </p>
      )}
    </Notice>
  )
}
