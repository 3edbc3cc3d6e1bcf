import { useState } from 'react'
import { useNavigate } from 'react-router-dom'
import type { Progress, Round } from '#shared/contracts/rounds.ts'
import { to } from '#src/app/paths.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ConfirmDialog } from '#src/components/ui/Dialog.tsx'
import { counted, sentenceCase } from '#src/lib/counts.ts'
import { useCloseRound } from '../queries.ts'

interface CloseRoundProps {
  panel: string
  round: Round
  progress: Progress
}

/** Closes the round after saying what is still out. */
export function CloseRound({ panel, round, progress }: CloseRoundProps) {
  const at = { panel, round: round.id }
  const [asking, setAsking] = useState(false)
  const close = useCloseRound(at, round.version)
  const navigate = useNavigate()
  const out = progress.servings.planned - progress.servings.submitted
  const anyOut = out > 0 || progress.waitingFor.length > 0
  return (
    <>
      <Button kind={anyOut ? 'secondary' : 'primary'} onClick={() => setAsking(true)}>
        Close the round
      </Button>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title="Close the round"
        destructive={anyOut}
        consequence={
          <>
            {anyOut && (
              <div className="mb-3">
                <p className="font-semibold">
                  {out > 0
                    ? `${sentenceCase(counted(out, 'serving is', 'servings are'))} not rated.`
                    : 'Not everybody has answered the end questions.'}
                </p>
                <ul>
                  {progress.waitingFor.map(({ seat, what }) => (
                    <li key={`${seat} ${what}`}>
                      {seat}: {what}
                    </li>
                  ))}
                </ul>
                <p>What arrives after closing is kept and marked, and never counted.</p>
              </div>
            )}
            <p>
              The ratings file is fixed first, then the key opens and the statistics are computed. No rating
              can be added or changed afterwards.
            </p>
          </>
        }
        confirmLabel={anyOut ? 'Close it all the same' : 'Close the round'}
        busyLabel="Opening the key"
        busy={close.isPending}
        onConfirm={() =>
          close.mutate(
            { evenIfOut: anyOut },
            {
              onSuccess: () => {
                setAsking(false)
                void navigate(to('agreement', at))
              },
            },
          )
        }
      >
        {close.error && <Problem error={close.error} kept="The round is still open." />}
      </ConfirmDialog>
    </>
  )
}
