import { useWatch } from 'react-hook-form'
import { ChoiceRows, type Choice } from '#src/components/ui/ChoiceRows.tsx'
import { SelectField } from '#src/components/ui/SelectField.tsx'
import type { EveningPart } from '../evening/evening-form.ts'
import {
  dutiesFor,
  giveDuty,
  holderOf,
  withDuties,
  type DraftPerson,
  type Duty,
  type Tagging,
} from '../evening/share-out-duties.ts'

const choices: (Choice & { value: Tagging })[] = [
  {
    value: 'split',
    label: 'Two people share it, and everyone may listen',
    hint: 'A split key: one alone puts units into lettered pouches, another alone puts codes over the letters. Neither learns which code is which unit.',
  },
  {
    value: 'keeper',
    label: 'One person behind a screen, who does not listen',
    hint: 'A code keeper: the strongest blind. Keeper and steward are two people.',
  },
  {
    value: 'single',
    label: 'One person tags and hands over',
    hint: 'Single-blind: whoever hands you the pouch knows what is in it. The verdict says so.',
  },
]

const questions: Record<Duty, { label: string; hint: string }> = {
  keeper: { label: 'Who tags the pouches', hint: 'Knows the key from opening to closing and cannot listen.' },
  letters: { label: 'Who puts units into lettered pouches', hint: 'Alone, before the codes are put on.' },
  codes: { label: 'Who puts the codes over the letters', hint: 'Alone, without looking into the pouches.' },
  steward: {
    label: 'Who stewards',
    hint: 'Hands over pouches, keeps the turns, sees codes only. May listen too; the verdict then says so.',
  },
}

const excluded = (people: readonly DraftPerson[], duty: Duty, tagging: Tagging, index: number): boolean => {
  const own = people[index]
  if (duty === 'letters') return own?.duty === 'codes'
  if (duty === 'codes') return own?.duty === 'letters'
  return duty === 'steward' && tagging === 'keeper' && own?.duty === 'keeper'
}

export function DutiesFields({ form, errorAt }: EveningPart) {
  const people = useWatch({ control: form.control, name: 'people' })
  const tagging = useWatch({ control: form.control, name: 'tagging' })
  const put = (next: DraftPerson[]) => form.setValue('people', next, { shouldDirty: true })
  return (
    <>
      <ChoiceRows
        legend="Who tags the pouches with codes"
        name="tagging"
        value={tagging}
        error={errorAt('tagging')}
        choices={choices}
        onChange={(value) => {
          const way = value as Tagging
          form.setValue('tagging', way, { shouldDirty: true })
          form.clearErrors('tagging')
          put(withDuties(form.getValues('people'), way))
        }}
      />
      {dutiesFor(tagging).map((duty) => (
        <SelectField
          key={duty}
          id={`duty-${duty}`}
          label={questions[duty].label}
          hint={questions[duty].hint}
          value={holderOf(people, duty)}
          options={people.map((person, index) => ({
            value: String(index),
            label: person.name.trim() || `Person ${index + 1}`,
            disabled: excluded(people, duty, tagging, index),
          }))}
          onChange={(event) =>
            put(giveDuty(form.getValues('people'), duty, Number(event.target.value), tagging))
          }
        />
      ))}
    </>
  )
}
