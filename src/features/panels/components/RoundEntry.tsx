import { Link } from 'react-router-dom'
import type { RoundLine } from '#shared/contracts/panels.ts'
import { Code } from '#src/components/Code.tsx'
import { counted } from '#src/lib/counts.ts'
import { day } from '#src/lib/dates.ts'
import { nextStep } from '../what-is-next.ts'

interface RoundEntryProps {
  panel: string
  round: RoundLine
  zone?: string | undefined
}

/** One round as the desk lists it: its title, where it is, and the one thing to do next. */
export function RoundEntry({ panel, round, zone }: RoundEntryProps) {
  const { verb, address, state } = nextStep(panel, round)
  return (
    <li className="flex items-start gap-4 py-4">
      <div className="min-w-0 flex-1">
        <h2 className="heading">{round.title}</h2>
        <p className="text-muted">
          Round {round.number} · {counted(round.listeners, 'listener')} · {day(round.changedAt, zone)}.{' '}
          {state}
        </p>
        <p className="mt-1">
          <Link to={address} className="inline-flex min-h-[2.75rem] items-center font-semibold">
            {verb}
          </Link>
        </p>
      </div>
      {round.status === 'open' && <Code code={null} size="small" label="The cloth is on" />}
    </li>
  )
}
