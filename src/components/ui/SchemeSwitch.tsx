import { useId } from 'react'
import { useScheme } from '#src/hooks/useScheme.ts'
import type { Scheme } from '#src/hooks/useScheme.ts'

const words: [Scheme, string][] = [
  ['light', 'light'],
  ['dusk', 'dusk'],
  ['system', 'as the device'],
]

/** Light, dusk, or as the device says; kept on this device. */
export function SchemeSwitch() {
  const [scheme, choose] = useScheme()
  const name = useId()
  return (
    <fieldset className="scheme-switch">
      <legend className="visually-hidden">Colours</legend>
      {words.map(([value, word]) => (
        <label key={value}>
          <input
            type="radio"
            className="visually-hidden"
            name={name}
            value={value}
            checked={scheme === value}
            onChange={() => choose(value)}
          />
          <span>{word}</span>
        </label>
      ))}
    </fieldset>
  )
}
