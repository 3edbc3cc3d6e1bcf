import { useState } from 'react'
import { useNavigate } from 'react-router-dom'
import type { Round } from '#shared/contracts/rounds.ts'
import { to } from '#src/app/paths.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ConfirmDialog } from '#src/components/ui/Dialog.tsx'
import { useOpenRound } from '../queries.ts'

interface OpenRoundProps {
  panel: string
  round: Round
}

/** What the round lacks, or the verb that opens it after saying what freezes. */
export function OpenRound({ panel, round }: OpenRoundProps) {
  const at = { panel, round: round.id }
  const [asking, setAsking] = useState(false)
  const open = useOpenRound(at, round.version)
  const navigate = useNavigate()
  const blinded = round.you.roles.some((role) => role === 'steward' || role === 'panelist')
  return (
    <>
      <Button
        disabledReason={round.lacks.length > 0 || !round.can.open ? 'It lacks what is listed here.' : null}
        onClick={() => setAsking(true)}
      >
        Open the round
      </Button>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title="Open the round"
        consequence={
          <>
            <p>Opening draws the rows and the codes, and freezes for good:</p>
            <ul className="mt-2 list-disc pl-5">
              <li>units, people and their duties</li>
              <li>question, scorecard and the line that may be stated first</li>
              <li>tracks, levels, how shape and cable are hidden, and the exclusion rules</li>
            </ul>
            <p className="mt-3">
              Both fingerprints then stand on a public page. The only way back is to cancel, and the reason is
              public.
              {blinded && ' While the round is open you see what your duty or your seat sees, not the units.'}
            </p>
          </>
        }
        confirmLabel="Open the round"
        busyLabel="Drawing rows and codes"
        busy={open.isPending}
        onConfirm={() =>
          open.mutate(undefined, {
            onSuccess: () => {
              setAsking(false)
              void navigate(to('links', at))
            },
          })
        }
      >
        {open.error && <Problem error={open.error} kept="The draft is as it was." />}
      </ConfirmDialog>
    </>
  )
}
