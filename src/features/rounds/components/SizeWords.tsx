import { useWatch } from 'react-hook-form'
import type { EveningFormState } from '../evening/evening-form.ts'
import { eveningSentence, panelSizeWords } from '../evening/plan-words.ts'

/** What the evening comes to, as soon as it has three units and two listeners. */
export function SizeWords({ form }: { form: EveningFormState }) {
  const [units, people, scorecard] = useWatch({
    control: form.control,
    name: ['units', 'people', 'scorecard'],
  })
  const named = units.filter((unit) => unit.name.trim() !== '').length
  const listening = people.filter((person) => person.listens && person.name.trim() !== '').length
  if (named < 3 || listening < 2) return null
  return (
    <>
      <p className="lead">{eveningSentence(named, listening, scorecard.length)}</p>
      <p className="note mt-2">{panelSizeWords(listening)}</p>
    </>
  )
}
