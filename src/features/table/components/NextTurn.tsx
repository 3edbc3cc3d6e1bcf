import { useState } from 'react'
import { nextTurn, type StewardTable } from '#shared/contracts/table.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ConfirmDialog } from '#src/components/ui/Dialog.tsx'
import { call } from '#src/lib/call.ts'
import { listed } from '#src/lib/counts.ts'
import type { AtTable } from '../queries.ts'
import { turnVerb } from '../state-words.ts'
import { useTableAct } from '../use-table-act.ts'

/** The one verb of the evening. Says who has not sent; asks when somebody has not. */
export function NextTurn({ at, table }: { at: AtTable; table: StewardTable }) {
  const { sitting, notSent } = table
  const [asking, setAsking] = useState(false)
  const go = useTableAct(
    at,
    () => call(nextTurn, { params: at, body: { from: sitting.turn } }),
    () => setAsking(false),
  )
  const out = notSent.length > 0 && sitting.turn > 0
  const verb = turnVerb(sitting)
  if (!table.can.nextTurn && !table.can.end) return null
  return (
    <>
      <div className="actions">
        <Button
          onClick={() => (out ? setAsking(true) : go.mutate(undefined))}
          busy={go.isPending}
          busyLabel="One moment"
        >
          {verb}
        </Button>
        <p className="note" role="status">
          {sitting.turn === 0
            ? 'Not started yet.'
            : out
              ? `Not sent yet: ${listed(notSent)}.`
              : 'Everyone in this turn has sent.'}
        </p>
      </div>
      {go.error && !asking && <Problem error={go.error} kept="The turn has not changed." />}
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title={`Go on without ${listed(notSent)}?`}
        consequence={`${notSent.length === 1 ? 'Their serving' : 'Their servings'} of this turn will count as missed. Nothing stops, and what they have sent before stays.`}
        confirmLabel={verb}
        cancelLabel="Wait"
        busy={go.isPending}
        onConfirm={() => go.mutate(undefined)}
      >
        {go.error && <Problem error={go.error} kept="The turn has not changed." />}
      </ConfirmDialog>
    </>
  )
}
