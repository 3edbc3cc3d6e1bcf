import { useState } from 'react'
import { editPanel, type Panel } from '#shared/contracts/panels.ts'
import { Problem } from '#src/components/asked/Problem.tsx'
import { Button } from '#src/components/ui/Button.tsx'
import { ErrorSummary } from '#src/components/ui/ErrorSummary.tsx'
import { Notice } from '#src/components/ui/Notice.tsx'
import { SelectField } from '#src/components/ui/SelectField.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { ownZone, zones } from '#src/lib/dates.ts'
import { useContractForm } from '#src/lib/use-contract-form.ts'
import { useChangePanel } from '../queries.ts'

export function PanelForm({ panel }: { panel: Panel }) {
  const change = useChangePanel(panel.slug, panel.version)
  const [saved, setSaved] = useState(false)
  const { form, submit, faults, attempt, problem, busy, errorAt } = useContractForm({
    schema: editPanel,
    defaultValues: { name: panel.name, timeZone: panel.timeZone },
    send: async (body) => {
      setSaved(false)
      await change.mutateAsync(body)
      setSaved(true)
    },
  })
  const options = zones([panel.timeZone, ownZone()]).map((zone) => ({
    value: zone,
    label: zone.replaceAll('_', ' '),
  }))
  return (
    <form onSubmit={submit} noValidate className="fields mt-8">
      <ErrorSummary errors={faults} attempt={attempt} />
      {problem && <Problem error={problem} kept="What you typed is still here." />}
      <TextField
        label="Name of the panel"
        hint="Stands over every verdict. Verdicts that are already published change with it; the address stays."
        error={errorAt('name')}
        {...form.register('name')}
      />
      <SelectField
        label="Time zone"
        hint="Dates and times of rounds are shown in it."
        options={options}
        error={errorAt('timeZone')}
        {...form.register('timeZone')}
      />
      <Button type="submit" busy={busy} busyLabel="Saving the settings">
        Save the settings
      </Button>
      {saved && <Notice kind="done" live title="Saved" />}
    </form>
  )
}
