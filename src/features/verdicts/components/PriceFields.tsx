import { useState } from 'react'
import { CheckRow } from '#src/components/ui/CheckRow.tsx'
import { TextField } from '#src/components/ui/TextField.tsx'
import { asMoney, minorUnits, typedMoney } from '../money.ts'

interface Price {
  minor: number
  currency: string
  on: string
}

interface PriceFieldsProps {
  /** Ids of the entries begin with this: `units.0`. */
  id: string
  price: Price | null
  none: boolean
  onChange: (price: Price | null, none: boolean) => void
  errorAt: (field: string) => string | undefined
  /** Filled in at first: the currency of another unit, the reader's own day. */
  currency: string
  today: string
}

/** A price is an amount, a currency and the day on which it was asked; or there is none. */
export function PriceFields({ id, price, none, onChange, errorAt, currency, today }: PriceFieldsProps) {
  const [typed, setTyped] = useState({
    amount: price ? typedMoney(price) : '',
    currency: price?.currency ?? currency,
    on: price?.on ?? today,
  })
  const minor = minorUnits(typed.amount, typed.currency)
  const unread = typed.amount.trim() !== '' && typed.currency.length === 3 && minor === null
  const change = (part: Partial<typeof typed>) => {
    const next = { ...typed, ...part }
    setTyped(next)
    const amount = minorUnits(next.amount, next.currency)
    const given = next.amount.trim() !== ''
    onChange(given ? { minor: amount ?? -1, currency: next.currency, on: next.on } : null, false)
  }
  return (
    <div className="fields">
      {!none && (
        <div className="grid gap-x-6 gap-y-6 page:grid-cols-[minmax(0,1fr)_7rem_11rem] page:items-start">
          <TextField
            id={`${id}.price`}
            label="Price"
            inputMode="decimal"
            autoComplete="off"
            value={typed.amount}
            hint={
              minor === null
                ? 'As asked, without discount.'
                : `Reads ${asMoney({ minor, currency: typed.currency })}.`
            }
            onChange={(event) => change({ amount: event.target.value })}
            error={
              unread
                ? 'Write the price as a number, like 189 or 189.50.'
                : (errorAt('price') ?? errorAt('price.minor'))
            }
          />
          <TextField
            id={`${id}.price.currency`}
            label="Currency"
            hint="Like EUR."
            maxLength={3}
            autoComplete="off"
            value={typed.currency}
            onChange={(event) => change({ currency: event.target.value.toUpperCase() })}
            error={errorAt('price.currency')}
          />
          <TextField
            id={`${id}.price.on`}
            type="date"
            label="On which day"
            hint="Prices move."
            value={typed.on}
            onChange={(event) => change({ on: event.target.value })}
            error={errorAt('price.on')}
          />
        </div>
      )}
      <CheckRow
        id={`${id}.priceUnknown`}
        label="There is no price"
        hint="It is not on sale, or nobody can say."
        checked={none}
        onChange={(event) => {
          if (event.target.checked) onChange(null, true)
          else change({})
        }}
      />
    </div>
  )
}
