import { useMemo, useState } from 'react'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useNavigate } from 'react-router-dom'
import { publishVerdict, type VerdictDraft } from '#shared/contracts/verdicts.ts'
import { to } from '#src/app/paths.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ConfirmDialog } from '#src/components/ui/Dialog.tsx'
import { TextArea } from '#src/components/ui/TextArea.tsx'
import { call } from '#src/lib/call.ts'
import { createSameKey } from '#src/lib/same-key.ts'
import { cannotPublish, correctionWords } from '../desk-fields.ts'
import type { AtRound } from '../queries.ts'

interface PublishVerbProps {
  at: AtRound
  draft: VerdictDraft
  unsaved: readonly string[]
}

/** Sends the verdict out once, and leads to its page. A repeated press gets the first answer again. */
function usePublish(at: AtRound, version: number) {
  const client = useQueryClient()
  const navigate = useNavigate()
  const keyFor = useMemo(() => createSameKey(), [])
  return useMutation({
    mutationFn: (correction: string) =>
      call(publishVerdict, {
        params: at,
        body: { correction },
        idempotencyKey: keyFor({ correction, version }),
      }),
    onSuccess: async ({ slug }) => {
      await client.invalidateQueries()
      await navigate(to('verdict', { slug }))
    },
  })
}

/** Publishing for the first time: asked twice, for it cannot be taken back, only corrected. */
export function PublishVerb({ at, draft, unsaved }: PublishVerbProps) {
  const [asking, setAsking] = useState(false)
  const publish = usePublish(at, draft.version)
  return (
    <>
      <Button onClick={() => setAsking(true)} disabledReason={cannotPublish(draft, unsaved)}>
        Publish the verdict
      </Button>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title="Publish the verdict?"
        consequence={
          <>
            <p>
              Anyone may then read it: the words, the figures, the plan, the key and, if this round publishes
              rows, the ratings by listener number.
            </p>
            <p className="mt-2">
              It cannot be taken back. What was wrong can be corrected in a new version; the old one stays.
            </p>
          </>
        }
        confirmLabel="Publish the verdict"
        busyLabel="Publishing"
        busy={publish.isPending}
        onConfirm={() => publish.mutate('')}
      >
        {publish.error && <Problem error={publish.error} kept="Nothing was published." />}
      </ConfirmDialog>
    </>
  )
}

/** A correction is a new version that says what was wrong and what is right. */
export function CorrectionVerb({ at, draft, unsaved }: PublishVerbProps) {
  const [wrong, setWrong] = useState('')
  const [right, setRight] = useState('')
  const publish = usePublish(at, draft.version)
  const halves = wrong.trim() !== '' && right.trim() !== ''
  const version = (draft.published?.version ?? 1) + 1
  const off = cannotPublish(draft, unsaved) ?? (halves ? null : 'Say what was wrong and what is right.')
  return (
    <div className="fields">
      <TextArea
        id="wrong"
        label="What was wrong"
        rows={2}
        maxLength={140}
        value={wrong}
        onChange={(event) => setWrong(event.target.value)}
      />
      <TextArea
        id="right"
        label="What is right"
        rows={2}
        maxLength={140}
        value={right}
        onChange={(event) => setRight(event.target.value)}
      />
      {publish.error && (
        <Problem error={publish.error} kept="Nothing was published; what you typed is still here." />
      )}
      <Button
        busy={publish.isPending}
        busyLabel={`Publishing version ${version}`}
        disabledReason={off}
        onClick={() => publish.mutate(correctionWords(wrong, right))}
      >
        Publish version {version}
      </Button>
    </div>
  )
}
