import { useState } from 'react'
import { useController, useWatch } from 'react-hook-form'
import { levelMatchings } from '#shared/contracts/evening-draft.ts'
import { ChoiceRows } from '#src/components/ui/ChoiceRows.tsx'
import { TextArea } from '#src/components/ui/TextArea.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { hidingWords } from '../evening/blank-evening.ts'
import type { EveningPart } from '../evening/evening-form.ts'

const levelChoices: Record<(typeof levelMatchings)[number], { label: string; hint: string }> = {
  measured: { label: 'Measured', hint: 'Every unit set to the same level with a coupler or a meter.' },
  'by-ear': { label: 'By ear', hint: 'Somebody who does not listen set them alike.' },
  'not-matched': {
    label: 'Not matched',
    hint: 'The louder one is often liked better, whatever it is. The verdict says that levels were not matched.',
  },
}

export function TracksField({ form, errorAt }: EveningPart) {
  const { field } = useController({ control: form.control, name: 'tracks' })
  return (
    <TextArea
      id="tracks"
      label="Music"
      optional
      hint="One track a line, and what to listen for if you like. Everybody hears the same. Scrim plays nothing."
      error={errorAt('tracks')}
      ref={field.ref}
      name={field.name}
      onBlur={field.onBlur}
      value={(field.value ?? []).join('\n')}
      onChange={(event) => field.onChange(event.target.value === '' ? [] : event.target.value.split('\n'))}
    />
  )
}

export function ConditionsFields({ form, errorAt }: EveningPart) {
  const level = useWatch({ control: form.control, name: 'levelMatching' })
  const hiding = useWatch({ control: form.control, name: 'hiding' })
  const [own, setOwn] = useState(() => !hidingWords.some((words) => words === hiding))
  return (
    <>
      <ChoiceRows
        legend="How levels are matched"
        name="levelMatching"
        value={level}
        error={errorAt('levelMatching')}
        choices={levelMatchings.map((value) => ({ value, ...levelChoices[value] }))}
        onChange={(value) => form.setValue('levelMatching', value as typeof level, { shouldDirty: true })}
      />
      <ChoiceRows
        legend="How shape and cable are hidden"
        hint="Published with the verdict."
        id={own ? 'hiding-kind' : 'hiding'}
        name="hiding-kind"
        value={own ? 'own' : hiding}
        error={own ? undefined : errorAt('hiding')}
        choices={[
          ...hidingWords.map((words) => ({ value: words, label: words })),
          { value: 'own', label: 'In other words' },
        ]}
        onChange={(value) => {
          setOwn(value === 'own')
          form.setValue('hiding', value === 'own' ? '' : value, { shouldDirty: true })
          form.clearErrors('hiding')
        }}
      />
      {own && (
        <TextField
          label="How they are hidden, in your words"
          error={errorAt('hiding')}
          {...form.register('hiding')}
        />
      )}
    </>
  )
}
