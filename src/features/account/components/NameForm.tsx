import { useState } from 'react'
import { changeName } from '#shared/contracts/account.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { useRename } from '../queries.ts'
import { FormProblem } from './FormProblem.tsx'

export function NameForm({ name, version }: { name: string; version: number }) {
  const rename = useRename(version)
  const [saved, setSaved] = useState<string | null>(null)
  const { form, submit, faults, attempt, problem, busy, errorAt } = useContractForm({
    schema: changeName,
    defaultValues: { name },
    send: async (body) => {
      setSaved(null)
      await rename.mutateAsync(body)
      setSaved(body.name)
    },
  })
  return (
    <form onSubmit={submit} noValidate className="fields">
      <ErrorSummary errors={faults} attempt={attempt} />
      <FormProblem problem={problem} />
      <TextField label="Your name" autoComplete="name" error={errorAt('name')} {...form.register('name')} />
      <Button type="submit" kind="secondary" busy={busy} busyLabel="Saving the name">
        Save the name
      </Button>
      {saved && <Notice kind="done" live title={`Saved: ${saved}`} />}
    </form>
  )
}
