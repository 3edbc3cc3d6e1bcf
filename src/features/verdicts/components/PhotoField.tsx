import { useMutation, useQueryClient } from '@tanstack/react-query'
import { putPhoto, removePhoto, type VerdictDraft } from '#shared/contracts/verdicts.ts'
import { limits } from '#shared/domain/limits.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { Field } from '#src/components/ui/Field.tsx'
import { call, CallError } from '#src/lib/call.ts'
import { keepDraft, type AtRound } from '../queries.ts'

type Unit = VerdictDraft['units'][number]

/** Why a chosen photograph is not sent, or null. The server looks at the bytes itself. */
export function refusedPhoto(file: { size: number }): string | null {
  if (file.size === 0) return 'The file is empty.'
  return file.size > limits.photoBytes
    ? `The picture is larger than ${limits.photoBytes / 1024 / 1024} MB.`
    : null
}

const sentence = (error: Error | null): string | undefined =>
  error === null
    ? undefined
    : error instanceof CallError
      ? (error.fields.photo ?? error.message)
      : error.message

/** A unit's photograph, if there is one: shown whole on paper, at most 320 px high, as readers will see it. */
export function PhotoField({ at, unit, id }: { at: AtRound; unit: Unit; id: string }) {
  const client = useQueryClient()
  const params = { ...at, unit: unit.id }
  const put = useMutation({
    mutationFn: async (file: File) => {
      const why = refusedPhoto(file)
      if (why !== null) throw new Error(why)
      const body = new FormData()
      body.append('photo', file)
      return call(putPhoto, { params, body: body as never })
    },
    onSuccess: (draft) => keepDraft(client, at, draft),
  })
  const remove = useMutation({
    mutationFn: () => call(removePhoto, { params }),
    onSuccess: (draft) => keepDraft(client, at, draft),
  })
  return (
    <div>
      <Field
        id={id}
        label={unit.photo ? 'Another photograph' : 'Photograph'}
        optional
        hint="JPEG, PNG or WebP, up to 12 MB. It is made smaller, and place and camera are taken out of the file."
        error={sentence(put.error ?? remove.error)}
      >
        {(wiring) => (
          <input
            {...wiring}
            type="file"
            accept="image/jpeg,image/png,image/webp"
            className="entry"
            onChange={(event) => {
              const file = event.target.files?.[0]
              if (file) put.mutate(file)
            }}
          />
        )}
      </Field>
      <p role="status" className="note mt-1">
        {put.isPending ? 'Sending the picture.' : put.isSuccess ? 'The picture is kept.' : ''}
      </p>
      {unit.photo && (
        <figure className="mt-4">
          <img
            src={unit.photo.url}
            width={unit.photo.width}
            height={unit.photo.height}
            alt={`${unit.maker} ${unit.name}`}
            className="h-auto max-h-80 w-auto max-w-full object-contain"
          />
          <Button
            kind="destructive"
            onClick={() => remove.mutate()}
            busy={remove.isPending}
            busyLabel="Removing the picture"
          >
            Remove the picture
          </Button>
        </figure>
      )}
    </div>
  )
}
