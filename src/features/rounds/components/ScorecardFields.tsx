import { useState } from 'react'
import { useWatch } from 'react-hook-form'
import {
  coreScorecard,
  families,
  familyNames,
  lexicon,
  lexiconEntry,
  shortScorecard,
} from '#shared/domain/lexicon.ts'
import { minutesPerTurn } from '#shared/domain/timing.ts'
import { FamilyName } from '#src/components/FamilySign.tsx'
import { ChoiceRows } from '#src/components/ui/ChoiceRows.tsx'
import { SelectField } from '#src/components/ui/SelectField.tsx'
import { lineNames } from '../evening/draft-words.ts'
import type { EveningPart } from '../evening/evening-form.ts'

const same = (a: readonly string[], b: readonly string[]): boolean =>
  a.length === b.length && a.every((key, nth) => key === b[nth])

const inLexiconOrder = (keys: readonly string[]): string[] =>
  lexicon.map((entry) => entry.key).filter((key) => keys.includes(key))

type Kind = 'short' | 'core' | 'pick'
const kindOf = (keys: readonly string[]): Kind =>
  same(keys, shortScorecard) ? 'short' : same(keys, coreScorecard) ? 'core' : 'pick'

export function ScorecardFields({ form, errorAt }: EveningPart) {
  const scorecard = useWatch({ control: form.control, name: 'scorecard' })
  const primary = useWatch({ control: form.control, name: 'primaryDescriptor' })
  const [kind, setKind] = useState<Kind>(() => kindOf(scorecard))
  const put = (keys: readonly string[]) => {
    form.setValue('scorecard', [...keys], { shouldDirty: true })
    form.clearErrors('scorecard')
    if (!keys.includes(form.getValues('primaryDescriptor') ?? ''))
      form.setValue('primaryDescriptor', 'overall-liking', { shouldDirty: true })
  }
  const minutes = (lines: number) => `about ${minutesPerTurn(lines + 1)} minutes a turn`
  return (
    <div id="scorecard" tabIndex={-1} className="fields">
      <ChoiceRows
        legend="What is rated"
        hint="Overall liking always comes first. “I can’t tell” is always an answer."
        name="scorecard-kind"
        value={kind}
        error={kind === 'pick' ? undefined : errorAt('scorecard')}
        onChange={(value) => {
          setKind(value as Kind)
          if (value === 'short') put(shortScorecard)
          if (value === 'core') put(coreScorecard)
        }}
        choices={[
          {
            value: 'short',
            label: `Five lines, ${minutes(shortScorecard.length)}`,
            hint: `${lineNames(shortScorecard)}.`,
          },
          {
            value: 'core',
            label: `The ten core lines, ${minutes(coreScorecard.length)}`,
            hint: `${lineNames(coreScorecard)}.`,
          },
          { value: 'pick', label: 'Pick from eighteen', hint: 'More lines tire listeners sooner.' },
        ]}
      />
      {kind === 'pick' &&
        families
          .filter((family) => family !== 'liking')
          .map((family) => {
            const own = lexicon.filter((entry) => entry.family === family)
            return (
              <ChoiceRows
                key={family}
                type="checkbox"
                legend={<FamilyName family={family}>{familyNames[family]}</FamilyName>}
                name={`scorecard-${family}`}
                error={family === 'timbre' ? errorAt('scorecard') : undefined}
                value={scorecard.filter((key) => own.some((entry) => entry.key === key))}
                choices={own.map(({ key, name, sentence }) => ({ value: key, label: name, hint: sentence }))}
                onChange={(keys) =>
                  put(
                    inLexiconOrder([
                      ...scorecard.filter((key) => !own.some((entry) => entry.key === key)),
                      ...keys,
                    ]),
                  )
                }
              />
            )
          })}
      <SelectField
        label="Which line the verdict may state first"
        hint="Fixed when the round opens, so that nobody can pick the most flattering one afterwards."
        error={errorAt('primaryDescriptor')}
        options={['overall-liking', ...scorecard].map((key) => ({
          value: key,
          label: lexiconEntry(key)?.name ?? key,
        }))}
        value={primary}
        {...form.register('primaryDescriptor')}
      />
    </div>
  )
}
