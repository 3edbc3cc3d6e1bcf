import { round as roundContract, type Round } from '#shared/contracts/rounds.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import type { CallError } from '#src/lib/call.ts'

interface StaleDraftProps {
  problem: CallError
  /** Saves what is typed over the other version. */
  onKeepMine: (current: Round) => void
  /** Lays down what is typed and takes the other version. */
  onTakeTheirs: (current: Round) => void
}

/** Somebody else saved this draft meanwhile: both versions are there, and the person decides. */
export function StaleDraft({ problem, onKeepMine, onTakeTheirs }: StaleDraftProps) {
  const current = roundContract.safeParse(problem.problem.current)
  if (problem.code !== 'conflict' || !current.success)
    return <Problem error={problem} kept="What you typed is still here." />
  const theirs = current.data
  return (
    <Notice kind="signal" live title="This draft was changed meanwhile">
      <p>
        Saved elsewhere as version {theirs.version}: {theirs.unitCount} units, {theirs.people.length} people,
        “{theirs.title}”. What you typed is still here.
      </p>
      <div className="actions">
        <Button kind="secondary" onClick={() => onKeepMine(theirs)}>
          Save mine over it
        </Button>
        <Button kind="secondary" onClick={() => onTakeTheirs(theirs)}>
          Take the other
        </Button>
      </div>
    </Notice>
  )
}
