import { CheckRow } from '#src/components/ui/CheckRow.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import type { EveningPart } from '../evening/evening-form.ts'

/** What listeners and readers read of the evening. */
export function WordsFields({ form, errorAt }: EveningPart) {
  return (
    <>
      <TextField
        label="Title"
        hint="Listeners read it before they rate: no unit’s and no maker’s name."
        error={errorAt('title')}
        {...form.register('title')}
      />
      <TextField
        label="Question"
        hint="What you want to find out. Listeners read it too."
        error={errorAt('question')}
        {...form.register('question')}
      />
      <TextField
        label="Source chain"
        optional
        hint="Player, amplifier, output: what all units were heard from."
        error={errorAt('sourceChain')}
        {...form.register('sourceChain')}
      />
      <CheckRow
        label="Publish the ratings as a file, by listener number"
        hint="Rows carry codes and no names. People who were in the room could recognise a row."
        error={errorAt('publishesRows')}
        {...form.register('publishesRows')}
      />
    </>
  )
}
