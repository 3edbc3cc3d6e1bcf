import { TextField } from '#src/components/ui/TextField.tsx'

interface FindFieldProps {
  label: string
  value: string
  onChange: (words: string) => void
  /** How many rows there are and how many are shown. */
  shown: number
  total: number
}

/** Narrows a list by words; only where the list is long enough to need it. */
export function FindField({ label, value, onChange, shown, total }: FindFieldProps) {
  if (total < 8 && value === '') return null
  return (
    <div className="mb-4 max-w-measure">
      <TextField
        id="find"
        label={label}
        type="search"
        value={value}
        onChange={(event) => onChange(event.target.value)}
      />
      <p role="status" className="note">
        {value === '' ? '' : `${shown} of ${total}`}
      </p>
    </div>
  )
}
