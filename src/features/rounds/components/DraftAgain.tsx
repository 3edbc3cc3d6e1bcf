import { useMemo } from 'react'
import { useNavigate } from 'react-router-dom'
import { to } from '#src/app/paths.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { randomKey } from '#src/lib/random-key.ts'
import { useDraftAgain, type At } from '../queries.ts'

/** Copies a cancelled round's plan into a new draft. */
export function DraftAgain({ at }: { at: At }) {
  const again = useDraftAgain(at)
  const navigate = useNavigate()
  const key = useMemo(() => randomKey(), [])
  return (
    <>
      <Button
        busy={again.isPending}
        busyLabel="Copying the plan"
        onClick={() =>
          again.mutate(key, {
            onSuccess: (round) => void navigate(to('plan', { panel: at.panel, round: round.id })),
          })
        }
      >
        Draft it again
      </Button>
      {again.error && <Problem error={again.error} />}
    </>
  )
}
